import { dayWords } from "./day-words.ts";
import type { WorkingContext } from "./working.ts";
import { from, money, number, type Sheet, type Step, step, summed } from "./working-lines.ts";

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
