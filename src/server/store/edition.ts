import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { editions } from "#db/schema/kits.ts";

export type EditionRow = typeof editions.$inferSelect;
export type NewEdition = typeof editions.$inferInsert;
export type EditionChange = Partial<Omit<NewEdition, "id" | "workshopId" | "kitId" | "version">>;

/** The editions of a kit in their order. */
export function editionsOf(db: Db, kitId: string): EditionRow[] {
  return db.select().from(editions).where(eq(editions.kitId, kitId)).orderBy(asc(editions.position)).all();
}

/** An edition of this kit; one of another kit is not found. */
export function editionOf(db: Db, kitId: string, editionId: string): EditionRow | undefined {
  return db
    .select()
    .from(editions)
    .where(and(eq(editions.id, editionId), eq(editions.kitId, kitId)))
    .get();
}

export function addEdition(db: Db, row: NewEdition): EditionRow {
  return db.insert(editions).values(row).returning().get();
}

/** Changes an edition that still has the version `seen`; `undefined` where it has moved on or is gone. */
export function changeEdition(
  db: Db,
  kitId: string,
  editionId: string,
  seen: number,
  change: EditionChange,
): EditionRow | undefined {
  return db
    .update(editions)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(editions.id, editionId), eq(editions.kitId, kitId), eq(editions.version, seen)))
    .returning()
    .get();
}

/** Puts an edition at another place of the list; order is not an edit, so the version stays. */
export function placeEdition(db: Db, editionId: string, position: number): void {
  db.update(editions).set({ position }).where(eq(editions.id, editionId)).run();
}

/** Removes an edition with its quantities. */
export function removeEdition(db: Db, kitId: string, editionId: string): void {
  db.delete(editions)
    .where(and(eq(editions.id, editionId), eq(editions.kitId, kitId)))
    .run();
}
