import type { Plan } from "#src/shapes/plan.ts";
import { dayWords } from "./day-words.ts";
import type { AimProblem, CautionCode, Need, NeedCode, Place, Problem } from "./problem.ts";

/** The one table that turns codes of the reckoning into words; what a second language would replace. */

/** Short, for where a figure would stand: "needs 2 prices". `n` places, `codes` of currencies. */
const SHORT: Record<NeedCode, (n: number, codes: string) => string> = {
  "no-parts": () => "needs parts",
  "no-mix": () => "needs a mix of editions",
  "unpriced-part": (n) => (n === 1 ? "needs 1 price" : `needs ${n} prices`),
  "short-part": (n) => (n === 1 ? "1 part is short" : `${n} parts are short`),
  "order-refused": (n) => (n === 1 ? "1 order is too small" : `${n} orders are too small`),
  "no-rate": (_, codes) => `no rate for ${codes}`,
  "no-freight": (n) => (n === 1 ? "needs a supplier's freight" : `needs freight of ${n} suppliers`),
  "no-board-quote": () => "needs a board quote",
  "no-board-freight": () => "needs the boards' freight",
  "no-board-yield": () => "needs a higher yield",
  "no-board-size": () => "needs the board's size",
  "no-packing-cost": (n) => (n === 1 ? "needs 1 packing cost" : `needs ${n} packing costs`),
  "no-hourly-rate": () => "needs an hourly rate",
  "no-replacement-cost": () => "needs the cost of a replacement",
  "no-stock-cost": (n) => (n === 1 ? "needs 1 book cost" : `needs ${n} book costs`),
  "no-price": (n) => (n === 1 ? "needs a price" : `needs ${n} prices`),
  "no-tax-rate": () => "needs the tax rate",
  "no-fee-rate": () => "needs the fee rate",
  "no-fixed-fee": () => "needs the fee per order",
  "no-postage-charged": () => "needs the postage charged",
  "no-postage-paid": () => "needs the postage paid",
  "no-order-packing": () => "needs the packing of an order",
  "no-other-cost": () => "needs what else selling costs",
  "no-order-minutes": () => "needs the time to sell",
  "not-sold": () => "sold nowhere",
  "costs-nothing": () => "costs nothing",
  "no-work": () => "needs work",
  "not-in-run": () => "not in this run",
  "nothing-made": () => "nothing to make",
  "not-even": () => "not even if all sell",
  "amount-too-large": () => "an amount is too large",
};

/** What a partial total leaves out: "without 3 unpriced lines". */
const LEFT_OUT: Partial<Record<NeedCode, (n: number, codes: string) => string>> = {
  "no-parts": () => "parts",
  "unpriced-part": (n) => (n === 1 ? "1 unpriced line" : `${n} unpriced lines`),
  "short-part": (n) => (n === 1 ? "1 line that is short" : `${n} lines that are short`),
  "order-refused": (n) => (n === 1 ? "1 line whose order is refused" : `${n} lines whose orders are refused`),
  "no-rate": (_, codes) => `what is priced in ${codes}`,
  "no-freight": (n) => (n === 1 ? "the freight of 1 supplier" : `the freight of ${n} suppliers`),
  "no-board-quote": () => "boards",
  "no-board-freight": () => "the boards' freight",
  "no-board-yield": () => "boards",
  "no-board-size": () => "boards",
  "no-packing-cost": (n) => (n === 1 ? "1 packing cost" : `${n} packing costs`),
  "no-hourly-rate": () => "work",
  "no-replacement-cost": () => "replacements",
  "no-stock-cost": (n) => (n === 1 ? "the stock of 1 part" : `the stock of ${n} parts`),
};

/** Names of the things a place points to. */
interface Named {
  part: string;
  supplier: string;
  quote: string;
  edition: string;
  packing: string;
  currency: string;
  offer: string;
}

/** What happened and what to do, one sentence or two. `f`: facts as text, empty where there are none. */
const SENTENCES: Record<
  NeedCode | CautionCode,
  (at: Named, f: Record<"by" | "amount" | "day", string>) => string
