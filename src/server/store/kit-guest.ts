import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { kitGuests } from "#db/schema/guests.ts";
import { kits } from "#db/schema/kits.ts";

/** Which co-builder was asked to which kit of a workshop, by the kit's name. */
export function guestsOf(db: Db, workshopId: string): { userId: string; kitId: string; kit: string }[] {
  return db
    .select({ userId: kitGuests.userId, kitId: kits.id, kit: kits.name })
    .from(kitGuests)
    .innerJoin(kits, eq(kits.id, kitGuests.kitId))
    .where(eq(kitGuests.workshopId, workshopId))
    .orderBy(asc(kits.name))
    .all();
}

/** Asks a co-builder to a kit; asked twice is asked once. */
export function addGuest(db: Db, row: typeof kitGuests.$inferSelect): void {
  db.insert(kitGuests).values(row).onConflictDoNothing().run();
}

/** Takes back everything a person was asked to in a workshop. */
export function dropGuest(db: Db, workshopId: string, userId: string): void {
  db.delete(kitGuests)
    .where(and(eq(kitGuests.workshopId, workshopId), eq(kitGuests.userId, userId)))
    .run();
}
