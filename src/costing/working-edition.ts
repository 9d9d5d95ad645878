import { DIRECT_COSTS, type DirectCost, editionCosts } from "./edition-costs.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, notKnown, type Sheet, type Step, step, summed } from "./working-lines.ts";

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
