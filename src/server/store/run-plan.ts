import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { charges, packingItems, runPlans, tasks } from "#db/schema/runs.ts";

export type RunPlanRow = typeof runPlans.$inferSelect;
export type TaskRow = typeof tasks.$inferSelect;
export type PackingItemRow = typeof packingItems.$inferSelect;
export type ChargeRow = typeof charges.$inferSelect;

/** A kit's run plan; every kit has one from its first moment. */
export function runPlanOf(db: Db, kitId: string): RunPlanRow {
  const row = db.select().from(runPlans).where(eq(runPlans.kitId, kitId)).get();
  if (!row) throw new Error(`Kit ${kitId} has no run plan.`);
  return row;
}

/** Changes the plan if it still has this version; undefined where somebody changed it since. */
export function changeRunPlan(
  db: Db,
  kitId: string,
  version: number,
  fields: Partial<RunPlanRow>,
): RunPlanRow | undefined {
  return db
    .update(runPlans)
    .set({ ...fields, version: version + 1 })
    .where(and(eq(runPlans.kitId, kitId), eq(runPlans.version, version)))
    .returning()
    .get();
}

export function tasksOf(db: Db, kitId: string): TaskRow[] {
  return db.select().from(tasks).where(eq(tasks.kitId, kitId)).orderBy(asc(tasks.position)).all();
}

export function packingItemsOf(db: Db, kitId: string): PackingItemRow[] {
  return db
    .select()
    .from(packingItems)
    .where(eq(packingItems.kitId, kitId))
    .orderBy(asc(packingItems.position))
    .all();
}

export function chargesOf(db: Db, kitId: string): ChargeRow[] {
  return db.select().from(charges).where(eq(charges.kitId, kitId)).orderBy(asc(charges.position)).all();
}

/** A kit's run plan at the kit's first moment. */
export function addRunPlan(db: Db, row: typeof runPlans.$inferInsert): void {
  db.insert(runPlans).values(row).run();
}
