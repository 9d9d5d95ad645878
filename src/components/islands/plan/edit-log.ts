import type { KitPlan } from "#src/server/kit-plan.ts";
import { moduleStore } from "./module-store.ts";

/** The last edit of this page: what stood before it, what it is called, and the way back. */
export interface LastEdit {
  before: KitPlan;
  /** "Run changed from 100 to 120." */
  name: string;
  /** The same field edited again shortly after is the same edit, with the same baseline. */
  field: string;
  /** What the field held before the edit. */
  from: unknown;
  at: number;
  undo: () => void;
}

/** A pause this long, and touching the same field again is a new edit. */
const SAME_EDIT_MS = 5000;

/** Null when nothing was edited, or the signs were kept or undone. */
export const lastEdit = moduleStore<LastEdit | null>(null);

/**
 * Notes an edit. Holding a key or typing figure by figure is one edit from where it began; any other field,
 * or a pause, starts afresh.
 */
export function noteEdit(edit: Omit<LastEdit, "name"> & { nameFrom: (from: unknown) => string }): void {
  const { nameFrom, ...fresh } = edit;
  const last = lastEdit.now();
  const goesOn = last !== null && last.field === edit.field && edit.at - last.at < SAME_EDIT_MS;
  const { before, from, undo } = goesOn ? last : edit;
  lastEdit.put({ ...fresh, before, from, undo, name: nameFrom(from) });
}

/** The change is accepted: the signs go, the figures stay. */
export function keepEdit(): void {
  lastEdit.put(null);
}

/** Takes the last edit back. */
export function undoEdit(): void {
  const last = lastEdit.now();
  lastEdit.put(null);
  last?.undo();
}
