import { asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { lineQuantities, lines, parts } from "#db/schema/parts.ts";
import type { PartRow } from "./part.ts";

export type LineRow = typeof lines.$inferSelect;
export type LineQuantityRow = typeof lineQuantities.$inferSelect;

/** The lines of a kit's parts list in order, each with its part. */
export function linesOf(db: Db, kitId: string): { line: LineRow; part: PartRow }[] {
  return db
    .select({ line: lines, part: parts })
    .from(lines)
    .innerJoin(parts, eq(parts.id, lines.partId))
    .where(eq(lines.kitId, kitId))
    .orderBy(asc(lines.position))
    .all();
}

/** How many of each line go into one kit of each edition. */
export function lineQuantitiesOf(db: Db, kitId: string): LineQuantityRow[] {
  return db
    .select({
      workshopId: lineQuantities.workshopId,
      lineId: lineQuantities.lineId,
      editionId: lineQuantities.editionId,
      perKit: lineQuantities.perKit,
    })
    .from(lineQuantities)
    .innerJoin(lines, eq(lines.id, lineQuantities.lineId))
    .where(eq(lines.kitId, kitId))
    .all();
}
