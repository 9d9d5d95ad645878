import { headSpent } from "./head-results.ts";
import { preparePlan } from "./prepare-plan.ts";
import { takingsFrom } from "./price/takings.ts";
import { reckonRun } from "./reckon-run.ts";
import { need } from "./run-needs.ts";
import { HEADS } from "./run-result.ts";
import { BRINGS_NEEDS, createSheet, type RunSheet, USED_NEEDS } from "./run-sheet.ts";
import { splitKits } from "./split-kits.ts";
import { sweepRuns } from "./sweep.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, notKnown, type Sheet, type Step, step, summed } from "./working-lines.ts";
import { HEAD_NAMES } from "./working-run.ts";

/** How many of this run must sell for no loss (section 11): one fewer does not pay, these do. */
export function evenAfterSheet({ prepared, result, sheet }: WorkingContext): Sheet {
  const { currency, kits, evenAfter } = result;
  const needed = evenAfter.known ? null : notKnown(evenAfter.needs);
  const sold = evenAfter.known ? Number(evenAfter.value) : null;
  const compare = (number: number): Step[] => {
    const brought = takingsFrom(prepared.takings.brings, splitKits(number, prepared.weights)) ?? 0n;
    return [
      step(null, `${number} sold bring`, money(brought, currency), "11"),
      step("−", "Used by the run", money(result.used, currency), "8", { opens: "used" }),
      step(
        "=",
        brought < sheet.money.used ? "Still a loss" : "No loss",
        money(brought - sheet.money.used, currency),
        "11",
      ),
    ];
  };
  const shown = sold === null ? (result.profit.known ? compare(kits) : []) : sidesOf(sold).flatMap(compare);
  return {
    title: `Sold for no loss on a run of ${kits}`,
    steps: [...shown, step(null, "Even after", needed ?? count(sold ?? 0, "sold"), "11", { result: true })],
    notes: ["Sales follow the mix of the run. Kits that do not sell count as worth nothing."],
    basis: `In ${currency}, after tax, fees and postage`,
  };
}

function sidesOf(sold: number): number[] {
  return sold > 0 ? [sold - 1, sold] : [sold];
}

/** A run reckoned at another size, for a working that compares two. */
function sheetAt(context: WorkingContext, kits: number): RunSheet {
  const prepared = preparePlan(context.prepared.plan, kits);
  const sheet = createSheet(prepared);
  reckonRun(prepared, kits, sheet);
  return sheet;
}

/** Profit on both sides of a crossing, or of the first or safe run (section 11). */
export function crossingSheet(context: WorkingContext, kits: number, title: string): Sheet {
  const { currency } = context.result;
  const profitSteps = (at: number): Step[] => {
    const { money: sums, missing } = sheetAt(context, at);
    const known = (missing & (USED_NEEDS | BRINGS_NEEDS)) === 0;
    const amount = (value: bigint) =>
      known
        ? money(value, currency)
        : notKnown(context.result.profit.known ? [] : context.result.profit.needs);
    const profit = sums.brings - sums.used;
    return [
      step(null, `A run of ${at} brings`, amount(sums.brings), "11"),
      step("−", `A run of ${at} uses`, amount(sums.used), "8"),
      step("=", profit < 0n ? "Loss" : "No loss", amount(profit), "11", { result: at === kits }),
    ];
  };
  return {
    title,
    steps: [...(kits > 1 ? profitSteps(kits - 1) : []), ...profitSteps(kits)],
    notes: ["Every run is costed afresh, with its own orders; every kit sells, by the mix."],
    basis: `In ${currency}, after tax, fees and postage`,
  };
}

/** The first run without a loss, or the safe one, with the run before it; or that there is none (section 11). */
export function firstOrSafeSheet(context: WorkingContext, which: "first" | "safe"): Sheet {
  const { breakEven } = sweepRuns(context.prepared.plan);
  const kits = breakEven[which];
  if (kits !== null) {
    const title =
      which === "first"
        ? `First run without a loss: ${kits}`
        : `From ${kits} kits on no run loses, up to ${breakEven.upTo}`;
    return crossingSheet(context, kits, title);
  }
  const needs = context.result.profit.known ? [need("not-even", [{}])] : context.result.profit.needs;
  return {
    title: `None up to ${breakEven.upTo}`,
    steps: [
      step(null, which === "first" ? "First run without a loss" : "Safe from", notKnown(needs), "11", {
        result: true,
      }),
    ],
    notes: [],
  };
}

/** What one kit more costs, `C(n + 1) − C(n)`, and under which head (section 9). */
export function nextKitSheet(context: WorkingContext): Sheet {
  const { result, sheet } = context;
  const { currency, kits } = result;
  const more = sheetAt(context, kits + 1);
  const known = ((sheet.missing | more.missing) & USED_NEEDS) === 0;
  const amount = (value: bigint) =>
    known ? money(value, currency) : notKnown(result.used.known ? [] : result.used.needs);
  const byHead = HEADS.flatMap((id) => {
    const [before, after] = [sheet, more].map((one) => usedHead(one, id)) as [bigint, bigint];
    return before === after
      ? []
      : [step("+", HEAD_NAMES[id].name, amount(after - before), "9", { source: from(HEAD_NAMES[id].page) })];
  });
  const difference = more.money.used - sheet.money.used;
  return {
    title: `Kit number ${kits + 1}: what one more costs`,
    steps: [
      step(null, `Used by a run of ${kits + 1}`, amount(more.money.used), "8"),
      step("−", `Used by a run of ${kits}`, amount(sheet.money.used), "8", { opens: "used" }),
      step("=", "The next kit", amount(difference), "9", { result: true }),
      ...summed(byHead),
      ...(byHead.length === 0 ? [] : [step("=", "The same, by head", amount(difference), "9")]),
    ],
    notes: ["Both runs are costed afresh, with their own orders."],
  };
}

function usedHead(sheet: RunSheet, id: (typeof HEADS)[number]): bigint {
  const spent = headSpent(sheet, id);
  return id === "parts" ? spent - sheet.money.keptOnShelf + sheet.money.stockTaken : spent;
}
