import { divideBigHalfAway } from "#src/costing/whole.ts";
import { type Fraction, reduced } from "./fraction.ts";

/** What one kit of each edition brings, over one common denominator; null: not known. */
export interface Takings {
  tops: readonly (bigint | null)[];
  bottom: bigint;
}

/**
 * Brings amounts per kit to one denominator, so that kits of several editions add up with one division,
 * exactly: three times a third is one.
 *
 * @example takingsOf([a third, a half]) → { tops: [2n, 3n], bottom: 6n }
 */
export function takingsOf(perKit: readonly (Fraction | null)[]): Takings {
  const lowest = perKit.map((one) => (one === null ? null : reduced(one)));
  const bottom = lowest.reduce(
    (common, one) => (one === null ? common : common * reduced({ top: common, bottom: one.bottom }).bottom),
    1n,
  );
  return {
    tops: lowest.map((one) => (one === null ? null : one.top * (bottom / one.bottom))),
    bottom,
  };
}

/**
 * What so many kits of each edition bring, to the nearest grain; null where a sold edition's is not known.
 *
 * @example 20 at 25.30 and 10 at 6.10 → 567.00
 */
export function takingsFrom({ tops, bottom }: Takings, sales: readonly number[]): bigint | null {
  let sum = 0n;
  for (let index = 0; index < sales.length; index += 1) {
    const kits = sales[index] as number;
    if (kits === 0) continue;
    const top = tops[index] ?? null;
    if (top === null) return null;
    sum += top * BigInt(kits);
  }
  return bottom === 1n ? sum : divideBigHalfAway(sum, bottom);
}
