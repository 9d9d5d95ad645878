import { and, eq, ne } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { lines, partChoices, type parts } from "#db/schema/parts.ts";

export type PartRow = typeof parts.$inferSelect;
export type PartChoiceRow = typeof partChoices.$inferSelect;

/** How a kit buys its parts, where that differs from the kit's own settings. */
export function partChoicesOf(db: Db, kitId: string): PartChoiceRow[] {
  return db.select().from(partChoices).where(eq(partChoices.kitId, kitId)).all();
}

/** Ids of the parts of a workshop that some other kit uses too. */
export function partsUsedElsewhere(db: Db, workshopId: string, kitId: string): Set<string> {
  const rows = db
    .selectDistinct({ partId: lines.partId })
    .from(lines)
    .where(and(eq(lines.workshopId, workshopId), ne(lines.kitId, kitId)))
    .all();
  return new Set(rows.map((row) => row.partId));
}