> = {
  "no-parts": () => "There are no parts yet. Bring in a parts list, or write the first line.",
  "no-mix": () => "No edition has a share in the run. Give at least one of them a weight.",
  "unpriced-part": ({ part }) => `${part} has no price that can be used. Add an offer with a price.`,
  "short-part": ({ part }, { by }) =>
    `${part} is short by ${by}: all offers together have fewer in stock. Add an offer, or allow orders beyond the stock shown.`,
  "order-refused": ({ part, supplier }, { amount }) =>
    `${part} is sold only by ${supplier}, who refuses an order this small. ${amount} more of goods would do, or another offer.`,
  "no-rate": ({ currency }) => `There is no rate for ${currency}. Add one with its date.`,
  "no-freight": ({ supplier }) =>
    `What ${supplier} charges for freight is not known. Write it into its terms.`,
  "no-board-quote": () => "There is no board quote that can be used. Add one, or choose another.",
  "no-board-freight": ({ quote }) =>
    `The quote of ${quote} says nothing about freight. Write it in; 0 if it is free.`,
  "no-board-yield": () => "With this yield no number of boards is enough. Check the yield.",
  "no-board-size": ({ quote }) =>
    `The quote of ${quote} is a formula, and the size of what it prices is not known. Write it in.`,
  "no-packing-cost": ({ packing }) => `${packing} has no cost per kit. Write it in; 0 if it costs nothing.`,
  "no-hourly-rate": () => "There is no hourly rate. Write one; 0 counts the hours at nothing.",
  "no-replacement-cost": () =>
    "Some kits will need a part sent again, and what that costs is not known. Write it in.",
  "no-stock-cost": ({ part }) =>
    `${part} is taken from the shelf, and what it cost there is not known. Write its book cost.`,
  "no-price": ({ edition }) => `${edition} has no price. Set one.`,
  "no-tax-rate": () => "The tax rate inside the price is not set. Write it; 0 if there is none.",
  "no-fee-rate": () => "The fee on a sale is not set. Write its rate; 0 if there is none.",
  "no-fixed-fee": () => "The fixed fee per order is not set. Write it; 0 if there is none.",
  "no-postage-charged": () => "The postage charged to the buyer is not set. Write it; 0 if it is free.",
  "no-postage-paid": () => "The postage you pay is not set. Write it; 0 if you pay none.",
  "no-order-packing": () => "What the packing of an order costs is not known. Write it in; 0 if nothing.",
  "no-other-cost": () => "What else selling costs is not known. Write it in; 0 if nothing.",
  "no-order-minutes": () => "How long it takes to sell and send an order is not known. Write the minutes.",
  "not-sold": ({ edition }) => `No channel sells ${edition}. Let one sell it, with a share above 0.`,
  "costs-nothing": ({ edition }) => `${edition} costs nothing in this run, so there is no mark-up on it.`,
  "no-work": () => "No task has any minutes, so nothing is earned per hour. Add a task.",
  "not-in-run": ({ edition }) => `${edition} has no kits in this run.`,
  "nothing-made": () => "Nothing of it is made in this run.",
  "not-even": () => "Even if every kit sells, the run makes a loss. Raise the price, or make more.",
  "amount-too-large": ({ part }) =>
    `An order for ${part} comes to more than can be reckoned. Check price and quantity.`,
  "currency-not-listed": ({ currency }) =>
    `${currency} is not on the ISO 4217 list of 2024-06-25. Amounts in it are rounded to two decimals.`,
  "offer-expired": ({ part, supplier }, { day }) =>
    `The offer of ${supplier} for ${part} was valid until ${day} and is not used. Ask again, or write the new date.`,
  "offer-without-price": ({ part, supplier }) =>
    `The offer of ${supplier} for ${part} has no price and is not used.`,
  "offer-other-currency": ({ part, supplier, currency }) =>
    `The offer for ${part} is in ${currency}, which is not the currency of ${supplier}, and is not used. Change one of the two.`,
  "offer-stock-not-known": ({ part, supplier }) =>
    `${part} is to be bought only from stock, and what ${supplier} has is not known. Write it in, or allow orders beyond it.`,
  "price-old": ({ part, supplier }, { day }) =>
    day === ""
      ? `The price of ${supplier} for ${part} has no day. Ask again, or write when it was seen.`
      : `The price of ${supplier} for ${part} is of ${day}. Ask again, or write the new day.`,
  "stock-short": ({ part, supplier }, { by }) =>
    `${supplier} shows ${by} fewer of ${part} than are ordered. Ask when more come, or take another offer.`,
  "offer-impossible-ladder": ({ part, supplier, quote }) =>
    `The price breaks of ${quote || `${supplier} for ${part}`} repeat a quantity or do not fit the order multiple. Correct them.`,
  "offer-without-supplier": ({ part }) =>
    `An offer for ${part} names a supplier that is not in the plan and is not used.`,
  "supplier-shut-out": ({ part, supplier }) =>
    `${supplier} is left out of this run, with its offer for ${part}.`,
  "pinned-offer-unusable": ({ part }) =>
    `The offer chosen for ${part} cannot be used. Choose another, or let the cheapest be taken.`,
  "below-minimum-fee": ({ supplier }, { amount }) =>
    `The order to ${supplier} is ${amount} below its minimum, so a small-order fee is added.`,
  "minimum-not-reached": ({ supplier }, { amount }) =>
    `${supplier} refuses the order, which is ${amount} below its minimum; its parts are bought elsewhere where they can be.`,
  "quote-expired": ({ quote }, { day }) =>
    `The quote of ${quote} was valid until ${day} and is not used. Ask again.`,
  "quote-without-price": ({ quote }) => `The quote of ${quote} has no price and is not used.`,
  "quote-without-size": ({ quote }) =>
    `The quote of ${quote} prices by area, and its size is not stated, so it is not used. Write it in.`,
  "pinned-quote-unusable": ({ quote }) =>
    `The quote of ${quote} is chosen and cannot be used. Choose another.`,
};

