import { dayWords } from "./day-words.ts";
import type { QuoteResult } from "./run-result.ts";
import type { WorkingContext } from "./working.ts";
import {
  count,
  from,
  money,
  notKnown,
  number,
  type Sheet,
  type Step,
  step,
  summed,
} from "./working-lines.ts";

/** One order to one supplier, its charges and each line's share of them (section 4). */
export function basketSheet({ prepared, result }: WorkingContext, id: string): Sheet | null {
  const basket = result.baskets.find(({ supplier }) => supplier === id);
  if (basket === undefined) return null;
  const { currency } = basket;
  const source = from("offers", id);
  const nameOf = (part: string) => prepared.plan.parts.find((one) => one.id === part)?.name ?? part;
  const goods = basket.lines.map((line) =>
    step("+", `${nameOf(line.part)}, ${line.quantity}`, money(line.extended, currency), "4.1", {
      opens: `part:${line.part}`,
    }),
  );
  const charges = [
    step("+", "Small-order fee", money(basket.smallOrderFee, currency), "4.1", { source }),
    step(
      "+",
      basket.freeFreightReached ? "Freight, free from this value" : "Freight",
      money(basket.freight, currency),
      "4.2",
      { source },
    ),
    step("+", "Handling", money(basket.handling, currency), "4.2", { source }),
  ].filter(
    ({ amount }) => amount?.kind === "not-known" || (amount?.kind === "money" && /[1-9]/.test(amount.value)),
  );
  const shares = basket.lines.map((line) =>
    step("+", `${nameOf(line.part)}, landed`, money(line.landed, result.currency), "4.4"),
  );
  return {
    title: `The order to ${basket.name} for a run of ${result.kits}`,
    steps: [
      ...summed(goods),
      step("=", "Goods", money(basket.goods, currency), "4.1"),
      ...charges,
      step("=", "The order", money(basket.total, currency), "4.2", { result: basket.rate === null }),
      ...rateSteps(result.currency, currency, basket.rate, money(basket.converted.total, result.currency)),
      ...summed(shares),
      step("=", "All lines landed", money(basket.converted.total, result.currency), "4.4"),
    ],
    notes: [
      "Freight and fees are shared by value; the shares add up to them exactly.",
      ...(basket.toFreeFreight === null
        ? []
        : [`Freight is free with ${basket.toFreeFreight} ${currency} more of goods.`]),
    ],
    basis: `In ${currency}, without VAT`,
  };
}

type Rate = { perForeignUnit: string; dated: string } | null;

function rateSteps(to: string, of: string, rate: Rate, converted: Step["amount"]): Step[] {
  if (rate === null) return [];
  return [
    step("×", `Rate of ${dayWords(rate.dated)}`, number(rate.perForeignUnit, `${to} for one ${of}`), "1.4", {
      source: from("offers"),
    }),
    step("=", "Converted", converted, "1.4", { result: true }),
  ];
}

/** A board house's quote at this run size (section 6). */
export function quoteSheet(context: WorkingContext, id: string): Sheet | null {
  const { result, prepared } = context;
  const quote = result.boards.quotes.find((one) => one.id === id);
  const worth = prepared.quotes.find((one) => one.quote.id === id)?.worth;
  if (quote === undefined) return null;
  const source = from("boards", id);
  const charges = (["engineering", "stencil", "freight"] as const)
    .map((name) => step("+", CHARGE_NAMES[name], chargeAmount(quote, name), "6", { source }))
    .filter(
      ({ amount }) =>
        amount?.kind === "not-known" || (amount?.kind === "money" && /[1-9]/.test(amount.value)),
    );
  return {
    title: `${quote.boardHouse}, boards for a run of ${result.kits}`,
    steps: [
      step(
        null,
        "Boards to order",
        result.boards.toOrder === null
          ? notKnown([...needsOf(quote)])
          : count(result.boards.toOrder, "boards"),
        "6",
        { opens: "boards-to-order" },
      ),
      ...boardSteps(quote),
      ...charges,
      step("=", `${quote.boardHouse} charges`, money(quote.total, quote.currency), "6"),
      ...rateSteps(
        result.currency,
        quote.currency,
        worth?.rate ?? null,
        money(quote.landed, result.currency),
      ).map((one) => ({ ...one, result: false })),
      step("÷", "Boards in the kits", count(result.boards.required, "boards"), "6"),
      step("=", "One board", money(quote.perBoard, result.currency), "6", { result: true }),
    ],
    notes: quoteNotes(quote),
    basis: `In ${quote.currency}, without VAT`,
  };
}

const CHARGE_NAMES = { engineering: "Engineering", stencil: "Stencil", freight: "Freight" };

function chargeAmount(quote: QuoteResult, name: "engineering" | "stencil" | "freight"): Step["amount"] {
  const amount = quote[name];
  return amount === null ? notKnown([...needsOf(quote)]) : money(amount, quote.currency);
}

function needsOf(quote: QuoteResult) {
  return quote.landed.known ? [] : quote.landed.needs;
}

function boardSteps(quote: QuoteResult): Step[] {
  const { currency, boards, breakReached, ordered } = quote;
  if (boards === null || ordered === null) return [step(null, "Boards", notKnown([...needsOf(quote)]), "6")];
  const source = from("boards", quote.id);
  if (breakReached !== null) {
    return [
      step(null, "Boards ordered", count(ordered, "boards"), "3", { source }),
      step("×", `Price each from ${breakReached.quantity}`, money(breakReached.price, currency, 6), "3", {
        source,
      }),
      step("=", "Boards", money(boards, currency), "1.3", { rounds: boards.split(".")[1]?.length ?? 0 }),
    ];
  }
  const lots = quote.lots.map((lot) => `${lot.count} of ${lot.quantity} for ${lot.price}`).join(", ");
  return [step(null, `Lots: ${lots}`, money(boards, currency), "3", { source })];
}

function quoteNotes(quote: QuoteResult): string[] {
  const notes: string[] = [];
  if (quote.extra !== null && quote.extra > 0)
    notes.push(`${quote.ordered} are ordered, ${quote.extra} more than the kits hold.`);
  if (quote.boughtUp)
    notes.push(`${quote.ordered} cost ${quote.boughtUp.saves} less than ${quote.boughtUp.insteadOf}.`);
  return notes;
}
