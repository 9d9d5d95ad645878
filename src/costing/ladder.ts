import { scaled, scaledDigits } from "./grains.ts";
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
  /** In ascending order. */
  rungs: Rung[];
  minimum: number;
  multiple: number;
  /** Most pieces one order may take: Infinity, or the stock shown. */
  cap: number;
  /** Millionths of a unit in a minor unit. */
  divisor: number;
  lots: LotTable | null;
}

/** One break of a ladder. */
export interface Rung extends Price {
  from: number;
  /** By slice: cost in millionths of all full slices below. */
  below: bigint;
  /** Whole order: the cheapest first-permitted order among the breaks above. */
  higher: Order | null;
}

/**
 * Prepares a ladder. Nothing may be ordered below the first break, since no price is stated there.
 * `cap` is the stock shown where only stock may be ordered, else Infinity; `quantityMost` the
 * largest quantity that will be asked of a ladder of lots.
 */
export function prepareLadder(terms: LadderTerms, cap: number, quantityMost: number): Ladder {
  const breaks = terms.breaks.toSorted((a, b) => a.quantity - b.quantity);
  const ladder: Ladder = {
    model: terms.priceModel,
    rungs: breaks.map(rungOf),
    minimum: Math.max(terms.minimumOrder, terms.priceModel === "lots" ? 1 : (breaks[0]?.quantity ?? 1)),
    multiple: terms.orderMultiple,
    cap,
    divisor: 10 ** (6 - minorDecimals(terms.currency)),
    lots: null,
  };
  if (terms.priceModel === "lots")
    ladder.lots = lotTable(breaks, terms.currency, cap, Math.max(quantityMost, ladder.minimum));
  if (terms.priceModel === "whole-order") setHigher(ladder);
  if (terms.priceModel === "by-slice") setBelow(ladder.rungs);
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
  const order = { quantity: 0, cost: 0, tier: -1 };
  return findOrder(ladder, quantity, order) ? order : null;
}

/**
 * The same, written into an order that exists, for asking thousands of quantities; false: the offer
 * cannot cover the quantity, and the order is left as it was.
 */
export function findOrder(ladder: Ladder, quantity: number, into: Order): boolean {
  if (ladder.lots) return findLots(ladder, ladder.lots, quantity, into);
  const least = upToMultiple(Math.max(quantity, ladder.minimum), ladder.multiple);
  if (least > ladder.cap) return false;
  const tier = tierOf(ladder, least);
  const cost = costOf(ladder, tier, least);
  const { higher } = ladder.rungs[tier] as Rung;
  return higher !== null && higher.cost < cost
    ? setOrder(into, higher.quantity, higher.cost, higher.tier)
    : setOrder(into, least, cost, tier);
}

function setOrder(into: Order, quantity: number, cost: number, tier: number): true {
  into.quantity = quantity;
  into.cost = cost;
  into.tier = tier;
  return true;
}

/**
 * Index of the price break a quantity reaches.
 *
 * @example breaks 100, 500, 1000: 735 pieces reach index 1
 */
export function tierOf(ladder: Ladder, quantity: number): number {
  let tier = ladder.rungs.length - 1;
  while (tier > 0 && fromOf(ladder, tier) > quantity) tier -= 1;
  return tier;
}

/** Quantity from which a break counts; 0 for an index the ladder does not have. */
export function fromOf(ladder: Ladder, tier: number): number {
  return ladder.rungs[tier]?.from ?? 0;
}

/**
 * Extended price of a quantity at a break, in minor units, halves up; beyond `ORDER_MOST` it is Infinity.
 *
 * @example 800 at 0.094 → 7520 cents
 */
export function costOf(ladder: Ladder, tier: number, quantity: number): number {
  const rung = ladder.rungs[tier] as Rung;
  if (ladder.model === "whole-order") {
    const product = rung.millionths * quantity;
    if (product < SAFE) return divideHalfUp(product, ladder.divisor);
    return bounded(divideBigHalfAway(exactPrice(rung) * BigInt(quantity), BigInt(ladder.divisor)));
  }
  const inTier = tier === 0 ? quantity : quantity - rung.from + 1;
  const exact = rung.below + exactPrice(rung) * BigInt(inTier);
  return bounded(divideBigHalfAway(exact, BigInt(ladder.divisor)));
}

function findLots(ladder: Ladder, lots: LotTable, quantity: number, into: Order): boolean {
  const found = lots.cover(Math.max(quantity, ladder.minimum));
  return found !== null && setOrder(into, found.quantity, found.cost, -1);
}

/** From the top down: the best of the first permitted orders above each break. */
function setHigher(ladder: Ladder): void {
  let best: Order | null = null;
  let next = Number.POSITIVE_INFINITY;
  for (let tier = ladder.rungs.length - 1; tier >= 0; tier -= 1) {
    const rung = ladder.rungs[tier] as Rung;
    rung.higher = best;
    const least = upToMultiple(Math.max(rung.from, ladder.minimum), ladder.multiple);
    if (least < next && least <= ladder.cap) {
      const cost = costOf(ladder, tier, least);
      if (best === null || cost <= best.cost) best = { quantity: least, cost, tier };
    }
    next = rung.from;
  }
}

/** Pieces below each break at their own prices; below the first break its price holds. */
function setBelow(rungs: readonly Rung[]): void {
  for (let tier = 1; tier < rungs.length; tier += 1) {
    const [before, rung] = [rungs[tier - 1] as Rung, rungs[tier] as Rung];
    const pieces = tier === 1 ? rung.from - 1 : rung.from - before.from;
    rung.below = before.below + exactPrice(before) * BigInt(pieces);
  }
}

function rungOf({ quantity, price }: LadderTerms["breaks"][number]): Rung {
  const { millionths, text } = priceOf(price);
  return { from: quantity, millionths, text, below: 0n, higher: null };
}

/** Decimal text with at most six decimals as a price. */
export function priceOf(text: string): Price {
  const millionths = Number(scaledDigits(text, 6));
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
