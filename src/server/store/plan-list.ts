import { and, count, eq, max } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { charges, packingItems, tasks } from "#db/schema/runs.ts";
import type { ChargeRow, PackingItemRow, TaskRow } from "./run-plan.ts";

interface ListRow {
  id: string;
  workshopId: string;
  kitId: string;
  position: number;
  name: string;
  version: number;
}

/** Work, packing and once-only charges of a run are three tables that are changed in the same way. */
export interface PlanList<Row extends ListRow> {
  one(db: Db, kitId: string, id: string): Row | undefined;
  count(db: Db, kitId: string): number;
  nextPosition(db: Db, kitId: string): number;
  add(db: Db, row: Row): void;
  /** Changes the row if it still has this version; undefined where it has another or is gone. */
  change(db: Db, id: string, version: number, fields: Partial<Row>): Row | undefined;
  remove(db: Db, id: string, version: number): boolean;
}

function listIn<Row extends ListRow>(of: typeof tasks | typeof packingItems | typeof charges): PlanList<Row> {
  // The columns used here are the same in all three tables; only the type of the rest differs.
  const table = of as typeof tasks;
  const seen = (id: string, version: number) => and(eq(table.id, id), eq(table.version, version));
  return {
    one: (db, kitId, id) =>
      db
        .select()
        .from(table)
        .where(and(eq(table.id, id), eq(table.kitId, kitId)))
        .get() as unknown as Row | undefined,
    count(db, kitId) {
      const row = db.select({ rows: count() }).from(table).where(eq(table.kitId, kitId)).get();
      return row?.rows ?? 0;
    },
    nextPosition(db, kitId) {
      const row = db
        .select({ last: max(table.position) })
        .from(table)
        .where(eq(table.kitId, kitId))
        .get();
      return (row?.last ?? 0) + 1;
    },
    add(db, row) {
      db.insert(table)
        .values(row as unknown as TaskRow)
        .run();
    },
    change: (db, id, version, fields) =>
      db
        .update(table)
        .set({ ...(fields as Partial<TaskRow>), version: version + 1 })
        .where(seen(id, version))
        .returning()
        .get() as unknown as Row | undefined,
    remove: (db, id, version) => db.delete(table).where(seen(id, version)).run().changes > 0,
  };
}

export const taskList = listIn<TaskRow>(tasks);
export const packingList = listIn<PackingItemRow>(packingItems);
export const chargeList = listIn<ChargeRow>(charges);
