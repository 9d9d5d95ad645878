import { asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { shutOutSuppliers, suppliers } from "#db/schema/supply.ts";

export type SupplierRow = typeof suppliers.$inferSelect;

export function suppliersOf(db: Db, workshopId: string): SupplierRow[] {
  return db
    .select()
    .from(suppliers)
    .where(eq(suppliers.workshopId, workshopId))
    .orderBy(asc(suppliers.name))
    .all();
}

/** Ids of the suppliers a kit does without. */
export function shutOutOf(db: Db, kitId: string): string[] {
  const rows = db
    .select({ id: shutOutSuppliers.supplierId })
    .from(shutOutSuppliers)
    .where(eq(shutOutSuppliers.kitId, kitId))
    .all();
  return rows.map((row) => row.id).sort();
}
