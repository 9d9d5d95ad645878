import { and, asc, count, eq, inArray, type SQL } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import { lines } from "#db/schema/parts.ts";
import { offerBreaks, offers } from "#db/schema/supply.ts";
import { inChunks } from "./in-chunks.ts";

export type OfferRow = typeof offers.$inferSelect;
export type OfferBreakRow = typeof offerBreaks.$inferSelect;
type NewOfferRow = typeof offers.$inferInsert;

/** An offer with its ladder, the smallest quantity first. */
export interface OfferWithBreaks {
  offer: OfferRow;
  breaks: { quantity: number; price: string }[];
}

function withBreaks(rows: OfferRow[], breaks: OfferBreakRow[]): OfferWithBreaks[] {
  const ladders = groupBy(breaks, (row) => row.offerId);
  return rows.map((offer) => ({
    offer,
    breaks: (ladders.get(offer.id) ?? []).map(({ quantity, price }) => ({ quantity, price })),
  }));
}

/** By id, so that the order is always the same. */
function offersWhere(db: Db, which: SQL | undefined): OfferWithBreaks[] {
  const rows = db.select().from(offers).where(which).orderBy(asc(offers.id)).all();
  const breaks = db
    .select({
      workshopId: offerBreaks.workshopId,
      offerId: offerBreaks.offerId,
      quantity: offerBreaks.quantity,
      price: offerBreaks.price,
    })
    .from(offerBreaks)
    .innerJoin(offers, eq(offers.id, offerBreaks.offerId))
    .where(which)
    .orderBy(asc(offerBreaks.quantity))
    .all();
  return withBreaks(rows, breaks);
}

/** Every offer for a part of this kit's list. */
export function offersForKit(db: Db, kitId: string): OfferWithBreaks[] {
  const used = db.select({ id: lines.partId }).from(lines).where(eq(lines.kitId, kitId));
  return offersWhere(db, inArray(offers.partId, used));
}

export function offersForPart(db: Db, workshopId: string, partId: string): OfferWithBreaks[] {
  return offersWhere(db, and(eq(offers.workshopId, workshopId), eq(offers.partId, partId)));
}

export function offersFromSupplier(db: Db, workshopId: string, supplierId: string): OfferWithBreaks[] {
  return offersWhere(db, and(eq(offers.workshopId, workshopId), eq(offers.supplierId, supplierId)));
}

/** An offer of this workshop; one of another workshop is not found. */
export function offerOf(db: Db, workshopId: string, offerId: string): OfferWithBreaks | undefined {
  return offersWhere(db, and(eq(offers.workshopId, workshopId), eq(offers.id, offerId)))[0];
}

/** The offer that has this order code at this supplier for this part. */
export function offerCoded(
  db: Db,
  { partId, supplierId, orderCode }: Pick<OfferRow, "partId" | "supplierId" | "orderCode">,
): OfferRow | undefined {
  return db
    .select()
    .from(offers)
    .where(and(eq(offers.partId, partId), eq(offers.supplierId, supplierId), eq(offers.orderCode, orderCode)))
    .get();
}

export function offersOfPartCount(db: Db, partId: string): number {
  return db.select({ offers: count() }).from(offers).where(eq(offers.partId, partId)).get()?.offers ?? 0;
}

/** Ids of the parts of a workshop that anybody offers. */
export function offeredPartIds(db: Db, workshopId: string): Set<string> {
  const rows = db
    .selectDistinct({ partId: offers.partId })
    .from(offers)
    .where(eq(offers.workshopId, workshopId))
    .all();
  return new Set(rows.map((row) => row.partId));
}

function setBreaks(db: Db, offer: OfferRow, breaks: OfferWithBreaks["breaks"]): void {
  db.delete(offerBreaks).where(eq(offerBreaks.offerId, offer.id)).run();
  const rows = breaks.map(({ quantity, price }) => ({
    workshopId: offer.workshopId,
    offerId: offer.id,
    quantity,
    price,
  }));
  if (rows.length > 0) db.insert(offerBreaks).values(rows).run();
}

export function addOffer(db: Db, row: NewOfferRow, breaks: OfferWithBreaks["breaks"]): OfferRow {
  const offer = db.insert(offers).values(row).returning().get();
  setBreaks(db, offer, breaks);
  return offer;
}

/** Adds many offers at once, each with its id and its ladder. */
export function addOffers(db: Db, rows: OfferWithBreaks[]): void {
  for (const chunk of inChunks(rows.map(({ offer }) => offer))) db.insert(offers).values(chunk).run();
  const rungs = rows.flatMap(({ offer, breaks }) =>
    breaks.map(({ quantity, price }) => ({
      workshopId: offer.workshopId,
      offerId: offer.id,
      quantity,
      price,
    })),
  );
  for (const chunk of inChunks(rungs)) db.insert(offerBreaks).values(chunk).run();
}

/** Every offer of a workshop. */
export function offersOf(db: Db, workshopId: string): OfferWithBreaks[] {
  return offersWhere(db, eq(offers.workshopId, workshopId));
}

/** Changes an offer and its ladder if it still has the version `seen`; `undefined` where it has moved on. */
export function changeOffer(
  db: Db,
  offerId: string,
  seen: number,
  change: Partial<OfferRow>,
  breaks: OfferWithBreaks["breaks"],
): OfferRow | undefined {
  const offer = db
    .update(offers)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(offers.id, offerId), eq(offers.version, seen)))
    .returning()
    .get();
  if (offer) setBreaks(db, offer, breaks);
  return offer;
}

/** Removes an offer that still has the version `seen`; whether it was there. */
export function removeOffer(db: Db, offerId: string, seen: number): boolean {
  const gone = db
    .delete(offers)
    .where(and(eq(offers.id, offerId), eq(offers.version, seen)))
    .run();
  return gone.changes > 0;
}
