import { moduleStore } from "./module-store.ts";
import type { PlanRow } from "./plan-rows.ts";

/** Two people changed the same field: both values, until one is chosen. */
export interface Clash {
  row: PlanRow;
  field: string;
  yours: unknown;
  theirs: unknown;
  /** What stood there when we began. */
  base: unknown;
  /** The version ours was sent with. */
  seen: number;
  by: string | null;
  /** Milliseconds since 1970. */
  at: number | null;
}

export interface Saving {
  /** Edits that have not reached the server. */
  waiting: number;
  /** When the last edit was saved, in milliseconds since 1970; null before the first. */
  savedAt: number | null;
  /** Since when there is no connection. */
  lostAt: number | null;
  clashes: readonly Clash[];
}

export const NOTHING_SAVED: Saving = { waiting: 0, savedAt: null, lostAt: null, clashes: [] };

/** How saving stands, for the header, the banner and the boxes that show a clash. */
export const saving = moduleStore<Saving>(NOTHING_SAVED);

const counts = new Map<string, number>();

/** Says how many edits one saver holds that have not reached the server; `waiting` is the sum over all savers. */
export function countUnsaved(saver: string, held: number): void {
  counts.set(saver, held);
  const waiting = [...counts.values()].reduce((sum, one) => sum + one, 0);
  saving.change((now) => (now.waiting === waiting ? now : { ...now, waiting }));
}
