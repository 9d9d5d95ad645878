import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import type { StoredPartsList } from "./present.ts";
import { editionsOf } from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import { lineQuantitiesOf, linesOf } from "./store/line.ts";
import { otherKitsByPart, partChoicesOf } from "./store/part.ts";

/** Gathers a kit's parts list as it stands; `present.ts` decides what of it a role may see. */
export function partsListOf(db: Db, kit: KitRow): StoredPartsList {
  const quantities = groupBy(lineQuantitiesOf(db, kit.id), (row) => row.lineId);
  return {
    kit,
    editions: editionsOf(db, kit.id),
    lines: linesOf(db, kit.id).map(({ line, part }) => ({
      line,
      part,
      quantities: Object.fromEntries(
        (quantities.get(line.id) ?? []).map(({ editionId, perKit }) => [editionId, perKit]),
      ),
    })),
    choices: partChoicesOf(db, kit.id),
    alsoIn: otherKitsByPart(db, kit.workshopId, kit.id),
  };
}
