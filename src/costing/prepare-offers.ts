import type { PlanOffer, PlanPart } from "#src/shapes/plan.ts";
import { byText } from "./by-name.ts";
import { prepareLadder } from "./ladder.ts";
import { quantityProblems } from "./ladder-problems.ts";
import type { Preparing } from "./prepare-plan.ts";
import type { PreparedOffer, PreparedPart } from "./prepared-plan.ts";
import type { CautionCode, NeedCode } from "./problem.ts";
import type { OfferStanding } from "./run-result.ts";

/** What is said about an offer that is set aside; standings that need no word of their own are null. */
const SAID: Record<OfferStanding, CautionCode | NeedCode | null> = {
  usable: null,
  short: null,
  "minimum-not-reached": null,
  expired: "offer-expired",
  "no-price": "offer-without-price",
  "no-rate": "no-rate",
  "other-currency": "offer-other-currency",
  "stock-not-known": "offer-stock-not-known",
  "impossible-ladder": "offer-impossible-ladder",
  "no-supplier": "offer-without-supplier",
  "shut-out": "supplier-shut-out",
  "amount-too-large": "amount-too-large",
};

/**
 * The offers of a part (sections 3 and 5): which may be used, and why the others may not. A pinned
 * offer leaves only itself; one that may not be used leaves the part unpriced rather than being
 * replaced behind the user's back.
 */
export function prepareOffers(
  part: PlanPart,
  buyMost: number,
  preparing: Preparing,
): Pick<PreparedPart, "offers" | "usable"> {
  const offers = part.offers.map((offer) => {
    const standing = standingOf(offer, part, preparing);
    const prepared = standing === "usable" ? prepareOffer(offer, part, buyMost, preparing) : null;
    const code = SAID[standing];
    if (code !== null) {
      const at = { part: part.id, offer: offer.id, supplier: offer.supplier, currency: offer.currency };
      preparing.problems.push({ code, at, facts: offer.validUntil ? { day: offer.validUntil } : {} });
    }
    return { offer, standing, prepared };
  });
  const usable = offers
    .flatMap(({ prepared }) => prepared ?? [])
    .filter(({ offer }) => part.pinnedOffer === null || offer.id === part.pinnedOffer)
    .sort((a, b) => a.supplier.index - b.supplier.index || byText(a.offer.id, b.offer.id));
  usable.forEach((offer, rank) => {
    offer.rank = rank;
  });
  if (part.pinnedOffer !== null && usable.length === 0) {
    const at = { part: part.id, offer: part.pinnedOffer };
    preparing.problems.push({ code: "pinned-offer-unusable", at, facts: {} });
  }
  return { offers, usable };
}

function standingOf(offer: PlanOffer, part: PlanPart, preparing: Preparing): OfferStanding {
  const supplier = preparing.suppliers.get(offer.supplier);
  if (supplier === undefined) return "no-supplier";
  if (supplier.shutOut) return "shut-out";
  if (offer.breaks.length === 0) return "no-price";
  if (offer.validUntil !== null && offer.validUntil < preparing.plan.asOf) return "expired";
  if (offer.currency !== supplier.terms.currency) return "other-currency";
  if (preparing.worthOf(offer.currency) === null) return "no-rate";
  if (part.onlyFromStock && offer.stockShown === null) return "stock-not-known";
  if (quantityProblems(offer).some(isImpossible)) return "impossible-ladder";
  return "usable";
}

/** A break below the minimum, or out of order, is a slip that still leaves one meaning. */
function isImpossible({ code }: { code: string }): boolean {
  return code === "quantity-repeats" || code === "lot-not-multiple";
}

function prepareOffer(
  offer: PlanOffer,
  part: PlanPart,
  buyMost: number,
  preparing: Preparing,
): PreparedOffer | null {
  const supplier = preparing.suppliers.get(offer.supplier);
  const worth = preparing.worthOf(offer.currency);
  if (supplier === undefined || worth === null) return null;
  const cap = part.onlyFromStock ? (offer.stockShown ?? 0) : Number.POSITIVE_INFINITY;
  return {
    offer,
    supplier,
    worth,
    ladder: prepareLadder(offer, cap, buyMost),
    bucket: preparing.bucketOf(worth, part.keepShare),
    rank: 0,
  };
}
