import { countText, moneyText, rateText, roundMoneyText, shareText } from "#src/components/amount-text.ts";
import type { Figure } from "#src/costing/figure.ts";
import { needsInShort } from "#src/costing/problem-words.ts";

const MINUS = "\u2212";

/** A figure of money as written, or what it needs. */
export function moneyOf(figure: Figure, currency: string): string {
  return figure.known ? moneyText(figure.value, currency) : needsInShort(figure.needs);
}

/** What goes off: with a minus; nothing is a dash, since it does not apply. */
export function offText(figure: Figure, currency: string): string {
  if (!figure.known) return needsInShort(figure.needs);
  if (/^-?0*\.?0*$/.test(figure.value)) return "–";
  const negative = figure.value.startsWith("-");
  const text = moneyText(negative ? figure.value.slice(1) : figure.value, currency);
  return negative ? text : `${MINUS}${text}`;
}

/** A count of kits, or what it needs. */
export function countOf(figure: Figure): string {
  return figure.known ? countText(figure.value) : needsInShort(figure.needs);
}

/** A share in whole hundredths, or what it needs. */
export function shareOf(figure: Figure): string {
  return figure.known ? shareText(figure.value) : needsInShort(figure.needs);
}

/** Minutes as they are, to a tenth: "18.5 min". */
export function minutesOf(figure: Figure): string {
  if (!figure.known) return needsInShort(figure.needs);
  return `${(Math.round(Number(figure.value) * 10) / 10).toString()}\u00a0min`;
}

/** A price in few figures: without cents where it has none, "€34". */
export function priceText(price: string, currency: string): string {
  return /^\d+(\.0*)?$/.test(price) ? roundMoneyText(price, currency) : moneyText(price, currency);
}

/** What a price without its own has to do with the list: "27 % off the list", "6 % above the list". */
export function discountWords(discount: string): string {
  if (/^-?0(\.0*)?$/.test(discount)) return "as on the list";
  return discount.startsWith("-")
    ? `${rateText(discount.slice(1))} above the list`
    : `${rateText(discount)} off the list`;
}

/** "55, 20, 15 and 10": several in a row. */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join("");
  return `${words.slice(0, -1).join(", ")} and ${words.at(-1)}`;
}
