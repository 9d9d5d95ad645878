import type { z } from "zod";
import { SUPPLIERS_MOST } from "#src/shapes/limits.ts";
import { Supplier, type SupplierChange, type SupplierFields } from "#src/shapes/supplier.ts";
import { beforeAndAfter } from "./before-and-after.ts";
import { checked } from "./checked.ts";
import { newId } from "./new-id.ts";
import { type Changing, clash, noteChange, type Where } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import {
  addSupplier as addRow,
  changeSupplier as changeRow,
  offerCounts,
  removeSupplier as removeRow,
  type SupplierRow,
  setShutOut,
  supplierNamed,
  supplierOf,
  suppliersOf,
} from "./store/supplier.ts";
import { inTransaction } from "./transaction.ts";

/** A supplier as people see it, with how many offers it makes. */
export type SupplierView = Omit<SupplierRow, "workshopId"> & { offers: number };

function view({ workshopId: _, ...row }: SupplierRow, offers: number): SupplierView {
  return { ...row, offers };
}

/** The suppliers of a workshop, by name. */
export function suppliers({ db, workshop }: Where): SupplierView[] {
  const counts = offerCounts(db, workshop.id);
  return suppliersOf(db, workshop.id).map((row) => view(row, counts.get(row.id) ?? 0));
}

/** One supplier of the workshop. */
export function supplier({ db, workshop }: Where, supplierId: string): SupplierView {
  const row = supplierOf(db, workshop.id, supplierId);
  if (!row) throw new Problem("not-found");
  return view(row, offerCounts(db, workshop.id).get(row.id) ?? 0);
}

function checkName({ db, workshop }: Changing, name: string, own: string | null): void {
  const same = supplierNamed(db, workshop.id, name);
  if (same && same.id !== own) throw wrongField("name", `There is a supplier called ${name} already.`);
}

/** Adds a supplier. */
export function addSupplier(given: Changing, input: SupplierFields): SupplierView {
  const { db, workshop } = given;
  const fields = checked(Supplier, input);
  return inTransaction(db, () => {
    if (suppliersOf(db, workshop.id).length >= SUPPLIERS_MOST)
      throw wrongField("", `A workshop has at most ${SUPPLIERS_MOST} suppliers. Remove one first.`);
    checkName(given, fields.name, null);
    const row = addRow(db, { id: newId(), workshopId: workshop.id, ...fields });
    noteChange(given, { action: "supplier.add", subjectId: row.id, subjectName: row.name });
    return view(row, 0);
  });
}

/** Changes fields of a supplier; together with those that stay they must make sense. */
export function changeSupplier(
  given: Changing,
  supplierId: string,
  { version, ...change }: z.infer<typeof SupplierChange>,
): SupplierView {
  const { db } = given;
  return inTransaction(db, () => {
    const before = supplier(given, supplierId);
    if (before.version !== version) throw clash(given, supplierId, before);
    const { id: _, version: __, offers, ...stays } = before;
    const fields: SupplierFields = checked(Supplier, { ...stays, ...change });
    checkName(given, fields.name, supplierId);
    const after = changeRow(db, supplierId, version, fields);
    if (!after) throw clash(given, supplierId, before);
    const detail = beforeAndAfter(stays, fields);
    noteChange(given, {
      action: "supplier.change",
      subjectId: supplierId,
      subjectName: before.name,
      detail,
    });
    return view(after, offers);
  });
}

/** Removes a supplier and says how many offers went with it. */
export function removeSupplier(given: Changing, supplierId: string, version: number): { offers: number } {
  return inTransaction(given.db, () => {
    const { name, offers, ...row } = supplier(given, supplierId);
    if (!removeRow(given.db, supplierId, version)) throw clash(given, supplierId, { name, offers, ...row });
    noteChange(given, {
      action: "supplier.remove",
      subjectId: supplierId,
      subjectName: name,
      detail: { offers },
    });
    return { offers };
  });
}

/** Has the kit of the address do without a supplier, or use it again. */
export function shutOutSupplier(
  given: Changing & { kit: { id: string } },
  supplierId: string,
  shutOut: boolean,
): void {
  const { db, workshop, kit } = given;
  inTransaction(db, () => {
    const { name } = supplier(given, supplierId);
    setShutOut(db, { workshopId: workshop.id, kitId: kit.id, supplierId }, shutOut);
    const action = shutOut ? "supplier.shut-out" : "supplier.let-in";
    noteChange(given, { action, subjectId: supplierId, subjectName: name });
  });
}
