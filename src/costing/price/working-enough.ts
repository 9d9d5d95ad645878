import { scaled, scaledText } from "#src/costing/grains.ts";
import { count, from, money, number, rate, type Step, step } from "#src/costing/working-lines.ts";
import type { WorkingAmount } from "#src/costing/working-tree.ts";
import { type Aim, type AimBasis, type AimCondition, beforeTax } from "./aims.ts";
import { MILLION } from "./charged.ts";
import { type Fraction, fraction, nearest, plus, times } from "./fraction.ts";
import { minutesOf } from "./working-order-left.ts";

/** The parts of what must be kept, from which each aim takes its own. */
interface Parts {
  basis: AimBasis;
  cash: (value: Fraction) => WorkingAmount;
  edition: string;
  time: Step;
  close: Step;
}

/** What must be kept for an aim: of one kit, or of the run's kits of the edition. */
export function enoughSteps(aim: Aim, basis: AimBasis, condition: AimCondition): Step[] {
  const { context, sold } = basis;
  const cash = (value: Fraction) => money(nearest(value), context.plan.currency);
  const parts: Parts = {
    basis,
    cash,
    edition: sold.sale.scope.edition,
    time: step("+", "Time to sell it", cash(sold.timeCost), "7"),
    close: step("=", "To be kept", cash(condition.enough), "10"),
  };
  switch (aim.aim) {
    case "next-kit":
      return [
        step(null, "What one more costs the run", cash(basis.kit.nextKit), "9"),
        parts.time,
        parts.close,
      ];
    case "margin":
      return [costStep(parts, null), parts.time, parts.close];
    case "mark-up":
      return markUpSteps(parts, aim.rate);
    case "hour":
      return hourSteps(parts, aim.rate);
    case "run-even":
      return runSteps(parts, null);
    case "profit":
      return runSteps(parts, aim);
  }
}

function costStep({ basis, cash, edition }: Parts, sign: null | "+"): Step {
  return step(sign, "Cost of one kit", cash(basis.kit.cost), "8", { opens: `edition:${edition}` });
}

function markUpSteps(parts: Parts, markUp: string): Step[] {
  const part = times(parts.basis.kit.cost, fraction(scaled(markUp, 6), MILLION));
  return [
    costStep(parts, null),
    step("×", "Mark-up", rate(markUp), "10"),
    step("=", "Mark-up to be kept", parts.cash(part), "10"),
    costStep(parts, null),
    parts.time,
    step("+", "Mark-up to be kept", parts.cash(part), "10"),
    parts.close,
  ];
}

function hourSteps({ basis, cash, close }: Parts, perHour: string): Step[] {
  const { kit, sold, context } = basis;
  const minutes = plus(kit.minutes, sold.minutes);
  const pay = times(minutes, fraction(scaled(perHour, 6), 60n * MILLION));
  return [
    step(null, "Minutes to make a kit", minutesOf(kit.minutes), "7", { source: from("run") }),
    step("+", "Minutes to sell it", minutesOf(sold.minutes), "7"),
    step("×", "An hour's pay", money(perHour, context.plan.currency), "7"),
    step("÷", "Minutes in an hour", number("60", "min"), "7"),
    step("=", "Pay of one kit", cash(pay), "7"),
    step("+", "Cost of a kit but own work", cash(kit.withoutWork), "7"),
    close,
  ];
}

function runSteps({ basis, cash, close }: Parts, aim: Extract<Aim, { aim: "profit" }> | null): Step[] {
  const { kit, sold, context, others } = basis;
  const { currency } = context.plan;
  const selling = times(sold.timeCost, fraction(BigInt(kit.kits)));
  const profit = aim === null ? null : beforeTax(aim.amount, aim.taxRate);
  const taxed =
    aim === null || aim.taxRate === null || profit === null
      ? []
      : [
          step(null, "Profit after tax", money(aim.amount, currency), "11"),
          step("÷" as const, "One less the tax rate", oneLess(aim.taxRate), "11"),
          step("=" as const, "Profit before tax", cash(profit), "11"),
        ];
  const alone = context.cost.editions.every(({ id, kits }) => kits === 0 || id === sold.sale.scope.edition);
  return [
    ...taxed,
    step(null, "Time to sell one kit", cash(sold.timeCost), "7"),
    step("×", "Kits of it in the run", count(kit.kits, "kits"), "2", { source: from("run") }),
    step("=", "Time to sell them", cash(selling), "7"),
    step(null, "Used by the run", money(context.cost.used, currency), "8", { opens: "used" }),
    step("+", "Time to sell them", cash(selling), "7"),
    ...(profit === null ? [] : [step("+" as const, "Profit of the run", cash(profit), "11")]),
    ...(alone ? [] : [step("−" as const, "What the other editions bring", cash(others.brings), "11")]),
    close,
  ];
}

function oneLess(taxRate: string): WorkingAmount {
  return rate(scaledText(MILLION - scaled(taxRate, 6), 6));
}
