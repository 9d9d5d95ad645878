import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { kitGuests } from "#db/schema/guests.ts";
import { kits } from "#db/schema/kits.ts";

export type KitRow = typeof kits.$inferSelect;

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
