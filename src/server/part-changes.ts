import type { PartChange } from "#src/shapes/part.ts";
import type { Changing as ChangingSomewhere } from "./note-change.ts";
import { changeSeenPart } from "./part-steps.ts";
import { Problem } from "./problem.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { partOf } from "./store/part.ts";
import { inTransaction } from "./transaction.ts";

/** Changes a part of the workshop, in every kit that uses it. */
export function setPart(
  given: ChangingSomewhere & { workshop: WorkshopRow },
  partId: string,
  { version, set }: PartChange,
): { version: number } {
  return inTransaction(given.db, () => {
    const before = partOf(given.db, given.workshop.id, partId);
    if (!before) throw new Problem("not-found");
    return { version: changeSeenPart(given, before, version, set).version };
  });
}
