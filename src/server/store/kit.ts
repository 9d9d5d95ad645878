import { and, asc, eq, sql } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { kitGuests } from "#db/schema/guests.ts";
import { kits } from "#db/schema/kits.ts";

export type KitRow = typeof kits.$inferSelect;
export type NewKit = typeof kits.$inferInsert;
/** What may change on a kit; its id, workshop and version do not. */
export type KitChange = Partial<Omit<NewKit, "id" | "workshopId" | "version">>;

/** A kit of this workshop; a kit of another workshop is not found. */
export function kitOf(db: Db, workshopId: string, kitId: string): KitRow | undefined {
  return db
    .select()
    .from(kits)
    .where(and(eq(kits.id, kitId), eq(kits.workshopId, workshopId)))
    .get();
}

/** Every kit of a workshop, the oldest first. */
export function kitsOf(db: Db, workshopId: string): KitRow[] {
  return db.select().from(kits).where(eq(kits.workshopId, workshopId)).orderBy(asc(kits.createdAt)).all();
}

/** The kits of a workshop that a co-builder was asked to, the oldest first. */
export function kitsForGuest(db: Db, workshopId: string, userId: string): KitRow[] {
  return db
    .select({ kit: kits })
    .from(kits)
    .innerJoin(kitGuests, eq(kitGuests.kitId, kits.id))
    .where(and(eq(kits.workshopId, workshopId), eq(kitGuests.userId, userId)))
    .orderBy(asc(kits.createdAt))
    .all()
    .map((row) => row.kit);
}

/** The kit of a workshop that has this name. */
export function kitNamed(db: Db, workshopId: string, name: string): KitRow | undefined {
  return db
    .select()
    .from(kits)
    .where(and(eq(kits.workshopId, workshopId), eq(kits.name, name)))
    .get();
}

export function addKit(db: Db, row: NewKit): KitRow {
  return db.insert(kits).values(row).returning().get();
}

/** Changes a kit that still has the version `seen`; `undefined` where it has moved on or is gone. */
export function changeKit(
  db: Db,
  workshopId: string,
  kitId: string,
  seen: number,
  change: KitChange,
): KitRow | undefined {
  return db
    .update(kits)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(kits.id, kitId), eq(kits.workshopId, workshopId), eq(kits.version, seen)))
    .returning()
    .get();
}

/** Begins the next revision of a kit's parts list and returns the kit as it then stands. */
export function beginNextRevision(db: Db, kitId: string): KitRow {
  return db
    .update(kits)
    .set({ revision: sql`${kits.revision} + 1`, version: sql`${kits.version} + 1` })
    .where(eq(kits.id, kitId))
    .returning()
    .get();
}

/** Removes a kit with its editions, lines, run plan and quotes; parts and offers belong to the workshop and stay. */
export function removeKit(db: Db, workshopId: string, kitId: string): void {
  db.delete(kits)
    .where(and(eq(kits.id, kitId), eq(kits.workshopId, workshopId)))
    .run();
}
