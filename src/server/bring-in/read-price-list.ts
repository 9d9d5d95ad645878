import type { KnownPart, PriceDraft, PriceReadResult } from "#src/partslist/price-draft.ts";
import { readPrices } from "#src/partslist/read-prices.ts";
import { NAME_LENGTH } from "#src/shapes/limits.ts";
import { type ListDraft, type ListSource, openList } from "./list-draft.ts";
import type { WantedOffer } from "./wanted-offer.ts";

/** A price list, the parts it may speak of, and whose it is where no column says. */
export interface PricesSource extends ListSource {
  parts: KnownPart[];
  supplier: string | null;
}

export interface PricesReading {
  draft: ListDraft;
  result: PriceReadResult;
  /** Offers that would be taken: with a part and a supplier, suggestions carried out where a question is open. */
  wanted: WantedOffer[];
  /** Offers with a part whose supplier nobody has named. */
  unnamed: number;
}

function wantedOffer(offer: PriceDraft, part: string, supplier: string): WantedOffer {
  return {
    partId: part,
    supplier: { name: supplier.slice(0, NAME_LENGTH) },
    orderCode: (offer.orderCode ?? "").slice(0, NAME_LENGTH),
    currency: offer.currency,
    breaks: offer.breaks.map(({ quantity, amount }) => ({ quantity, price: amount })),
    minimumOrder: offer.minimumOrder,
    orderMultiple: offer.orderMultiple,
    stockShown: offer.stockShown,
    leadTimeDays: offer.leadTimeDays,
    at: `rows.${offer.rows[0] ?? 0}`,
  };
}

/** Reads a price list. The same source gives the same reading. */
export function readPriceList(source: PricesSource): PricesReading {
  const draft = openList(source);
  const { answers } = source.decisions;
  const { parts, supplier } = source;
  const result = readPrices({
    records: draft.sheet.records,
    mapping: draft.mapping,
    answers,
    parts,
    supplier,
  });
  const wanted: WantedOffer[] = [];
  let unnamed = 0;
  for (const row of result.rows) {
    const offer = row.kind === "offer" || row.kind === "question" ? row.offer : null;
    if (!offer || offer.part === null) continue;
    if (offer.supplier === null) unnamed++;
    else wanted.push(wantedOffer(offer, offer.part, offer.supplier));
  }
  return { draft, result, wanted, unnamed };
}
