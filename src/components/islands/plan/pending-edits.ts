import type { KitPlan } from "#src/server/kit-plan.ts";
import { type Fields, fieldsNow, type PlanRow, withFields } from "./plan-rows.ts";

/** An edit that has not reached the server; `base` is what stood there when the person began. */
export interface PendingEdit {
  row: PlanRow;
  fields: Fields;
  base: Fields;
  /** The version it was sent with by a page that is gone; else it names the one that is held. */
  seen?: number;
}

function sameRow(one: PlanRow, other: PlanRow): boolean {
  return one.kind === other.kind && ("id" in one ? one.id : "") === ("id" in other ? other.id : "");
}

/** Adds an edit to those that wait: a field edited twice is sent once, with the first base and the last value. */
export function withEdit(waiting: readonly PendingEdit[], edit: PendingEdit): PendingEdit[] {
  const before = waiting.find(({ row }) => sameRow(row, edit.row));
  if (!before) return [...waiting, edit];
  const joined = {
    row: edit.row,
    fields: { ...before.fields, ...edit.fields },
    base: { ...edit.base, ...before.base },
    ...(before.seen !== undefined && { seen: before.seen }),
  };
  return waiting.map((one) => (one === before ? joined : one));
}

/** A plan fresh from the server, with what waits put on top again. */
export function withPending(held: KitPlan, waiting: readonly PendingEdit[]): KitPlan {
  return waiting.reduce((plan, { row, fields }) => withFields(plan, row, fields), held);
}

/** What became of an edit that met a row somebody changed meanwhile. */
export interface Merged {
  /** Fields that only we changed: they can be sent again. */
  ours: Fields;
  /** Fields that both changed to different values. */
  both: { field: string; yours: unknown; theirs: unknown }[];
}

const same = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other);

/** Compares an edit with the row as it stands now, field by field. */
export function merged(edit: PendingEdit, current: Fields): Merged {
  const result: Merged = { ours: {}, both: [] };
  for (const [field, yours] of Object.entries(edit.fields)) {
    const theirs = current[field] ?? null;
    if (same(theirs, yours)) continue;
    if (same(theirs, edit.base[field] ?? null)) result.ours[field] = yours;
    else result.both.push({ field, yours, theirs });
  }
  return result;
}

/** Whether a plan has everything an edit set. */
export function arrived(held: KitPlan, { row, fields }: PendingEdit): boolean {
  return same(fieldsNow(held, row, Object.keys(fields)), fields);
}
