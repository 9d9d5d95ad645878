import { minorDecimals } from "#src/costing/money.ts";
import { roundedText } from "#src/costing/rounded-text.ts";

/** How figures are written on pages: DESIGN's rules for money, counts and shares, in one place. */

const NO_BREAK = "\u00a0";
const MINUS = "\u2212";

/** Signs that stand before the figure without a space; any other currency is written by its letters. */
const SIGNS: Record<string, string> = { EUR: "€", USD: "$", GBP: "£", JPY: "¥", INR: "₹", KRW: "₩" };

export function currencySign(currency: string): string {
  return SIGNS[currency] ?? currency;
}

/** Thousands parted by a no-break space: "1 793.65". */
function parted(unsigned: string): string {
  const [whole = "0", part] = unsigned.split(".");
  const groups = whole.replace(/\B(?=(\d{3})+(?!\d))/g, NO_BREAK);
  return part === undefined ? groups : `${groups}.${part}`;
}

function withSign(rounded: string, currency: string | null, plus: boolean): string {
  const negative = rounded.startsWith("-");
  const sign = negative ? MINUS : plus ? "+" : "";
  const symbol = currency === null ? "" : (SIGNS[currency] ?? `${currency}${NO_BREAK}`);
  return `${sign}${symbol}${parted(negative ? rounded.slice(1) : rounded)}`;
}

/** Exact decimal text as money, rounded to the currency's minor unit: "€1 793.65", "−€2.14". */
export function moneyText(amount: string, currency: string): string {
  return withSign(roundedText(amount, minorDecimals(currency)), currency, false);
}

/** A change, always with its sign: "+€84.94". */
export function changeText(amount: string, currency: string): string {
  return withSign(roundedText(amount, minorDecimals(currency)), currency, true);
}

/** Money without cents, for axes and forecasts: "€1 500". */
export function roundMoneyText(amount: string, currency: string): string {
  return withSign(roundedText(amount, 0), currency, false);
}

/** A figure of a money axis: without cents, unless the axis counts in less than a whole unit. */
export function axisMoneyText(value: number, ticks: readonly number[], currency: string): string {
  const whole = ticks.every(Number.isInteger);
  return whole ? roundMoneyText(String(value), currency) : moneyText(String(value), currency);
}

/** A unit price: three decimals, more where the price has them: "€0.062", "€0.0043". */
export function unitPriceText(amount: string, currency: string): string {
  const places = Math.max(3, minorDecimals(currency), (amount.split(".")[1] ?? "").replace(/0+$/, "").length);
  return withSign(roundedText(amount, Math.min(places, 6)), currency, false);
}

/** An amount without its currency, for columns whose head names it. */
export function plainMoneyText(amount: string, currency: string): string {
  return withSign(roundedText(amount, minorDecimals(currency)), null, false);
}

/** A count: "1 000". */
export function countText(whole: number | string): string {
  return withSign(roundedText(String(whole), 0), null, false);
}

export function signedCountText(whole: string): string {
  return withSign(roundedText(whole, 0), null, true);
}

/** A share of 0 to 1 in whole hundredths: "43 %". */
export function shareText(part: string): string {
  return `${withSign(roundedText(shifted(part), 0), null, false)}${NO_BREAK}%`;
}

/** A rate as it was entered: "0.029" is "2.9 %". */
export function rateText(part: string): string {
  return `${roundedText(shifted(part), 4).replace(/\.?0+$/, "")}${NO_BREAK}%`;
}

/** Decimal text times 100, by moving its point. */
function shifted(part: string): string {
  const [, sign = "", whole = "", after = ""] = /^(-?)(\d*)\.?(\d*)$/.exec(part) ?? [];
  const digits = `${whole}${after.padEnd(2, "0")}`;
  const point = whole.length + 2;
  return `${sign}${digits.slice(0, point) || "0"}.${digits.slice(point) || "0"}`;
}
