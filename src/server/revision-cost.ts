import type { Db } from "#db/client.ts";
import { type CostEffect, costEffect } from "./bring-in/cost-effect.ts";
import { tryOut } from "./bring-in/try-out.ts";
import { planOf } from "./plan.ts";
import { type EndedRevision, lastRevision } from "./revision.ts";
import { editionsOf } from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import { addLineQuantities, addLines, linesOf, removeLines } from "./store/line.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { addParts, partsOf } from "./store/part.ts";

/**
 * What the change since a kit's last revision does to the cost of one kit at the planned run: the old list
 * and the new one by today's offers, editions and terms, so that nothing but the list makes the difference.
 * Null while the first revision lasts. Nothing is changed.
 */
export function revisionCost(db: Db, workshop: WorkshopRow, kit: KitRow, asOf: string): CostEffect | null {
  const since = lastRevision(db, kit.id);
  if (!since) return null;
  const before = tryOut(db, () => {
    putList(db, workshop, kit, since);
    return planOf(db, workshop, kit, asOf);
  });
  return costEffect(before, planOf(db, workshop, kit, asOf));
}

/** Puts a revision's list in the place of the present one. A part that is gone comes back without offers. */
function putList(db: Db, workshop: WorkshopRow, kit: KitRow, { lines }: EndedRevision): void {
  const workshopId = workshop.id;
  const present = linesOf(db, kit.id).map(({ line }) => line.id);
  removeLines(db, kit.id, present);
  const known = new Set(partsOf(db, workshopId).map(({ id }) => id));
  const gone = new Map(lines.filter(({ part }) => !known.has(part.id)).map(({ part }) => [part.id, part]));
  addParts(
    db,
    [...gone.values()].map((part) => ({ ...part, workshopId, createdAt: 0 })),
  );
  addLines(
    db,
    lines.map(({ quantities, part, ...line }) => ({ ...line, partId: part.id, workshopId, kitId: kit.id })),
  );
  const editions = new Set(editionsOf(db, kit.id).map(({ id }) => id));
  const quantities = lines.flatMap((line) =>
    Object.entries(line.quantities).map(([editionId, perKit]) => ({
      workshopId,
      lineId: line.id,
      editionId,
      perKit,
    })),
  );
  addLineQuantities(
    db,
    quantities.filter(({ editionId }) => editions.has(editionId)),
  );
}
