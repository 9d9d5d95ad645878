import { divideBigHalfAway } from "#src/costing/whole.ts";

/** An exact quotient of whole numbers; `bottom` is above 0. In this folder mostly grains over something. */
export interface Fraction {
  readonly top: bigint;
  readonly bottom: bigint;
}

/**
 * A whole number, or a quotient, as a fraction.
 *
 * @example fraction(45n, 25n) is 1.8
 */
export function fraction(top: bigint, bottom: bigint = 1n): Fraction {
  return { top, bottom };
}

/** Zero. */
export const NOTHING: Fraction = fraction(0n);

/**
 * Sum, exact.
 *
 * @example plus(fraction(1n, 3n), fraction(2n, 3n)) is 1
 */
export function plus(a: Fraction, b: Fraction): Fraction {
  if (a.bottom === b.bottom) return fraction(a.top + b.top, a.bottom);
  return fraction(a.top * b.bottom + b.top * a.bottom, a.bottom * b.bottom);
}

/**
 * Difference, exact.
 *
 * @example minus(fraction(1n), fraction(1n, 4n)) is 0.75
 */
export function minus(a: Fraction, b: Fraction): Fraction {
  return plus(a, fraction(-b.top, b.bottom));
}

/**
 * Product, exact.
 *
 * @example times(fraction(3n), fraction(1n, 4n)) is 0.75
 */
export function times(a: Fraction, b: Fraction): Fraction {
  return fraction(a.top * b.top, a.bottom * b.bottom);
}

/**
 * Quotient, exact; `b` is above 0.
 *
 * @example over(fraction(3n), fraction(4n)) is 0.75
 */
export function over(a: Fraction, b: Fraction): Fraction {
  return fraction(a.top * b.bottom, a.bottom * b.top);
}

/**
 * In lowest terms.
 *
 * @example reduced(fraction(45n, 25n)) → { top: 9n, bottom: 5n }
 */
export function reduced({ top, bottom }: Fraction): Fraction {
  let [a, b] = [top < 0n ? -top : top, bottom];
  while (b > 0n) [a, b] = [b, a % b];
  return fraction(top / a, bottom / a);
}

/**
 * The nearest whole number, halves away from zero.
 *
 * @example nearest(fraction(5n, 2n)) === 3n
 */
export function nearest({ top, bottom }: Fraction): bigint {
  return divideBigHalfAway(top, bottom);
}
