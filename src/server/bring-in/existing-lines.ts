import type { Db } from "#db/client.ts";
import type { ExistingLine } from "#src/partslist/draft.ts";
import { lineQuantitiesOf, linesOf } from "../store/line.ts";

/**
 * The lines of a kit as an incoming list is compared with them. A part keeps no value and description apart from its
 * name and the rest of its words, so those stand for both.
 */
export function existingLines(db: Db, kitId: string): ExistingLine[] {
  const most = new Map<string, number>();
  for (const { lineId, perKit } of lineQuantitiesOf(db, kitId))
    most.set(lineId, Math.max(most.get(lineId) ?? 0, perKit));
  return linesOf(db, kitId).map(({ line, part }, place) => ({
    id: line.id,
    line: place + 1,
    designators: line.designators === "" ? [] : line.designators.split(/,\s*/),
    quantity: most.get(line.id) ?? null,
    class: part.class,
    value: part.name,
    description: part.spec || part.name,
    package: part.package || null,
    manufacturer: part.manufacturer || null,
    partNumber: part.manufacturerPartNumber || null,
    mark: line.mark,
    note: line.note || null,
    drawer: part.drawer || null,
  }));
}
