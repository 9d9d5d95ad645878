import type { Plan } from "#src/shapes/plan.ts";
import { basketResults } from "./basket-results.ts";
import { boardResults } from "./board-results.ts";
import { editionCosts } from "./edition-costs.ts";
import type { Figure } from "./figure.ts";
import { figureOf, figurePer, inBothViews, wholeFigure } from "./figure-of.ts";
import { grainShare, grainText, ONE, scaledText } from "./grains.ts";
import { headResults, taskCost } from "./head-results.ts";
import { taskMinutes } from "./kit-costs.ts";
import { FACTOR_PLACES } from "./learning.ts";
import { partLine } from "./part-lines.ts";
import { preparePlan } from "./prepare-plan.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import { nearest } from "./price/fraction.ts";
import { takingsFrom } from "./price/takings.ts";
import type { Need } from "./problem.ts";
import { reckonRun } from "./reckon-run.ts";
import { joinNeeds, need, needsOf, soldNeeds } from "./run-needs.ts";
import { runProblems } from "./run-problems.ts";
import type { EditionResult, RunResult, WorkResult } from "./run-result.ts";
import { BRINGS_NEEDS, createSheet, MISSING, type RunSheet, SPENT_NEEDS, USED_NEEDS } from "./run-sheet.ts";
import { soldToPay } from "./sold-to-pay.ts";

/**
 * Everything about one run size (sections 2 to 8, 10): what to buy where, what it costs by head, by
 * edition and per kit, what it brings. Plain JSON in and out; the same plan gives the same bytes.
 *
 * `kits`: size of the run, a whole number from 1 to 1 000; the plan's own run where left out. Amounts
 * come out exact, in the plan's currency unless a field names another; nothing is rounded for show.
 * Never throws for what a person may have left open: such figures are not known and say what they need.
 *
 * @example costRun(plan, 40).perKit.used → { known: true, value: "14.947083…" }
 */
export function costRun(plan: Plan, kits: number = plan.run.kits): RunResult {
  const prepared = preparePlan(plan, kits);
  const sheet = createSheet(prepared);
  reckonRun(prepared, kits, sheet);
  return runResult(prepared, sheet);
}

/** The result of a sheet already reckoned. */
export function runResult(prepared: PreparedPlan, sheet: RunSheet): RunResult {
  const { plan } = prepared;
  const { money, kits } = sheet;
  const { baskets, shareOf } = basketResults(prepared, sheet);
  const needs = runFigureNeeds(prepared, sheet);
  const profit = money.brings - money.used;
  return {
    kit: plan.kit,
    revision: plan.revision,
    currency: plan.currency,
    asOf: plan.asOf,
    kits,
    editions: editionResults(prepared, sheet, needs),
    parts: prepared.parts.map((_, index) => partLine(prepared, sheet, index, shareOf)),
    baskets,
    boards: boardResults(prepared, sheet),
    work: workResult(prepared, sheet),
    heads: headResults(prepared, sheet, baskets),
    leftOver: figureOf(money.leftOver, needs.goods),
    keptOnShelf: figureOf(money.keptOnShelf, needs.goods),
    stockTaken: figureOf(money.stockTaken, needs.stock),
    spent: figureOf(money.spent, needs.spent),
    used: figureOf(money.used, needs.used),
    perKit: inBothViews(money.spent, money.used, kits, needs.spent, needs.used),
    kept: wholeFigure(takingsFrom(prepared.takings.kept, sheet.kitsOf), needs.kept),
    brings: wholeFigure(money.brings, needs.brings),
    bringsPerKit:
      needs.brings.length > 0 ? wholeFigure(null, needs.brings) : figurePer(money.brings, kits, []),
    profit: needs.profit.length > 0 ? wholeFigure(null, needs.profit) : figureOf(profit, []),
    earnsPerKit: needs.profit.length > 0 ? wholeFigure(null, needs.profit) : figurePer(profit, kits, []),
    earnedPerHour: earnedPerHour(prepared, sheet),
    evenAfter: evenAfter(prepared, sheet, needs.profit),
    parcels: sheet.parcels,
    problems: runProblems(prepared, sheet),
  };
}

/** The second question of section 11 for this run, as a count of kits. */
function evenAfter(prepared: PreparedPlan, sheet: RunSheet, needs: Need[]): Figure {
  if (needs.length > 0) return wholeFigure(null, needs);
  const sold = soldToPay(prepared, sheet.money.used, sheet.kits);
  return sold === null
    ? wholeFigure(null, [need("not-even", [{}])])
    : { known: true, value: sold.toString() };
}

