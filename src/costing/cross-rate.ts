import { exact } from "./decimal.ts";

/** Decimals of a conversion rate; more than any bank prints, and all that `ConversionRate` may have. */
const RATE_PLACES = 10;

/**
 * What one foreign unit is worth in reporting units, from what one unit of a third currency is worth in each,
 * as a bank publishes its rates: reporting per third unit ÷ foreign per third unit. Rounded once, half away from
 * zero, to ten decimals; `null` where that leaves nothing. Both rates are decimal text above 0.
 *
 * @example crossRate("1", "0.9764") === "1.024170422", one US dollar in euro on 3 October 2022
 */
export function crossRate(reportingPerUnit: string, foreignPerUnit: string): string | null {
  const rate = exact(reportingPerUnit).dividedBy(exact(foreignPerUnit)).toDecimalPlaces(RATE_PLACES);
  return rate.isZero() ? null : rate.toFixed();
}
