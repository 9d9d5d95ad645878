import { convertMinor } from "./conversion.ts";
import { grainText } from "./grains.ts";
import { minorText } from "./money.ts";
import { ordersOf } from "./order-parts.ts";
import type { PreparedOffer, PreparedPart } from "./prepared-plan.ts";
import type { ConsideredOffer } from "./run-result.ts";
import type { RunSheet } from "./run-sheet.ts";
import { mostOf } from "./split-order.ts";
import { better, type WeighedOffer, weigh } from "./supplier-choice.ts";

/** Every offer of the part weighed for what is to buy: usable ones best first, then those set aside. */
export function considered(
  part: PreparedPart,
  sheet: RunSheet,
  index: number,
  toBuy: number,
): ConsideredOffer[] {
  const taken = new Set(ordersOf(sheet, index).map(({ offer }) => offer.offer.id));
  const rows = part.offers.map(({ offer, standing, prepared }) => {
    const weighed = prepared === null || toBuy === 0 ? null : weigh(prepared, toBuy);
    const row = consideredRow(prepared, weighed, toBuy);
    const barred = prepared !== null && sheet.barred.has(prepared.supplier.index);
    return {
      weighed,
      row: {
        offer: offer.id,
        supplier: offer.supplier,
        chosen: taken.has(offer.id),
        pinned: part.part.pinnedOffer === offer.id,
        currency: offer.currency,
        ...row,
        standing: standing === "usable" ? (barred ? "minimum-not-reached" : row.standing) : standing,
      },
    };
  });
  const before = (a: (typeof rows)[number], b: (typeof rows)[number]) => {
    if (a.weighed === null || b.weighed === null)
      return Number(a.weighed === null) - Number(b.weighed === null);
    return better(a.weighed, b.weighed) ? -1 : better(b.weighed, a.weighed) ? 1 : 0;
  };
  return rows.sort(before).map(({ row }) => row);
}

function consideredRow(offer: PreparedOffer | null, weighed: WeighedOffer | null, toBuy: number) {
  const short = offer !== null && weighed === null && offer.ladder.cap !== Number.POSITIVE_INFINITY;
  return {
    quantity: weighed?.order.quantity ?? null,
    extended: weighed && minorText(weighed.order.cost, weighed.offer.worth.currency),
    aloneLanded: weighed?.freightKnown ? grainText(convertMinor(weighed.alone, weighed.offer.worth)) : null,
    leftOver: weighed && weighed.order.quantity - toBuy,
    shortBy: short && toBuy > 0 ? Math.max(0, toBuy - mostOf(offer)) : 0,
    standing: (short && toBuy > 0
      ? "short"
      : weighed === null && toBuy > 0
        ? "amount-too-large"
        : "usable") as ConsideredOffer["standing"],
  };
}
