const running = new Set<Promise<void>>();

async function inItsTurn(task: () => void | Promise<void>): Promise<void> {
  await new Promise((resolve) => setImmediate(resolve));
  try {
    await task();
  } catch (error) {
    console.error(error);
  }
}

/**
 * Does something after the reply, so that how long the reply took tells nothing about it: whether an
 * address is known, for one.
 */
export function later(task: () => void | Promise<void>): void {
  const run = inItsTurn(task);
  running.add(run);
  void run.finally(() => running.delete(run));
}

/** Waits until nothing is left to do later: before the process ends, and in tests. */
export async function laterDone(): Promise<void> {
  while (running.size > 0) await Promise.all(running);
}
