import { and, desc, eq, getTableColumns, isNull } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { imports } from "#db/schema/imports.ts";
import type { ImportKind } from "#src/shapes/limits.ts";

export type ImportRow = typeof imports.$inferSelect;
export type NewImport = typeof imports.$inferInsert;

const { content: _text, before: _before, ...headColumns } = getTableColumns(imports);

/** An import without its text and without what stood before it: enough to list it. */
export type ImportHead = Omit<ImportRow, "content" | "before">;

/** What a person settles while the list is a draft. */
export type DraftChange = Partial<Pick<ImportRow, "mapping" | "answers" | "supplierId" | "supplierName">>;

/** Whose imports: a kit's parts lists, or the price lists of a workshop. */
export interface ImportPlace {
  workshopId: string;
  kind: ImportKind;
  kitId: string | null;
}

function inPlace(place: ImportPlace) {
  return and(
    eq(imports.workshopId, place.workshopId),
    eq(imports.kind, place.kind),
    place.kitId === null ? isNull(imports.kitId) : eq(imports.kitId, place.kitId),
  );
}

export function addImport(db: Db, row: NewImport): void {
  db.insert(imports).values(row).run();
}

/** An import of this place; one of another kit or workshop is not found. */
export function importOf(db: Db, place: ImportPlace, id: string): ImportRow | undefined {
  return db
    .select()
    .from(imports)
    .where(and(inPlace(place), eq(imports.id, id)))
    .get();
}

/** The imports of a place, the newest first. */
export function importsOf(db: Db, place: ImportPlace, most: number): ImportHead[] {
  return db
    .select(headColumns)
    .from(imports)
    .where(inPlace(place))
    .orderBy(desc(imports.createdAt), desc(imports.id))
    .limit(most)
    .all();
}

/** The import of a place that was taken last and still stands. */
export function lastTaken(db: Db, place: ImportPlace): ImportHead | undefined {
  return db
    .select(headColumns)
    .from(imports)
    .where(and(inPlace(place), eq(imports.state, "taken")))
    .orderBy(desc(imports.takenAt), desc(imports.id))
    .limit(1)
    .get();
}

/** Changes a draft that still has the version `seen`; `false` where it has moved on or is no draft any more. */
export function changeDraft(db: Db, id: string, seen: number, change: DraftChange): boolean {
  const done = db
    .update(imports)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(imports.id, id), eq(imports.version, seen), eq(imports.state, "draft")))
    .run();
  return done.changes > 0;
}

type Ending = Pick<ImportRow, "state"> &
  Partial<Pick<ImportRow, "takenAt" | "takenBy" | "outcome" | "before" | "content">>;

/** Moves an import from one state to the next: taken, taken back, dropped. `false` where it was not in that state. */
export function moveImport(
  db: Db,
  id: string,
  from: ImportRow["state"],
  seen: number,
  ending: Ending,
): boolean {
  const done = db
    .update(imports)
    .set({ ...ending, version: seen + 1 })
    .where(and(eq(imports.id, id), eq(imports.version, seen), eq(imports.state, from)))
    .run();
  return done.changes > 0;
}
