import { roundedText } from "#src/costing/decimal.ts";
import { minorDecimals } from "#src/costing/money.ts";

/** How amounts and quantities are written on screen. Exact text comes in; rounding here is for reading only. */

/** Parts thousands and currency codes without letting the line break there. */
const NO_BREAK = "\u00a0";
const MINUS = "\u2212";
const SIGNS: Readonly<Record<string, string>> = { EUR: "€", USD: "$", GBP: "£", JPY: "¥" };

/** "€" or, for a currency without a sign of its own here, "CHF". */
export function currencySign(currency: string): string {
  return SIGNS[currency] ?? currency;
}

function grouped(whole: string): string {
  return whole.replace(/\B(?=(\d{3})+$)/g, NO_BREAK);
}

function withSign(digits: string, currency: string): string {
  const negative = digits.startsWith("-");
  const [whole = "0", part] = (negative ? digits.slice(1) : digits).split(".");
  const sign = SIGNS[currency] ?? `${currency}${NO_BREAK}`;
  return `${negative ? MINUS : ""}${sign}${grouped(whole)}${part === undefined ? "" : `.${part}`}`;
}

/**
 * Money to the minor unit of its currency.
 *
 * @example moneyText("1793.647", "EUR") === "€1 793.65"
 */
export function moneyText(value: string, currency: string): string {
  return withSign(roundedText(value, minorDecimals(currency)), currency);
}

/** Money without cents, for axes and forecasts. */
export function roundMoneyText(value: string, currency: string): string {
  return withSign(roundedText(value, 0), currency);
}

/** A change with its sign, always: "+€0.11", "−€2.14". */
export function changeText(value: string, currency: string): string {
  const text = moneyText(value, currency);
  return text.startsWith(MINUS) ? text : `+${text}`;
}

/** The price of one piece as it was quoted: at least three decimals, more where it has more. */
export function unitPriceText(value: string, currency: string): string {
  const [whole = "0", part = ""] = value.split(".");
  return withSign(`${whole}.${part.replace(/0+$/, "").padEnd(3, "0")}`, currency);
}

/** A quantity: "1 000". */
export function countText(count: number): string {
  return `${count < 0 ? MINUS : ""}${grouped(String(Math.abs(count)))}`;
}

/**
 * A share as it is spoken of: "0.975" is "97.5 %".
 */
export function shareText(share: string): string {
  const [whole = "0", part = ""] = roundedText(shiftedTwo(share), 4).split(".");
  const rest = part.replace(/0+$/, "");
  return `${whole}${rest === "" ? "" : `.${rest}`}${NO_BREAK}%`;
}

/** The same digits with the point two places on: times a hundred, exactly. */
function shiftedTwo(share: string): string {
  const [whole = "0", part = ""] = share.split(".");
  const padded = part.padEnd(2, "0");
  return `${whole}${padded.slice(0, 2)}.${padded.slice(2) || "0"}`;
}
