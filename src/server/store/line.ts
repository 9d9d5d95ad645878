import { and, asc, eq, inArray } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { lineQuantities, lines, parts } from "#db/schema/parts.ts";
import { inChunks } from "./in-chunks.ts";
import type { PartRow } from "./part.ts";

export type LineRow = typeof lines.$inferSelect;
export type NewLine = typeof lines.$inferInsert;
export type LineChange = Partial<Omit<NewLine, "id" | "workshopId" | "kitId" | "version">>;
export type LineQuantityRow = typeof lineQuantities.$inferSelect;

/** The lines of a kit's parts list in order, each with its part. */
export function linesOf(db: Db, kitId: string): { line: LineRow; part: PartRow }[] {
  return db
    .select({ line: lines, part: parts })
    .from(lines)
    .innerJoin(parts, eq(parts.id, lines.partId))
    .where(eq(lines.kitId, kitId))
    .orderBy(asc(lines.position), asc(lines.id))
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

/** A line of this kit; one of another kit is not found. */
export function lineOf(db: Db, kitId: string, lineId: string): LineRow | undefined {
  return db
    .select()
    .from(lines)
    .where(and(eq(lines.id, lineId), eq(lines.kitId, kitId)))
    .get();
}

/** Whether any line of the installation has this id. */
export function lineExists(db: Db, lineId: string): boolean {
  return db.select({ id: lines.id }).from(lines).where(eq(lines.id, lineId)).get() !== undefined;
}

/** Adds lines; their positions and parts are the caller's care. Their quantities go in by `setLineQuantities`. */
export function addLines(db: Db, rows: NewLine[]): void {
  for (const chunk of inChunks(rows)) db.insert(lines).values(chunk).run();
}

/** Changes a line that still has the version `seen`; `undefined` where it has moved on or is gone. */
export function changeLine(
  db: Db,
  kitId: string,
  lineId: string,
  seen: number,
  change: LineChange,
): LineRow | undefined {
  return db
    .update(lines)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(lines.id, lineId), eq(lines.kitId, kitId), eq(lines.version, seen)))
    .returning()
    .get();
}

/** Puts a line at another place of the list; order is not an edit, so the version stays. */
export function placeLine(db: Db, lineId: string, position: number): void {
  db.update(lines).set({ position }).where(eq(lines.id, lineId)).run();
}

/** Removes lines of this kit with their quantities; their parts stay in the workshop. */
export function removeLines(db: Db, kitId: string, lineIds: string[]): void {
  for (const chunk of inChunks(lineIds))
    db.delete(lines)
      .where(and(eq(lines.kitId, kitId), inArray(lines.id, chunk)))
      .run();
}

/** Quantities of lines that are new. Nought is no row. */
export function addLineQuantities(db: Db, rows: LineQuantityRow[]): void {
  for (const chunk of inChunks(rows.filter((row) => row.perKit > 0)))
    db.insert(lineQuantities).values(chunk).run();
}

/** Sets how many of a line go into one kit of an edition. Nought takes the row away: the edition is without it. */
export function setLineQuantities(db: Db, rows: LineQuantityRow[]): void {
  const none = rows.filter((row) => row.perKit === 0);
  for (const { lineId, editionId } of none)
    db.delete(lineQuantities)
      .where(and(eq(lineQuantities.lineId, lineId), eq(lineQuantities.editionId, editionId)))
      .run();
  for (const row of rows.filter((row) => row.perKit > 0))
    db.insert(lineQuantities)
      .values(row)
      .onConflictDoUpdate({
        target: [lineQuantities.lineId, lineQuantities.editionId],
        set: { perKit: row.perKit },
      })
      .run();
}
