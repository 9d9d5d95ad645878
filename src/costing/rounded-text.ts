import { scaledDigits } from "./grains.ts";
import { divideBigHalfAway } from "./whole.ts";

/**
 * Rounds decimal text once, halves away from zero, and writes exactly `places` decimals (section 1.3). A zero has no
 * sign. Reckoned in whole numbers: every page writes figures, few need a decimal library.
 *
 * @example roundedText("14.947083", 2) === "14.95"; roundedText("-0.125", 2) === "-0.13"
 */
export function roundedText(value: string, places: number): string {
  const unsigned = value.startsWith("-") ? value.slice(1) : value;
  const point = unsigned.indexOf(".");
  const given = point < 0 ? 0 : unsigned.length - point - 1;
  const most = Math.max(given, places);
  const digits = BigInt(scaledDigits(unsigned, most));
  const rounded = divideBigHalfAway(digits, 10n ** BigInt(most - places));
  const text = rounded.toString().padStart(places + 1, "0");
  const whole = text.slice(0, text.length - places);
  const sign = rounded !== 0n && unsigned !== value ? "-" : "";
  return places === 0 ? sign + whole : `${sign}${whole}.${text.slice(-places)}`;
}
