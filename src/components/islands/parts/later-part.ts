import type { ComponentType } from "react";

/** A part of a page that is fetched when it is first needed. */
export interface LaterPart<Props> {
  /** The part, once it has been fetched. */
  now(): ComponentType<Props> | null;
  /** Fetches it, once; after a failure the next call tries again. */
  fetch(): Promise<void>;
  /** Fetches it because it is about to be needed: its control is pointed at or has the focus. */
  preload(): void;
}

/** Names a part to be fetched on first use: `laterPart(async () => (await import("./Panel.tsx")).Panel)`. */
export function laterPart<Props>(load: () => Promise<ComponentType<Props>>): LaterPart<Props> {
  let part: ComponentType<Props> | null = null;
  let asked: Promise<void> | null = null;

  async function take(): Promise<void> {
    try {
      part = await load();
    } catch (error) {
      asked = null;
      throw error;
    }
  }

  function fetch(): Promise<void> {
    asked ??= take();
    return asked;
  }

  return { now: () => part, fetch, preload: () => void fetch().catch(() => {}) };
}
