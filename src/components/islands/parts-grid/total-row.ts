import type { PartsList } from "#src/server/present.ts";
import { partsTotal, piecesIn, type TotalRow } from "./grid-rows.ts";
import type { Bought } from "./PartsPage.tsx";

/** The last row of the list: lines, pieces in each edition, what all parts cost. */
export function totalRow(list: PartsList, bought: Bought | null): TotalRow {
  const total = bought && partsTotal(bought);
  const pieces = list.editions.map(({ id }) => [`quantity:${id}`, String(piecesIn(list, id))]);
  const count = list.lines.length === 1 ? "1 line" : `${list.lines.length} lines`;
  return {
    kind: "total",
    id: "total",
    cells: {
      designators: count,
      ...Object.fromEntries(pieces),
      ...(total &&
        bought && { supplier: `Parts for ${bought.plan.run.kits} kits ${total.run}`, perKit: total.perKit }),
    },
  };
}
