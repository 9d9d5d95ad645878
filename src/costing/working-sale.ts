import { DIRECT_COSTS, type DirectCost, editionCosts } from "./edition-costs.ts";
import { scaled, scaledText } from "./grains.ts";
import { minorDecimals } from "./money.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, notKnown, rate, type Sheet, type Step, step, summed } from "./working-lines.ts";

/** What one sale of an edition keeps (section 10). */
export function saleSheet({ prepared, result }: WorkingContext, id: string): Sheet | null {
  const edition = result.editions.find((one) => one.id === id);
  if (edition === undefined) return null;
  const { sale } = edition;
  const terms = prepared.plan.sale;
  const { currency } = result;
  const rounds = minorDecimals(currency);
  const page = from("price", id);
  const amount = (value: string | null) =>
    value === null ? notKnown(sale.kept.known ? [] : sale.kept.needs) : money(value, currency);
  const share = (value: string | null) =>
    value === null ? notKnown(sale.kept.known ? [] : sale.kept.needs) : rate(value);
  const onePlusTax = terms.taxRate === null ? null : scaledText(1_000_000n + scaled(terms.taxRate, 6), 6);
  return {
    title: `Kept from one sale: ${edition.name}`,
    steps: [
      step(null, "Price, tax inside", amount(sale.price), "10", { source: page }),
      step("+", "Postage charged", amount(terms.postageCharged), "10", { source: page }),
      step("=", "The buyer pays", money(sale.charged, currency), "10"),
      step("×", "Tax rate", share(terms.taxRate), "10", { source: page }),
      step("÷", "One and the tax rate", share(onePlusTax), "10"),
      step("=", "Tax inside", money(sale.taxInside, currency), "1.3", { rounds }),
      step(null, "The buyer pays", money(sale.charged, currency), "10"),
      step("×", "Fee rate", share(terms.feeRate), "10", { source: page }),
      step("+", "Fee per order", amount(terms.feeFixed), "10", { source: page }),
      step("=", "Fee", money(sale.fee, currency), "1.3", { rounds }),
      step(null, "The buyer pays", money(sale.charged, currency), "10"),
      step("−", "Tax inside", money(sale.taxInside, currency), "10"),
      step("−", "Fee", money(sale.fee, currency), "10"),
      step("−", "Postage paid", money(sale.postagePaid, currency), "10", { source: page }),
      step("=", "Kept from one sale", money(sale.kept, currency), "10", { result: true }),
    ],
    notes: ["Tax and fee are each rounded once, to the cent, halves up, as they are charged."],
    basis: `In ${currency}`,
  };
}

const DIRECT_NAMES: Record<DirectCost, string> = {
  boards: "Boards, by boards",
  parts: "Parts, by pieces",
  packing: "Packing material",
  making: "Work on its kits",
  replacements: "Replacements, by kits",
};

/** What an edition's kits cost in the used view: direct and its share of joint costs (section 8). */
export function editionSheet({ prepared, result, sheet }: WorkingContext, id: string): Sheet | null {
  const index = result.editions.findIndex((one) => one.id === id);
  const edition = result.editions[index];
  if (edition === undefined) return null;
  const { currency } = result;
  const costs = editionCosts(prepared, sheet);
  const at = (list: readonly bigint[]) => list[index] ?? 0n;
  const needs = edition.cost.used.known ? null : notKnown(edition.cost.used.needs);
  const line = (label: string, value: bigint): Step[] =>
    value === 0n ? [] : [step("+", label, needs ?? money(value, currency), "8")];
  const lines = [
    ...DIRECT_COSTS.flatMap((head) => line(DIRECT_NAMES[head], at(costs.direct[head]))),
    ...line("Stock taken less what keeps on the shelf", at(costs.shelf)),
    ...line("Share of freight, one-off charges and setting up", at(costs.joint.used)),
  ];
  return {
    title: `${edition.name}: ${edition.kits} kits in a run of ${result.kits}`,
    steps: [
      ...summed(lines),
      step(lines.length === 0 ? null : "=", "Cost of its kits", money(edition.cost.used, currency), "8"),
      step("÷", "Its kits", count(edition.kits, "kits"), "2", { source: from("run") }),
      step("=", `Cost per kit, ${edition.name}`, money(edition.perKit.used, currency), "8", { result: true }),
    ],
    notes: ["Joint costs are shared by value of direct cost. The editions add up to the run exactly."],
  };
}
