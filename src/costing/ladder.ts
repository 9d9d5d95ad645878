import { scaled } from "./grains.ts";
import { type LotTable, lotTable } from "./lots.ts";
import { minorDecimals } from "./money.ts";
import { divideBigHalfAway, divideHalfUp, ORDER_MOST, SAFE, upToMultiple } from "./whole.ts";

/** What a price ladder needs: the commercial terms of one offer or board quote. */
export interface LadderTerms {
  priceModel: "whole-order" | "by-slice" | "lots";
  currency: string;
  breaks: readonly { quantity: number; price: string }[];
  minimumOrder: number;
  orderMultiple: number;
}

/** A quantity of one offer and what it costs, in minor units of its currency, rounded (section 1.3). */
export interface Order {
  quantity: number;
  cost: number;
  /** Index of the price break reached; −1 for lots. */
  tier: number;
}

/** Unit price in millionths: Infinity where that is no whole number below 2^50, and `exactPrice` is asked. */
export interface Price {
  millionths: number;
  text: string;
}

/**
 * A ladder made ready for asking many quantities: breaks in ascending order, and for each the best
 * order that buys at least up to it.
 */
export interface Ladder {
  model: LadderTerms["priceModel"];
  from: number[];
  prices: Price[];
  minimum: number;
  multiple: number;
  /** Most pieces one order may take: Infinity, or the stock shown. */
  cap: number;
  divisor: number;
  /** By slice: cost in millionths of all full slices below each break. */
  below: bigint[];
  /** Whole order: the cheapest first-permitted order among this break and those above it. */
  onward: (Order | null)[];
  lots: LotTable | null;
}

/**
 * Prepares a ladder. Nothing may be ordered below the first break, since no price is stated there.
 * `cap` is the stock shown where only stock may be ordered, else Infinity; `quantityMost` the
 * largest quantity that will be asked of a ladder of lots.
 */
export function prepareLadder(terms: LadderTerms, cap: number, quantityMost: number): Ladder {
  const breaks = terms.breaks.toSorted((a, b) => a.quantity - b.quantity);
  const prices = breaks.map(({ price }) => priceOf(price));
  const ladder: Ladder = {
    model: terms.priceModel,
    from: breaks.map(({ quantity }) => quantity),
    prices,
    minimum: Math.max(terms.minimumOrder, terms.priceModel === "lots" ? 1 : (breaks[0]?.quantity ?? 1)),
    multiple: terms.orderMultiple,
    cap,
    divisor: 10 ** (6 - minorDecimals(terms.currency)),
    below: terms.priceModel === "by-slice" ? fullSlices(breaks, prices) : [],
    onward: [],
    lots: null,
  };
  if (terms.priceModel === "lots")
    ladder.lots = lotTable(breaks, terms.currency, cap, Math.max(quantityMost, ladder.minimum));
  if (terms.priceModel === "whole-order") ladder.onward = cheapestOnward(ladder);
  return ladder;
}

/**
 * The order for `quantity` pieces (section 3): the permitted order of at least so many with the
 * least cost; on a tie the smaller. Whole order: within a break more pieces never cost less, so the
 * only rivals are the least permitted quantity and the first permitted one of each higher break.
 * By slice the least permitted quantity is best, since every further piece costs something or
 * nothing. `null`: the offer cannot cover the quantity.
 *
 * @example 735 LEDs in bags of 100 from breaks 500 at 0.094, 1000 at 0.062 → 1000 for 6200 cents
 */
export function cheapestOrder(ladder: Ladder, quantity: number): Order | null {
  if (ladder.lots) return cheapestLots(ladder, ladder.lots, quantity);
  const least = upToMultiple(Math.max(quantity, ladder.minimum), ladder.multiple);
  if (least > ladder.cap) return null;
  const tier = tierOf(ladder, least);
  const cost = costOf(ladder, tier, least);
  const higher = ladder.onward[tier + 1];
  if (higher && higher.cost < cost) return higher;
  return { quantity: least, cost, tier };
}

/**
 * Index of the price break a quantity reaches.
 *
 * @example breaks 100, 500, 1000: 735 pieces reach index 1
 */
export function tierOf(ladder: Ladder, quantity: number): number {
  let tier = ladder.from.length - 1;
  while (tier > 0 && (ladder.from[tier] ?? 0) > quantity) tier -= 1;
  return tier;
}

/**
 * Extended price of a quantity at a break, in minor units, halves up; beyond `ORDER_MOST` it is Infinity.
 *
 * @example 800 at 0.094 → 7520 cents
 */
export function costOf(ladder: Ladder, tier: number, quantity: number): number {
  const price = ladder.prices[tier] as Price;
  if (ladder.model === "whole-order") {
    const product = price.millionths * quantity;
    if (product < SAFE) return divideHalfUp(product, ladder.divisor);
    return bounded(divideBigHalfAway(exactPrice(price) * BigInt(quantity), BigInt(ladder.divisor)));
  }
  const inTier = tier === 0 ? quantity : quantity - (ladder.from[tier] ?? 0) + 1;
  const exact = (ladder.below[tier] ?? 0n) + exactPrice(price) * BigInt(inTier);
  return bounded(divideBigHalfAway(exact, BigInt(ladder.divisor)));
}

function cheapestLots(ladder: Ladder, lots: LotTable, quantity: number): Order | null {
  const found = lots.cover(Math.max(quantity, ladder.minimum));
  return found && { ...found, tier: -1 };
}

function cheapestOnward(ladder: Ladder): (Order | null)[] {
  const onward: (Order | null)[] = ladder.from.map(() => null);
  let best: Order | null = null;
  for (let tier = ladder.from.length - 1; tier >= 0; tier -= 1) {
    const least = upToMultiple(Math.max(ladder.from[tier] ?? 0, ladder.minimum), ladder.multiple);
    const next = ladder.from[tier + 1] ?? Number.POSITIVE_INFINITY;
    if (least < next && least <= ladder.cap) {
      const cost = costOf(ladder, tier, least);
      if (best === null || cost <= best.cost) best = { quantity: least, cost, tier };
    }
    onward[tier] = best;
  }
  return onward;
}

/** Pieces below each break at their own prices, in millionths; below the first break its price holds. */
function fullSlices(breaks: readonly { quantity: number }[], prices: readonly Price[]): bigint[] {
  let sum = 0n;
  return breaks.map(({ quantity }, tier) => {
    const before = breaks[tier - 1];
    if (before === undefined) return 0n;
    const pieces = tier === 1 ? quantity - 1 : quantity - before.quantity;
    sum += exactPrice(prices[tier - 1] as Price) * BigInt(pieces);
    return sum;
  });
}

function priceOf(text: string): Price {
  const [whole = "0", fraction = ""] = text.split(".");
  const millionths = Number(whole + fraction.padEnd(6, "0"));
  return { text, millionths: millionths < SAFE ? millionths : Number.POSITIVE_INFINITY };
}

/**
 * A unit price in millionths, however large.
 *
 * @example exactPrice("0.094") === 94_000n
 */
export function exactPrice({ text }: Price): bigint {
  return scaled(text, 6);
}

function bounded(minor: bigint): number {
  return minor <= BigInt(ORDER_MOST) ? Number(minor) : Number.POSITIVE_INFINITY;
}