interface FigureNeeds {
  goods: Need[];
  stock: Need[];
  spent: Need[];
  used: Need[];
  kept: Need[];
  brings: Need[];
  profit: Need[];
}

function runFigureNeeds(prepared: PreparedPlan, sheet: RunSheet): FigureNeeds {
  const of = (bits: number) => needsOf(prepared, sheet, bits);
  return {
    goods: of(MISSING.mix | MISSING.goods),
    stock: of(MISSING.mix | MISSING.stock),
    spent: of(SPENT_NEEDS),
    used: of(USED_NEEDS),
    kept: joinNeeds(of(MISSING.mix), soldNeeds(prepared, sheet, "kept")),
    brings: of(BRINGS_NEEDS),
    profit: of(USED_NEEDS | BRINGS_NEEDS),
  };
}

/**
 * Earned per hour (section 7): `(income − all costs but own work) ÷ hours of making and selling`, in
 * money per hour, to the nearest grain. Known without an hourly rate, since own work is what it pays for.
 */
function earnedPerHour(prepared: PreparedPlan, sheet: RunSheet): Figure {
  const { money } = sheet;
  const { kept, minutes: selling } = sellingOf(prepared, sheet);
  const minutes = money.minutes + selling;
  const needs = joinNeeds(
    needsOf(prepared, sheet, USED_NEEDS & ~MISSING.rate),
    soldNeeds(prepared, sheet, "kept"),
    soldNeeds(prepared, sheet, "minutes"),
    minutes === 0n ? [need("no-work", [{}])] : [],
  );
  if (needs.length > 0) return wholeFigure(null, needs);
  const pay = kept - (money.used - money.work);
  return figureOf(grainShare(pay * 60n, ONE, minutes), []);
}

/** What the sales of a run keep and how long they take, in grains; nothing where `soldNeeds` says why. */
function sellingOf({ takings }: PreparedPlan, { kitsOf }: RunSheet) {
  return {
    kept: takingsFrom(takings.kept, kitsOf) ?? 0n,
    minutes: takingsFrom(takings.minutes, kitsOf) ?? 0n,
  };
}

function editionResults(prepared: PreparedPlan, sheet: RunSheet, needs: FigureNeeds): EditionResult[] {
  const costs = editionCosts(prepared, sheet);
  return prepared.plan.editions.map((edition, index) => {
    const kits = sheet.kitsOf[index] ?? 0;
    const [spent, used] = [costs.spent[index] ?? 0n, costs.used[index] ?? 0n];
    const absent = kits === 0 ? [need("not-in-run", [{ edition: edition.id }])] : [];
    return {
      id: edition.id,
      name: edition.name,
      kits,
      cost: { spent: figureOf(spent, needs.spent), used: figureOf(used, needs.used) },
      perKit:
        kits === 0
          ? { spent: wholeFigure(null, absent), used: wholeFigure(null, absent) }
          : inBothViews(spent, used, kits, needs.spent, needs.used),
      price: edition.price,
      ...soldResult(prepared, index),
    };
  });
}

/** One kit of an edition sold over its channels. */
function soldResult({ sold }: PreparedPlan, index: number): Pick<EditionResult, "kept" | "brings"> {
  const kit = sold[index] as PreparedPlan["sold"][number];
  return {
    kept: wholeFigure(nearest(kit.kept), kit.needs.kept),
    brings: wholeFigure(nearest(kit.brings), kit.needs.brings),
  };
}

function workResult(prepared: PreparedPlan, sheet: RunSheet): WorkResult {
  const { plan } = prepared;
  const { money } = sheet;
  return {
    tasks: prepared.tasks.map((task) => {
      const { kits, factorSum, making, settingUp, minutes } = taskMinutes(task, sheet.kitsOf);
      return {
        id: task.id,
        name: task.name,
        kits,
        factorSum: scaledText(factorSum, FACTOR_PLACES),
        minutesMaking: grainText(making),
        minutesSettingUp: grainText(settingUp),
        minutes: grainText(minutes),
        cost: taskCost(prepared, sheet, task),
      };
    }),
    minutes: grainText(money.minutes),
    hours: grainText(grainShare(money.minutes, 1n, 60n)),
    sellingMinutes: wholeFigure(sellingOf(prepared, sheet).minutes, soldNeeds(prepared, sheet, "minutes")),
    ratePerHour: plan.work.ratePerHour,
    cost: figureOf(money.work, needsOf(prepared, sheet, MISSING.mix | MISSING.rate)),
  };
}
