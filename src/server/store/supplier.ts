import { and, asc, count, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { offers, shutOutSuppliers, suppliers } from "#db/schema/supply.ts";

export type SupplierRow = typeof suppliers.$inferSelect;
type NewSupplierRow = typeof suppliers.$inferInsert;

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

/** A supplier of this workshop; one of another workshop is not found. */
export function supplierOf(db: Db, workshopId: string, supplierId: string): SupplierRow | undefined {
  return db
    .select()
    .from(suppliers)
    .where(and(eq(suppliers.id, supplierId), eq(suppliers.workshopId, workshopId)))
    .get();
}

/** The supplier of a workshop that has this name. */
export function supplierNamed(db: Db, workshopId: string, name: string): SupplierRow | undefined {
  return db
    .select()
    .from(suppliers)
    .where(and(eq(suppliers.workshopId, workshopId), eq(suppliers.name, name)))
    .get();
}

/** How many offers each supplier of a workshop makes; a supplier without offers is absent. */
export function offerCounts(db: Db, workshopId: string): Map<string, number> {
  const rows = db
    .select({ id: offers.supplierId, offers: count() })
    .from(offers)
    .where(eq(offers.workshopId, workshopId))
    .groupBy(offers.supplierId)
    .all();
  return new Map(rows.map((row) => [row.id, row.offers]));
}

export function addSupplier(db: Db, row: NewSupplierRow): SupplierRow {
  return db.insert(suppliers).values(row).returning().get();
}

/** Changes a supplier that still has the version `seen`; `undefined` where it has moved on or is gone. */
export function changeSupplier(
  db: Db,
  supplierId: string,
  seen: number,
  change: Partial<SupplierRow>,
): SupplierRow | undefined {
  return db
    .update(suppliers)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(suppliers.id, supplierId), eq(suppliers.version, seen)))
    .returning()
    .get();
}

/** Removes a supplier that still has the version `seen`, with its offers; whether it was there. */
export function removeSupplier(db: Db, supplierId: string, seen: number): boolean {
  const gone = db
    .delete(suppliers)
    .where(and(eq(suppliers.id, supplierId), eq(suppliers.version, seen)))
    .run();
  return gone.changes > 0;
}

/** Has a kit do without a supplier, or use it again. */
export function setShutOut(
  db: Db,
  key: { workshopId: string; kitId: string; supplierId: string },
  shutOut: boolean,
): void {
  if (shutOut) db.insert(shutOutSuppliers).values(key).onConflictDoNothing().run();
  else
    db.delete(shutOutSuppliers)
      .where(and(eq(shutOutSuppliers.kitId, key.kitId), eq(shutOutSuppliers.supplierId, key.supplierId)))
      .run();
}
