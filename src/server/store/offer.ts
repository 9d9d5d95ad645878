import { asc, eq, inArray } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import { lines } from "#db/schema/parts.ts";
import { offerBreaks, offers } from "#db/schema/supply.ts";

export type OfferRow = typeof offers.$inferSelect;
export type OfferBreakRow = typeof offerBreaks.$inferSelect;

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

/** Every offer for a part of this kit's list, by id, so that the order is always the same. */
export function offersForKit(db: Db, kitId: string): OfferWithBreaks[] {
  const used = db.select({ id: lines.partId }).from(lines).where(eq(lines.kitId, kitId));
  const rows = db.select().from(offers).where(inArray(offers.partId, used)).orderBy(asc(offers.id)).all();
  const breaks = db
    .select({
      workshopId: offerBreaks.workshopId,
      offerId: offerBreaks.offerId,
      quantity: offerBreaks.quantity,
      price: offerBreaks.price,
    })
    .from(offerBreaks)
    .innerJoin(offers, eq(offers.id, offerBreaks.offerId))
    .where(inArray(offers.partId, used))
    .orderBy(asc(offerBreaks.quantity))
    .all();
  return withBreaks(rows, breaks);
}
