import { divideUp } from "./whole.ts";

/** A spare rate as whole part and millionths, so that products stay exact: 0.02 is 0 and 20 000; and the least spare. */
export interface SpareTerms {
  spareWhole: number;
  spareMillionths: number;
  leastSpare: number;
}

/**
 * Spare pieces for a need (section 2): `max(least spare, ⌈spare rate × need⌉)`. Where nothing is
 * needed nothing is kept spare either. Pieces; exact for needs up to 10^9.
 *
 * @example 2 % of 720, at least 1: spareOf(720, { spareWhole: 0, spareMillionths: 20_000, leastSpare: 1 }) === 15
 */
export function spareOf(need: number, terms: SpareTerms): number {
  if (need === 0) return 0;
  const byRate = terms.spareWhole * need + divideUp(terms.spareMillionths * need, 1_000_000);
  return Math.max(byRate, terms.leastSpare);
}

/**
 * Need of a part (section 2): `Σ kits of the edition × pieces per kit of the edition`.
 *
 * @example needOf([60, 60], [6, 5]) === 660
 */
export function needOf(kits: readonly number[], perKit: readonly number[]): number {
  let need = 0;
  for (let edition = 0; edition < kits.length; edition += 1) {
    need += (kits[edition] as number) * (perKit[edition] as number);
  }
  return need;
}
