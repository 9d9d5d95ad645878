import { asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { editions } from "#db/schema/kits.ts";

export type EditionRow = typeof editions.$inferSelect;

export function editionsOf(db: Db, kitId: string): EditionRow[] {
  return db.select().from(editions).where(eq(editions.kitId, kitId)).orderBy(asc(editions.position)).all();
}
