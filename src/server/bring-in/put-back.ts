import type { Changing } from "../note-change.ts";
import { editionsOf } from "../store/edition.ts";
import { changeKit, type KitRow } from "../store/kit.ts";
import {
  addLineQuantities,
  addLines,
  changeLine,
  type LineQuantityRow,
  type LineRow,
  lineQuantitiesOf,
  linesOf,
  placeLine,
  removeLines,
  setLineQuantities,
} from "../store/line.ts";
import { addOffers, changeOffer, offeredPartIds, offersOf, removeOffer } from "../store/offer.ts";
import { addParts, changePart, partIdsInUse, partsOf, removeParts } from "../store/part.ts";
import { removeRevision } from "../store/revision.ts";
import { offerCounts, removeSupplier, suppliersOf } from "../store/supplier.ts";
import type { Before } from "./ledger.ts";

/** A version later than any that anybody has seen, so that an edit of the state in between is told apart. */
const LATER = 2;

function putLineBack(
  { db }: Changing,
  old: LineRow,
  quantities: LineQuantityRow[],
  now: LineRow | undefined,
) {
  const { id, kitId, workshopId, version, ...fields } = old;
  if (!now) {
    addLines(db, [{ ...old, version: version + LATER }]);
    addLineQuantities(db, quantities);
    return;
  }
  changeLine(db, kitId, id, now.version, fields);
  setLineQuantities(db, quantities);
}

function putLinesBack(by: Changing, kit: KitRow, before: Before): void {
  const { db } = by;
  removeLines(db, kit.id, before.added.lines);
  const rows = new Map(linesOf(db, kit.id).map(({ line }) => [line.id, line]));
  const editions = new Set(editionsOf(db, kit.id).map(({ id }) => id));
  const counted = lineQuantitiesOf(db, kit.id);
  for (const { line, quantities } of before.lines) {
    const kept = quantities.filter(({ editionId }) => editions.has(editionId));
    const gone = counted
      .filter((row) => row.lineId === line.id && !kept.some(({ editionId }) => editionId === row.editionId))
      .map((row) => ({ ...row, perKit: 0 }));
    putLineBack(by, line, [...kept, ...gone], rows.get(line.id));
  }
  for (const [id, position] of Object.entries(before.positions)) placeLine(db, id, position);
}

function putPartsBack({ db, workshop }: Changing, before: Before): void {
  const now = new Map(partsOf(db, workshop.id).map((row) => [row.id, row]));
  for (const old of before.parts) {
    const { id, workshopId, version, createdAt, ...fields } = old;
    const row = now.get(id);
    if (row) changePart(db, workshop.id, id, row.version, fields);
    else addParts(db, [{ ...old, version: version + LATER }]);
  }
}

function putOffersBack({ db, workshop }: Changing, before: Before): void {
  const now = new Map(offersOf(db, workshop.id).map((row) => [row.offer.id, row.offer]));
  for (const id of before.added.offers) {
    const offer = now.get(id);
    if (offer) removeOffer(db, id, offer.version);
  }
  for (const { offer, breaks } of before.offers) {
    const { id, version, ...fields } = offer;
    const row = now.get(id);
    if (row) changeOffer(db, id, row.version, fields, breaks);
    else addOffers(db, [{ offer: { ...offer, version: version + LATER }, breaks }]);
  }
}

/** Removes the parts and suppliers a list added, but for those that something else has come to use. */
function removeAdded({ db, workshop }: Changing, before: Before): void {
  const used = partIdsInUse(db, workshop.id);
  const offered = offeredPartIds(db, workshop.id);
  const unused = before.added.parts.filter((id) => !used.has(id) && !offered.has(id));
  removeParts(db, workshop.id, unused);
  const counts = offerCounts(db, workshop.id);
  for (const supplier of suppliersOf(db, workshop.id))
    if (before.left.suppliers[supplier.id] === supplier.version && !counts.has(supplier.id))
      removeSupplier(db, supplier.id, supplier.version);
}

/** Puts back what stood before a list was taken. Call it inside a transaction. */
export function putBack(by: Changing, kit: KitRow | null, before: Before): void {
  putPartsBack(by, before);
  if (kit) putLinesBack(by, kit, before);
  putOffersBack(by, before);
  removeAdded(by, before);
  if (kit && before.revision && kit.revision === before.revision.number + 1) {
    removeRevision(by.db, kit.id, before.revision.id);
    changeKit(by.db, by.workshop.id, kit.id, kit.version, { revision: before.revision.number });
  }
}
