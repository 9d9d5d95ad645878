import { callsAtRisk } from "#src/components/islands/call.ts";

/** A saver of edits, as far as leaving the page concerns it. */
export interface Unsaved {
  /** Sends now whatever can be sent now. */
  flush(): void;
  /** Whether any edit has not reached the server, those under way included. */
  holds(): boolean;
  /** Whether an edit is held that cannot be sent now: it waits for one before it, for a connection, for a choice. */
  atRisk(): boolean;
  /** Puts by what has not been answered, for the next page to take up. */
  keep?(): void;
}

const savers = new Set<Unsaved>();

function flush(): void {
  for (const saver of savers) saver.flush();
}

/** Comes before the next page is asked for, so that it already shows what is sent here. */
function leave(event: BeforeUnloadEvent): void {
  // Some fields take their entry when they are left: that is now.
  if (document.activeElement instanceof HTMLElement) document.activeElement.blur();
  flush();
  const held = [...savers].filter((saver) => saver.holds());
  const lost = held.length > 0 && !navigator.onLine;
  if (lost || callsAtRisk() || held.some((saver) => saver.atRisk())) event.preventDefault();
}

function go(): void {
  flush();
  for (const saver of savers) saver.keep?.();
}

function hide(): void {
  if (document.visibilityState === "hidden") flush();
}

/**
 * Sees to a saver's edits when the page is left: what can be sent is sent, and where that may not bring all of it
 * home the browser asks first. Returns the way to stop.
 */
export function watchLeaving(saver: Unsaved): () => void {
  if (savers.size === 0) {
    addEventListener("beforeunload", leave);
    addEventListener("pagehide", go);
    document.addEventListener("visibilitychange", hide);
  }
  savers.add(saver);
  return () => {
    savers.delete(saver);
    if (savers.size > 0) return;
    removeEventListener("beforeunload", leave);
    removeEventListener("pagehide", go);
    document.removeEventListener("visibilitychange", hide);
  };
}
