import { and, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
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
