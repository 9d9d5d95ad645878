import type { Plan } from "#src/shapes/plan.ts";
import { GRAIN_PLACES, ONE, scaled } from "./grains.ts";
import { minorDecimals } from "./money.ts";

const MILLION = 1_000_000n;

/** What one minor unit of a currency is worth in the plan's currency. */
export interface MinorWorth {
  currency: string;
  /** Exact, in grains. */
  grains: bigint;
  /** What a millionth of one unit is worth, in grains: unit prices have six decimals. */
  millionth: bigint;
  /** Near enough to tell clearly different sums apart; never part of a figure. */
  near: number;
  rate: { perForeignUnit: string; dated: string } | null;
}

/**
 * Conversion of section 1.4: reporting units per one foreign unit, applied after the foreign sum's own
 * rounding. Where a plan states a currency twice the rate of the later date counts. `null`: no rate.
 *
 * @example 1 USD = 0.8797 EUR: minorWorth(plan, "USD").grains is 0.008797 EUR
 */
export function minorWorth(plan: Plan, currency: string): MinorWorth | null {
  const perMinor = 10n ** BigInt(minorDecimals(currency));
  if (currency === plan.currency) {
    const own = ONE / perMinor;
    return { currency, grains: own, millionth: ONE / MILLION, near: Number(own), rate: null };
  }
  const stated = plan.rates.filter((rate) => rate.currency === currency);
  const rate = stated.reduce<Plan["rates"][number] | null>(
    (latest, next) => (latest === null || next.dated > latest.dated ? next : latest),
    null,
  );
  if (rate === null) return null;
  const unit = scaled(rate.perForeignUnit, GRAIN_PLACES);
  const worth = unit / perMinor;
  return {
    currency,
    grains: worth,
    millionth: unit / MILLION,
    near: Number(worth),
    rate: { perForeignUnit: rate.perForeignUnit, dated: rate.dated },
  };
}

/**
 * Compares two sums of minor units by their worth, exactly: below 0 when `a` is less. Sums that
 * differ by more than a billionth are told apart in floating point; nearer ones exactly.
 *
 * @example 200 US cents at 0.5 and 100 euro cents are equal: 0
 */
export function compareWorth(a: number, aWorth: MinorWorth, b: number, bWorth: MinorWorth): number {
  if (aWorth === bWorth) return a - b;
  const [left, right] = [a * aWorth.near, b * bWorth.near];
  if (left < right * (1 - 1e-9)) return -1;
  if (right < left * (1 - 1e-9)) return 1;
  const difference = BigInt(a) * aWorth.grains - BigInt(b) * bWorth.grains;
  return difference < 0n ? -1 : difference > 0n ? 1 : 0;
}

/**
 * Minor units of a currency as exact grains of the plan's.
 *
 * @example 12.34 USD at 0.8797: convertMinor(1234, worth) is 10.855498 EUR, exact
 */
export function convertMinor(minor: number, worth: MinorWorth): bigint {
  return BigInt(minor) * worth.grains;
}
