import { grains, grainText } from "#src/costing/grains.ts";
import { splitKits } from "#src/costing/split-kits.ts";
import {
  count,
  from,
  money,
  notKnown,
  type Sheet,
  type Step,
  step,
  summed,
} from "#src/costing/working-lines.ts";
import { evenAfterAt } from "./even-after-at.ts";
import { fraction, NOTHING, nearest, plus, times } from "./fraction.ts";
import type { PriceContext } from "./price-context.ts";
import { bringsPerKit, kitsSold } from "./run-sold.ts";
import { takingsFrom } from "./takings.ts";
import { unlessNeeds } from "./working-order.ts";
import { OWN_WORK } from "./working-order-left.ts";

/** What each edition's kits bring, after the time to sell them, and together. */
function broughtSteps(context: PriceContext): { steps: Step[]; total: bigint } {
  const { currency } = context.plan;
  const kits = kitsSold(context);
  const made = context.cost.editions.flatMap((edition, index) => {
    const sold = kits[index];
    return edition.kits === 0 || sold === undefined ? [] : [{ edition, sold }];
  });
  const cash = (value: bigint) => money(value, currency);
  const groups = made.map(({ edition, sold }) => {
    const brings = times(sold.brings, fraction(BigInt(edition.kits)));
    const label = `${edition.name} brings`;
    const shown = unlessNeeds(sold.needs.brings, cash(nearest(brings)));
    const steps = [
      step(null, `${edition.name}, one kit`, unlessNeeds(sold.needs.kept, cash(nearest(sold.kept))), "10", {
        opens: `kit-kept:${edition.id}`,
      }),
      step("−", "Time to sell it", unlessNeeds(sold.needs.timeCost, cash(nearest(sold.timeCost))), "7"),
      step("×", `${edition.name}, kits in the run`, count(edition.kits, "kits"), "2", {
        source: from("run"),
      }),
      step("=", label, shown, "11"),
    ];
    return { steps, brings, part: step("+", label, shown, "11") };
  });
  const total = groups.reduce((sum, { brings }) => plus(sum, brings), NOTHING);
  return {
    steps: [...groups.flatMap(({ steps }) => steps), ...summed(groups.map(({ part }) => part))],
    total: nearest(total),
  };
}

/** Profit of the run at the plan's prices, every kit sold (section 11). */
export function soldProfitSheet(context: PriceContext): Sheet {
  const { plan, cost } = context;
  const { steps, total } = broughtSteps(context);
  const needs = kitsSold(context).flatMap(({ needs }, index) =>
    cost.editions[index]?.kits === 0 ? [] : needs.brings,
  );
  const known = cost.used.known && needs.length === 0;
  const profit = known ? money(total - grains(cost.used.known ? cost.used.value : "0"), plan.currency) : null;
  return {
    title: `Profit of a run of ${cost.kits} if every kit sells`,
    steps: [
      ...steps,
      step("−", "Used by the run", money(cost.used, plan.currency), "8", { opens: "used" }),
      step("=", "Profit", profit ?? notKnown(cost.used.known ? needs : cost.used.needs), "11", {
        result: true,
      }),
    ],
    notes: [OWN_WORK],
    basis: `In ${plan.currency}, after tax, fees and postage`,
  };
}

/** How many of the run must sell: one fewer does not pay, these do (section 11). */
export function soldEvenSheet(context: PriceContext): Sheet {
  const { plan, cost } = context;
  const even = evenAfterAt(context);
  const sold = even.known ? Number(even.value) : null;
  const shown = sold === null ? [] : sold === 0 ? [0] : [sold - 1, sold];
  const amount = even.known ? count(even.value, "sold") : notKnown(even.needs);
  return {
    title: `Sold for no loss on a run of ${cost.kits}`,
    steps: [
      ...shown.flatMap((number) => compared(context, number)),
      step(null, "Even after", amount, "11", { result: true }),
    ],
    notes: ["Sales follow the mix of the run. Kits that do not sell count as worth nothing."],
    basis: `In ${plan.currency}, after tax, fees and postage`,
  };
}

function compared(context: PriceContext, sold: number): Step[] {
  const { plan, cost } = context;
  const weights = plan.editions.map(({ weight }) => weight);
  const brought = takingsFrom(bringsPerKit(kitsSold(context)), splitKits(sold, weights)) ?? 0n;
  const left = brought - grains(cost.used.known ? cost.used.value : "0");
  return [
    step(null, `${sold} sold bring`, money(brought, plan.currency), "11"),
    step("−", "Used by the run", money(cost.used, plan.currency), "8", { opens: "used" }),
    step("=", left < 0n ? "Still a loss" : "No loss", money(grainText(left), plan.currency), "11"),
  ];
}
