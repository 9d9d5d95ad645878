import { convertedEach } from "./converted-each.ts";
import {
  cheapestOrder,
  costOf,
  fromOf,
  type Ladder,
  type LadderTerms,
  prepareLadder,
  tierOf,
} from "./ladder.ts";
import { minorText } from "./money.ts";
import { upToMultiple } from "./whole.ts";

/** What a number of pieces costs at one offer. Amounts in the offer's currency, to its minor unit. */
export interface CurvePoint {
  quantity: number;
  /** The cheapest order that holds so many, and what it costs. */
  order: number;
  pays: string;
  /** What the least permitted order of so many costs; the same where buying up saves nothing. */
  listed: string;
}

/** Quantities that may be ordered and are never worth it: more of them cost less. */
export interface NeverWorth {
  from: number;
  to: number;
}

/** One rung of a ladder for a number that is needed. */
export interface RungOrder {
  /** The break as the offer states it. */
  quantity: number;
  price: string;
  /** Least permitted order that reaches this break and holds what is needed; null where a higher break does. */
  order: number | null;
  costs: string | null;
  over: number | null;
}

const ANY = Number.POSITIVE_INFINITY;

/**
 * What any number costs (section 3): a point for each of `quantities` that one offer can cover, in ascending
 * order. Prices have no cap on stock here: the curve shows the price list.
 *
 * @example breaks 1 at 1.00, 10 at 0.50: 6 pieces → order 10, pays "5.00", listed "6.00"
 */
export function orderCurve(terms: LadderTerms, quantities: readonly number[]): CurvePoint[] {
  const ladder = prepareLadder(terms, ANY, Math.max(1, ...quantities));
  return quantities.flatMap((quantity) => {
    const best = cheapestOrder(ladder, quantity);
    if (best === null || best.cost === ANY) return [];
    const listed = listedCost(ladder, quantity) ?? best.cost;
    if (listed === ANY) return [];
    const pays = minorText(best.cost, terms.currency);
    return [{ quantity, order: best.quantity, pays, listed: minorText(listed, terms.currency) }];
  });
}

function listedCost(ladder: Ladder, quantity: number): number | null {
  if (ladder.lots) return null;
  const least = leastOrder(ladder, quantity);
  return costOf(ladder, tierOf(ladder, least), least);
}

function leastOrder(ladder: Ladder, quantity: number): number {
  return upToMultiple(Math.max(quantity, ladder.minimum), ladder.multiple);
}

/**
 * Ranges of permitted quantities that nobody should order, because a higher break costs less in total
 * (section 3). Only whole-order prices have them. Within a break cost rises with quantity, so the first
 * such quantity of each is found by halving.
 *
 * @example breaks 1 at 1.00, 10 at 0.50 → [{ from: 6, to: 9 }]
 */
export function neverWorthBuying(terms: LadderTerms): NeverWorth[] {
  if (terms.priceModel !== "whole-order" || terms.breaks.length < 2) return [];
  const ladder = prepareLadder(terms, ANY, 1);
  const ranges: NeverWorth[] = [];
  for (let tier = 0; tier < ladder.rungs.length - 1; tier += 1) {
    const least = leastOrder(ladder, fromOf(ladder, tier));
    const last = lastBelow(ladder, fromOf(ladder, tier + 1));
    const from = firstDearer(ladder, tier, least, last);
    if (from !== null) joinRange(ranges, { from, to: last }, ladder.multiple);
  }
  return ranges;
}

function lastBelow(ladder: Ladder, quantity: number): number {
  return upToMultiple(quantity, ladder.multiple) - ladder.multiple;
}

function firstDearer(ladder: Ladder, tier: number, least: number, last: number): number | null {
  const rival = ladder.rungs[tier]?.higher;
  if (!rival || least > last || costOf(ladder, tier, last) <= rival.cost) return null;
  let [low, high] = [0, (last - least) / ladder.multiple];
  while (low < high) {
    const middle = Math.floor((low + high) / 2);
    if (costOf(ladder, tier, least + middle * ladder.multiple) > rival.cost) high = middle;
    else low = middle + 1;
  }
  return least + low * ladder.multiple;
}

/** Two ranges without a permitted quantity between them are one. */
function joinRange(ranges: NeverWorth[], next: NeverWorth, multiple: number): void {
  const before = ranges.at(-1);
  if (before && before.to + multiple >= next.from) before.to = next.to;
  else ranges.push(next);
}

/**
 * The rungs of a ladder, lowest first, each with the order that would be placed on it for `quantity` pieces.
 * Not for lots, which have no rungs.
 *
 * @example 735 LEDs in bags of 100, rung 500 at 0.094 → order 800, costs "75.20", over 65
 */
export function rungOrders(terms: LadderTerms, quantity: number): RungOrder[] {
  const ladder = prepareLadder(terms, ANY, quantity);
  const breaks = terms.breaks.toSorted((a, b) => a.quantity - b.quantity);
  return breaks.map((rung, tier) => {
    const order = leastOrder(ladder, Math.max(quantity, rung.quantity));
    const cost = costOf(ladder, tier, order);
    if (tierOf(ladder, order) !== tier || cost === ANY)
      return { ...rung, order: null, costs: null, over: null };
    return { ...rung, order, costs: minorText(cost, terms.currency), over: order - quantity };
  });
}

/**
 * Cost of an order per kit of the run, in reporting units, to the nearest grain.
 *
 * @example orderPerKit("75.20", "1", 120) → "0.62666…"
 */
export function orderPerKit(costs: string, perForeignUnit: string, kits: number): string {
  return convertedEach(costs, perForeignUnit, kits);
}
