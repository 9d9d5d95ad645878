import { Decimal } from "decimal.js";

/**
 * The one decimal type of the reckoning: 40 significant digits, halves away from zero (section 1.1).
 * Its own constructor, so that no setting made elsewhere changes it. Never leaves this folder: plain
 * decimal text crosses every edge.
 *
 * @example exact("0.1").plus("0.2").toFixed() === "0.3"
 */
export const Exact = Decimal.clone({
  precision: 40,
  rounding: Decimal.ROUND_HALF_UP,
  toExpNeg: -60,
  toExpPos: 60,
  defaults: true,
});
export type Exact = Decimal;

/** Decimal text, or a whole number, as an exact decimal. */
export function exact(value: string | number): Exact {
  return new Exact(value);
}
