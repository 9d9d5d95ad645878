import { countText } from "#src/components/amount-text.ts";
import { ageText } from "#src/components/day-text.ts";
import type { ChipKind } from "#src/components/islands/parts/Chip.tsx";
import { CLASS_WORDS } from "#src/components/part-words.ts";
import { shortDayWords } from "#src/costing/day-words.ts";
import { isOldPrice, stockShort } from "#src/costing/order-cautions.ts";
import type { ConsideredOffer, OfferStanding } from "#src/costing/run-result.ts";
import type { OfferPart } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { PlanOffer } from "#src/shapes/plan.ts";

/** A chip: its kind and its word, which says what is wrong. */
export interface Mark {
  kind: ChipKind;
  word: string;
}

type Standing = Exclude<OfferStanding, "usable" | "short" | "expired" | "no-rate">;

const WORDS: Record<Standing, Mark> = {
  "no-price": { kind: "bad", word: "No price" },
  "other-currency": { kind: "bad", word: "Other currency" },
  "stock-not-known": { kind: "caution", word: "Stock not shown" },
  "impossible-ladder": { kind: "bad", word: "Breaks repeat" },
  "no-supplier": { kind: "bad", word: "No supplier" },
  "shut-out": { kind: "caution", word: "Left out" },
  "minimum-not-reached": { kind: "bad", word: "Order too small" },
  "amount-too-large": { kind: "bad", word: "Too large" },
};

/** The chip of an offer in the table of a part. */
export function offerMark(offer: OfferView, considered: ConsideredOffer, today: string): Mark {
  const { standing, chosen, quantity, shortBy } = considered;
  if (standing === "expired")
    return { kind: "bad", word: offer.validUntil ? `Ended ${shortDayWords(offer.validUntil)}` : "Ended" };
  if (standing === "no-rate") return { kind: "bad", word: `No rate for ${offer.currency}` };
  if (standing === "short") return { kind: "bad", word: `${countText(shortBy)} short` };
  if (standing !== "usable") return WORDS[standing];
  const lacks = stockShort(offer, quantity);
  if (lacks > 0) return { kind: "bad", word: `${countText(lacks)} short` };
  if (chosen) return { kind: "good", word: "Chosen" };
  return isOldPrice(offer, today) ? { kind: "caution", word: "Old price" } : { kind: "plain", word: "Fits" };
}

/** "2 days old", "today", "day not known". */
export function seenText({ pricedOn }: Pick<PlanOffer, "pricedOn">, today: string): string {
  return pricedOn === null ? "day not known" : ageText(pricedOn, today);
}

/** A kind of part that is called by its letters keeps them: "LEDs", but "resistors". */
function kindOf(part: Pick<OfferPart, "class">): string {
  const { many } = CLASS_WORDS[part.class];
  return part.class === "led" ? many : many.toLowerCase();
}

/** "the LEDs", "the 10 kΩ resistors", "the acrylic disc": the part as one speaks of it. */
export function thePart(part: Pick<OfferPart, "class" | "name" | "value">): string {
  if (part.class === "mechanical" || part.class === "other" || part.class === "board")
    return `“${part.name}”`;
  return part.value === null ? `the ${kindOf(part)}` : `the ${part.name} ${kindOf(part)}`;
}

/** "LEDs bought", under an axis. */
export function piecesOf(part: Pick<OfferPart, "class">): string {
  const plain = part.class === "mechanical" || part.class === "other" || part.class === "board";
  return plain ? "pieces" : kindOf(part);
}

/** "Line 14", "Lines 3 and 9". */
export function lineText({ lines }: Pick<OfferPart, "lines">): string {
  const [first, ...others] = lines;
  if (others.length === 0) return `Line ${first}`;
  return `Lines ${[first, ...others.slice(0, -1)].join(", ")} and ${others.at(-1)}`;
}