/** Why no price does it, and what would help. `most`: a share as text. */
const NO_PRICE: Record<AimProblem["code"], (edition: string, most: string) => string> = {
  "nothing-kept": (edition) =>
    `Tax and fees take what a higher price of ${edition} brings, so no price reaches this. Lower the fee.`,
  "margin-too-high": (edition, most) =>
    `After tax and fees at most ${most} of a higher price of ${edition} is kept, so no price reaches this margin. Aim lower.`,
  "price-fixed": (edition) =>
    `Every channel has its own price for ${edition}, so its list price changes nothing. Clear one of them.`,
  "price-too-large": (edition) => `${edition} would need a price too large to write. Aim lower.`,
  "no-such-ending": () => "The currency has no amount with this ending. Choose another.",
};

/**
 * Why no price reaches an aim, as a sentence. `most` is written by the caller, as shares are on the page.
 *
 * @example aimSentence(problem, "Full kit", "95.00 %") for margin-too-high
 */
export function aimSentence({ code }: AimProblem, edition: string, most = ""): string {
  return NO_PRICE[code](edition, most);
}

/**
 * Why a figure is not known, for its place: the first need, and how many more there are.
 *
 * @example two unpriced parts and no hourly rate → "needs 2 prices and 1 thing more"
 */
export function needWords(needs: readonly Need[]): string {
  const [first] = needs;
  if (first === undefined) return "not known";
  const words = SHORT[first.code](first.at.length, currenciesOf(first));
  const more = needs.length - 1;
  if (more === 0) return words;
  return `${words} and ${more} ${more === 1 ? "thing" : "things"} more`;
}

/**
 * The same for a narrow cell. A kit without parts is told that first; of several other things their number.
 *
 * @example no parts and no price → "needs both"
 */
export function needsInShort(needs: readonly Need[]): string {
  const codes = needs.map(({ code }) => code);
  if (codes.includes("no-parts")) return codes.includes("no-price") ? "needs both" : "needs parts";
  return needs.length > 1 ? `needs ${needs.length} things` : needWords(needs);
}

/**
 * What stands in the place of a price.
 *
 * @example one edition without a price → "not set"
 */
export function priceNeeds(needs: readonly Need[]): string {
  const [first] = needs;
  return needs.length === 1 && first?.code === "no-price" && first.at.length === 1
    ? "not set"
    : needsInShort(needs);
}

/**
 * The label of a partial total: all that it leaves out.
 *
 * @example "without 3 unpriced lines and work"
 */
export function withoutWords(needs: readonly Need[]): string {
  const parts = needs.flatMap((need) => LEFT_OUT[need.code]?.(need.at.length, currenciesOf(need)) ?? []);
  const last = parts.pop();
  if (last === undefined) return "in part";
  return parts.length === 0 ? `without ${last}` : `without ${parts.join(", ")} and ${last}`;
}

/**
 * A problem of the run as a sentence that names its things.
 *
 * @example no-rate at USD → "There is no rate for USD. Add one with its date."
 */
export function problemSentence({ code, at, facts }: Problem, plan: Plan): string {
  const amount = facts.amount === undefined ? "" : `${facts.amount} ${facts.currency ?? plan.currency}`;
  return SENTENCES[code](namesOf(at, plan), {
    by: facts.by === undefined ? "some" : facts.by.toString(),
    amount,
    day: facts.day === undefined ? "" : dayWords(facts.day),
  });
}

function currenciesOf({ at }: Need): string {
  return [...new Set(at.map(({ currency }) => currency ?? ""))].filter((code) => code !== "").join(", ");
}

function namesOf(at: Place, plan: Plan): Named {
  const named = (list: readonly { id: string; name: string }[], id: string | undefined, otherwise: string) =>
    list.find((one) => one.id === id)?.name ?? otherwise;
  return {
    part: named(plan.parts, at.part, "A part"),
    supplier: named(plan.suppliers, at.supplier, "its supplier"),
    quote: plan.boards.quotes.find(({ id }) => id === at.quote)?.boardHouse ?? "",
    edition: named(plan.editions, at.edition, "An edition"),
    packing: named(plan.packing, at.packing, "A packing item"),
    currency: at.currency ?? plan.currency,
    offer: at.offer ?? "",
  };
}
