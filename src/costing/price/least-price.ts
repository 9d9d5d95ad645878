import { ONE } from "#src/costing/grains.ts";
import { MONEY_WHOLE_DIGITS } from "#src/shapes/limits.ts";
import { type Fraction, fraction, minus, over, plus, times } from "./fraction.ts";
import type { PriceGrid } from "./price-ending.ts";

/** A condition on a price that rounding makes uneven, with the even line it stays near. */
export interface PriceSearch {
  grid: PriceGrid;
  /** How far the aim is passed at a price in grains; it is reached from nothing upward. */
  gap: (price: bigint) => Fraction;
  /** The same without rounding: a straight line in the price. */
  line: (price: bigint) => Fraction;
  /** The most by which the two differ. */
  slack: Fraction;
  /** By how much the line would rise with the price, if all of it were kept. */
  whole: Fraction;
}

/** The least price in grains, or why there is none. */
export type PriceFound =
  | { found: "price"; price: bigint; before: bigint | null }
  /** Of one unit of price more, less than a thousandth is kept, or less than nothing. */
  | { found: "nothing-left" }
  | { found: "too-large" };

/** Prices from here on are not given: more digits than an amount may have. */
export const PRICE_END = 10n ** BigInt(MONEY_WHOLE_DIGITS) * ONE;
const THOUSANDTH = fraction(1n, 1000n);

/**
 * The least price of a grid at which `gap` is not below nothing. Because tax and fee are rounded the gap
 * goes up and down by a cent on its way up, so it is neither divided out nor bisected: below the price
 * at which even `line` + `slack` is short, no price can do; from there the grid is tried one after the
 * other, and at the latest where `line` − `slack` suffices one does. `before` is the grid price below,
 * at which the aim fails; null at the grid's first.
 *
 * Where hardly anything of a higher price is kept no price is given, unless the first of the grid does.
 *
 * @example kept(P) ≥ 14.95 with 21 % inside: 18.09, not 18.08
 */
export function leastPrice({ grid, gap, line, slack, whole }: PriceSearch): PriceFound {
  const reaches = (price: bigint) => gap(price).top >= 0n;
  if (reaches(grid.first)) return { found: "price", price: grid.first, before: null };
  const atNothing = line(0n);
  const rise = over(minus(line(PRICE_END), atNothing), fraction(PRICE_END));
  if (minus(rise, times(whole, THOUSANDTH)).top <= 0n) return { found: "nothing-left" };
  const short = plus(atNothing, slack);
  const from = short.top >= 0n ? 0n : upward(over(fraction(-short.top, short.bottom), rise));
  let price = grid.first + grid.step * stepsTo(from - grid.first, grid.step);
  if (price === grid.first) price += grid.step;
  while (price < PRICE_END) {
    if (reaches(price)) return { found: "price", price, before: price - grid.step };
    price += grid.step;
  }
  return { found: "too-large" };
}

function upward({ top, bottom }: Fraction): bigint {
  return top <= 0n ? 0n : (top + bottom - 1n) / bottom;
}

function stepsTo(distance: bigint, step: bigint): bigint {
  return distance <= 0n ? 0n : (distance + step - 1n) / step;
}
