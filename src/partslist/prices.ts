import { divideDecimal } from "./exact-decimal.ts";
import { currencyOf } from "./headings.ts";
import { readNumber } from "./numbers.ts";
import type { DecimalMark } from "./sheet.ts";

export type ReadMoney =
  | { kind: "empty" }
  | { kind: "price"; amount: string; currency: string | null }
  /** "0,66/100": either each from 100 up, or for 100 together. */
  | { kind: "per"; amount: string; per: number; each: string; currency: string | null }
  | { kind: "unclear"; text: string };

const UNKNOWN =
  /^(?:\?+|-+|–|—|n\/?a|tbd|tba|none|unknown|not known|on request|auf anfrage|anfrage|sur demande|free|kostenlos|x)$/i;
const EACH =
  /(?:each|ea\.?|\/? ?(?:pcs?|piece|unit|stk|st|stück)\.?|p\.? ?st(?:k|ück)?\.?|per (?:piece|unit|pc)|pro st(?:ück|k)\.?|\/\s?1)$/i;
const PER =
  /^(.*?\d)\D{0,6}?\s*(?:\/|per|pro|je|par|por|for|für)\s*(\d{1,6})(?:\s*(?:pcs?|st(?:k|ück)?|pieces?|szt|ks)\.?)?$/i;
const FOR_FIRST = /^(\d{1,6})\s*(?:for|für|pcs? for|x)\s*(\D*\d.*)$/i;

/** Digits an each price is worked out to from a price for many; more than any supplier prints. */
const EACH_PLACES = 6;

/** A price cell: "$2.25", " 0.93 € ", "1.234,56", "0,66/100", "10 for 5.00", "???". */
export function readMoney(cell: string, mark: DecimalMark | null = null): ReadMoney {
  const text = cell.replace(/[\u00a0\u202f]/g, " ").trim();
  if (text === "" || UNKNOWN.test(text)) return { kind: "empty" };
  const plain = amountIn(text, mark);
  const currency = currencyOf(text);
  if (plain !== null) return { kind: "price", amount: plain, currency };
  const per = PER.exec(text) ?? reversed(FOR_FIRST.exec(text));
  const amount = per ? amountIn(per[1] ?? "", mark) : null;
  const count = per ? Number(per[2]) : 0;
  if (amount !== null && count > 1)
    return {
      kind: "per",
      amount,
      per: count,
      each: divideDecimal(amount, BigInt(count), EACH_PLACES),
      currency,
    };
  const each = EACH.test(text) ? amountIn(text.replace(EACH, ""), mark) : null;
  return each === null ? { kind: "unclear", text } : { kind: "price", amount: each, currency };
}

function reversed(found: RegExpExecArray | null): [string, string, string] | null {
  return found ? [found[0], found[2] ?? "", found[1] ?? ""] : null;
}

function amountIn(text: string, mark: DecimalMark | null): string | null {
  const bare = text
    .replace(
      /(?:EUR|USD|GBP|CHF|SEK|NOK|DKK|PLN|CZK|HUF|RUB|UAH|JPY|CNY|RMB|AUD|CAD|INR|BRL|zł|Kč|kr\.?|руб\.?|грн|Fr\.|euros?)/gi,
      "",
    )
    .replace(/[€$£¥₽₴₹元円]/g, "")
    .replace(/^[~≈]|,-+$|\.-+$/g, "")
    .trim();
  return /^[\d.,'’ ]+$/.test(bare) ? readNumber(bare, mark) : null;
}
