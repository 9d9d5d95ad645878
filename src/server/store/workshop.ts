import { and, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { workshops } from "#db/schema/workshops.ts";
import type { WorkshopRow } from "./membership.ts";

export function addWorkshop(db: Db, row: typeof workshops.$inferInsert): WorkshopRow {
  return db.insert(workshops).values(row).returning().get();
}

/** Removes a workshop with everything in it. */
export function removeWorkshop(db: Db, id: string): void {
  db.delete(workshops).where(eq(workshops.id, id)).run();
}

/** Changes a workshop if it still has this version; undefined where somebody changed it since. */
export function changeWorkshop(
  db: Db,
  id: string,
  version: number,
  fields: Partial<WorkshopRow>,
): WorkshopRow | undefined {
  return db
    .update(workshops)
    .set({ ...fields, version: version + 1 })
    .where(and(eq(workshops.id, id), eq(workshops.version, version)))
    .returning()
    .get();
}
