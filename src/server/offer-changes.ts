import type { z } from "zod";
import { OFFERS_PER_PART_MOST } from "#src/shapes/limits.ts";
import { Offer, type OfferBatch, type OfferChange, type OfferFields } from "#src/shapes/offer.ts";
import { beforeAndAfter } from "./before-and-after.ts";
import { checked } from "./checked.ts";
import { newId } from "./new-id.ts";
import { type Changing, clash, noteChange, type Where } from "./note-change.ts";
import { type FieldError, Problem, wrongField } from "./problem.ts";
import {
  addOffer as addRow,
  changeOffer as changeRow,
  type OfferRow,
  type OfferWithBreaks,
  offerCoded,
  offerOf,
  offersForPart,
  offersFromSupplier,
  offersOfPartCount,
  removeOffer as removeRow,
} from "./store/offer.ts";
import { partOf } from "./store/part.ts";
import { supplierOf } from "./store/supplier.ts";
import { inTransaction } from "./transaction.ts";

/** An offer as people see it, with its ladder. */
export type OfferView = Omit<OfferRow, "workshopId"> & { breaks: { quantity: number; price: string }[] };

/** An offer without what no screen needs. */
export function offerView({ offer: { workshopId: _, ...row }, breaks }: OfferWithBreaks): OfferView {
  return { ...row, breaks };
}

/** Every offer of one supplier of the workshop. */
export function supplierOffers({ db, workshop }: Where, supplierId: string): OfferView[] {
  if (!supplierOf(db, workshop.id, supplierId)) throw new Problem("not-found");
  return offersFromSupplier(db, workshop.id, supplierId).map(offerView);
}

/** Every offer for one part of the workshop. */
export function partOffers({ db, workshop }: Where, partId: string): OfferView[] {
  if (!partOf(db, workshop.id, partId)) throw new Problem("not-found");
  return offersForPart(db, workshop.id, partId).map(offerView);
}

function found({ db, workshop }: Changing, offerId: string): OfferView {
  const row = offerOf(db, workshop.id, offerId);
  if (!row) throw new Problem("not-found");
  return offerView(row);
}

/** One path under another: `change.3` and `orderCode` are `change.3.orderCode`. */
function under(path: string, field: string): string {
  return path === "" ? field : `${path}.${field}`;
}

/** A supplier of another workshop is not found, so that its id tells nothing; nor may a code stand twice. */
function checkPlace(
  given: Changing,
  partId: string,
  fields: OfferFields,
  own: string | null,
  at: string,
): void {
  const { db, workshop } = given;
  const supplier = supplierOf(db, workshop.id, fields.supplierId);
  if (!supplier) throw wrongField(under(at, "supplierId"), "This workshop has no such supplier.");
  const same = offerCoded(db, { ...fields, partId });
  if (!same || same.id === own) return;
  const code = fields.orderCode === "" ? "without an order code" : `with the order code ${fields.orderCode}`;
  throw wrongField(
    under(at, "orderCode"),
    `${supplier.name} has an offer ${code} for this part already. Change that one, or write another code.`,
  );
}

function note(given: Changing, action: string, partId: string, offerId: string, detail = {}): void {
  const part = partOf(given.db, given.workshop.id, partId);
  noteChange(given, {
    action,
    subjectId: offerId,
    subjectName: part?.name ?? "",
    detail: { partId, ...detail },
  });
}

function addTo(given: Changing, partId: string, input: OfferFields, at: string): OfferView {
  const { db, workshop } = given;
  const { breaks, ...fields } = checked(Offer, input, at);
  if (offersOfPartCount(db, partId) >= OFFERS_PER_PART_MOST)
    throw wrongField(at, `A part has at most ${OFFERS_PER_PART_MOST} offers. Remove one first.`);
  checkPlace(given, partId, { ...fields, breaks }, null, at);
  const row = addRow(db, { id: newId(), workshopId: workshop.id, partId, ...fields }, breaks);
  note(given, "offer.add", partId, row.id, { supplierId: row.supplierId });
  return found(given, row.id);
}

function change(
  given: Changing,
  offerId: string,
  { version, ...changed }: z.infer<typeof OfferChange>,
  at: string,
): OfferView {
  const before = found(given, offerId);
  if (before.version !== version) throw clash(given, offerId, before);
  const { id: _, partId, version: __, ...stays } = before;
  const { breaks, ...fields } = checked(Offer, { ...stays, ...changed }, at);
  checkPlace(given, partId, { ...fields, breaks }, offerId, at);
  if (!changeRow(given.db, offerId, version, fields, breaks)) throw clash(given, offerId, before);
  note(given, "offer.change", partId, offerId, beforeAndAfter(stays, { ...fields, breaks }));
  return found(given, offerId);
}

function remove(given: Changing, offerId: string, version: number): void {
  const before = found(given, offerId);
  if (!removeRow(given.db, offerId, version)) throw clash(given, offerId, before);
  note(given, "offer.remove", before.partId, offerId, { supplierId: before.supplierId });
}

/** Adds an offer for a part of the workshop. */
export function addOffer(given: Changing, partId: string, input: OfferFields): OfferView {
  if (!partOf(given.db, given.workshop.id, partId)) throw new Problem("not-found");
  return inTransaction(given.db, () => addTo(given, partId, input, ""));
}

/** Changes fields of an offer; together with those that stay they must make sense. */
export function changeOffer(given: Changing, offerId: string, input: z.infer<typeof OfferChange>): OfferView {
  return inTransaction(given.db, () => change(given, offerId, input, ""));
}

/** Removes an offer. A kit that had pinned it says so until another is chosen. */
export function removeOffer(given: Changing, offerId: string, version: number): void {
  inTransaction(given.db, () => remove(given, offerId, version));
}

/** What a batch left behind: every offer it changed or added, in the order of the batch. */
export interface BatchView {
  changed: OfferView[];
  added: OfferView[];
}

/** Does every step, gathering what is wrong with each, so that a pasted block is answered once. */
function gatherErrors<T>(steps: (() => T)[], errors: FieldError[]): T[] {
  return steps.flatMap((step) => {
    try {
      return [step()];
    } catch (error) {
      if (!(error instanceof Problem) || error.code !== "wrong-input") throw error;
      errors.push(...(error.details.errors ?? []));
      return [];
    }
  });
}

/** Many changes of offers, all of them or none; what is wrong is named by its place in the batch. */
export function changeOffers(given: Changing, batch: OfferBatch): BatchView {
  const { db, workshop } = given;
  const changes = (batch.change ?? []).map(
    ({ id, ...fields }, place) =>
      () =>
        change(given, id, fields, `change.${place}`),
  );
  const additions = (batch.add ?? []).map(({ partId, ...fields }, place) => () => {
    if (partOf(db, workshop.id, partId)) return addTo(given, partId, fields, `add.${place}`);
    throw wrongField(`add.${place}.partId`, "This workshop has no such part.");
  });
  return inTransaction(db, () => {
    const errors: FieldError[] = [];
    for (const { id, version } of batch.remove ?? []) remove(given, id, version);
    const changed = gatherErrors(changes, errors);
    const added = gatherErrors(additions, errors);
    if (errors.length > 0) throw new Problem("wrong-input", { errors });
    return { changed, added };
  });
}
