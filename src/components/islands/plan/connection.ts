import { saving } from "./saving.ts";

/** How long without connection before the next try. */
export const RETRY_MS = 10_000;

/** Notes that a change met no connection; true where that is news. */
export function lostConnection(): boolean {
  const isNew = saving.now().lostAt === null;
  if (isNew) saving.change((now) => ({ ...now, lostAt: Date.now() }));
  return isNew;
}

/** Notes that a change has arrived again. */
export function connected(): void {
  if (saving.now().lostAt !== null) saving.change((now) => ({ ...now, lostAt: null }));
}

/** Settles when the next try is due: the browser is connected again, somebody asked for it, or time has passed. */
export function connectionTried(): Promise<void> {
  return new Promise((resolve) => {
    const go = () => {
      clearTimeout(timer);
      removeEventListener("online", go);
      stop();
      resolve();
    };
    const timer = setTimeout(go, RETRY_MS);
    addEventListener("online", go);
    const stop = saving.watch(() => saving.now().lostAt === null && go());
  });
}
