import { and, asc, eq, inArray, ne } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { kits } from "#db/schema/kits.ts";
import { lines, partChoices, parts } from "#db/schema/parts.ts";
import { inChunks } from "./in-chunks.ts";

export type PartRow = typeof parts.$inferSelect;
export type NewPart = typeof parts.$inferInsert;
export type PartChange = Partial<Omit<NewPart, "id" | "workshopId" | "version" | "createdAt">>;
export type PartChoiceRow = typeof partChoices.$inferSelect;
export type PartChoiceChange = Partial<Omit<PartChoiceRow, "workshopId" | "kitId" | "partId" | "version">>;

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

/** Ids of the parts of a workshop that any kit's list uses. */
export function partIdsInUse(db: Db, workshopId: string): Set<string> {
  const rows = db
    .selectDistinct({ partId: lines.partId })
    .from(lines)
    .where(eq(lines.workshopId, workshopId))
    .all();
  return new Set(rows.map((row) => row.partId));
}

/** For each part that other kits use too: those kits' names. */
export function otherKitsByPart(db: Db, workshopId: string, kitId: string): Map<string, string[]> {
  const rows = db
    .selectDistinct({ partId: lines.partId, name: kits.name })
    .from(lines)
    .innerJoin(kits, eq(kits.id, lines.kitId))
    .where(and(eq(lines.workshopId, workshopId), ne(lines.kitId, kitId)))
    .orderBy(asc(kits.name))
    .all();
  const names = new Map<string, string[]>();
  for (const { partId, name } of rows) names.set(partId, [...(names.get(partId) ?? []), name]);
  return names;
}

/** A part of this workshop; one of another workshop is not found. */
export function partOf(db: Db, workshopId: string, partId: string): PartRow | undefined {
  return db
    .select()
    .from(parts)
    .where(and(eq(parts.id, partId), eq(parts.workshopId, workshopId)))
    .get();
}

/** Every part of a workshop, in the order they were made. */
export function partsOf(db: Db, workshopId: string): PartRow[] {
  return db
    .select()
    .from(parts)
    .where(eq(parts.workshopId, workshopId))
    .orderBy(asc(parts.createdAt), asc(parts.id))
    .all();
}

export function addParts(db: Db, rows: NewPart[]): void {
  for (const chunk of inChunks(rows)) db.insert(parts).values(chunk).run();
}

/** Changes a part that still has the version `seen`, in every kit that uses it; `undefined` where it has moved on. */
export function changePart(
  db: Db,
  workshopId: string,
  partId: string,
  seen: number,
  change: PartChange,
): PartRow | undefined {
  return db
    .update(parts)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(parts.id, partId), eq(parts.workshopId, workshopId), eq(parts.version, seen)))
    .returning()
    .get();
}

/** Removes parts of this workshop with their offers; the caller knows that no line uses them. */
export function removeParts(db: Db, workshopId: string, partIds: string[]): void {
  for (const chunk of inChunks(partIds))
    db.delete(parts)
      .where(and(eq(parts.workshopId, workshopId), inArray(parts.id, chunk)))
      .run();
}

/** How a kit buys one part; absent until somebody chooses. */
export function partChoiceOf(db: Db, kitId: string, partId: string): PartChoiceRow | undefined {
  return db
    .select()
    .from(partChoices)
    .where(and(eq(partChoices.kitId, kitId), eq(partChoices.partId, partId)))
    .get();
}

/**
 * Sets how a kit buys a part, if the choice still has the version `seen`; 0 means that there was none yet.
 * `undefined` where it has moved on.
 */
export function changePartChoice(
  db: Db,
  key: { workshopId: string; kitId: string; partId: string },
  seen: number,
  change: PartChoiceChange,
): PartChoiceRow | undefined {
  if (seen === 0)
    return db
      .insert(partChoices)
      .values({ ...key, ...change })
      .onConflictDoNothing()
      .returning()
      .get();
  return db
    .update(partChoices)
    .set({ ...change, version: seen + 1 })
    .where(
      and(
        eq(partChoices.kitId, key.kitId),
        eq(partChoices.partId, key.partId),
        eq(partChoices.version, seen),
      ),
    )
    .returning()
    .get();
}
