/**
 * Decimal text handled digit by digit: values and prices of a list are never put through a binary
 * fraction. A decimal text is digits with at most one point: "0.0047", "4700".
 */

/** Drops needless zeros: "004.70" is "4.7", ".5" is "0.5". */
export function tidyDecimal(text: string): string {
  const [whole = "", fraction = ""] = text.split(".");
  const left = whole.replace(/^0+(?=\d)/, "") || "0";
  const right = fraction.replace(/0+$/, "");
  return right === "" ? left : `${left}.${right}`;
}

/** The decimal text times ten to the power `places`: ("4.7", 3) is "4700", ("100", -9) is "0.0000001". */
export function shiftDecimal(text: string, places: number): string {
  const [whole = "", fraction = ""] = text.split(".");
  const digits = whole + fraction;
  const point = whole.length + places;
  if (point >= digits.length) return tidyDecimal(digits.padEnd(point, "0"));
  if (point <= 0) return tidyDecimal(`0.${digits.padStart(digits.length - point, "0")}`);
  return tidyDecimal(`${digits.slice(0, point)}.${digits.slice(point)}`);
}

/** Digits and power of ten: "0.0047" is 47 and -4; zero is "0" and 0. */
export function scientific(text: string): { digits: string; exponent: number } {
  const tidy = tidyDecimal(text);
  const [whole = "", fraction = ""] = tidy.split(".");
  const all = whole + fraction;
  const digits = all.replace(/^0+/, "").replace(/0+$/, "");
  if (digits === "") return { digits: "0", exponent: 0 };
  const trailing = all.length - all.replace(/0+$/, "").length;
  return { digits, exponent: trailing - fraction.length };
}

/** Negative, zero or positive as `a` is less than, equal to or more than `b`. */
export function compareDecimals(a: string, b: string): number {
  const [left, right] = [tidyDecimal(a).split("."), tidyDecimal(b).split(".")];
  const places = Math.max(left[1]?.length ?? 0, right[1]?.length ?? 0);
  const [x, y] = [left, right].map(([whole = "0", fraction = ""]) =>
    BigInt(whole + fraction.padEnd(places, "0")),
  );
  return x === undefined || y === undefined || x === y ? 0 : x < y ? -1 : 1;
}

/** Whole-number division of decimal text by a whole number, to at most `places` decimals, half up. */
export function divideDecimal(text: string, by: bigint, places: number): string {
  const [whole = "0", fraction = ""] = tidyDecimal(text).split(".");
  const scaled = BigInt(whole + fraction.padEnd(places, "0").slice(0, Math.max(places, fraction.length)));
  const extra = BigInt(10) ** BigInt(Math.max(0, fraction.length - places));
  const divisor = by * extra;
  const quotient = (scaled * 2n + divisor) / (divisor * 2n);
  return shiftDecimal(quotient.toString(), -places);
}
