import { convertMinor, type MinorWorth } from "./conversion.ts";
import type { Figure } from "./figure.ts";
import { figureOf, inBothViews, wholeFigure } from "./figure-of.ts";
import { grainShare, ONE } from "./grains.ts";
import { chargeShare, packingCost, taskMinutes, workCost } from "./kit-costs.ts";
import { partMoney } from "./part-lines.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import { need, needsOf, partNeeds } from "./run-needs.ts";
import type { Basket, Head, HeadId } from "./run-result.ts";
import { HEADS } from "./run-result.ts";
import { MISSING, type RunSheet, USED_NEEDS } from "./run-sheet.ts";

type HeadLine = Head["lines"][number];

/** What each head's figure depends on; a part that is missing may also bring a parcel of its own. */
export const HEAD_NEEDS: Record<HeadId, number> = {
  boards: MISSING.mix | MISSING.boards,
  parts: MISSING.mix | MISSING.goods,
  freight: MISSING.mix | MISSING.goods | MISSING.freight | MISSING.boards | MISSING.boardFreight,
  packing: MISSING.mix | MISSING.packing,
  work: MISSING.mix | MISSING.rate,
  "one-off": 0,
  replacements: MISSING.replacement,
};

/** The heads of section 8 in both views, each with the lines it is made of. */
export function headResults(prepared: PreparedPlan, sheet: RunSheet, baskets: readonly Basket[]): Head[] {
  const { money, kits } = sheet;
  const wholeNeeds = needsOf(prepared, sheet, USED_NEEDS);
  return HEADS.map((id) => {
    const spent = headSpent(sheet, id);
    const used = id === "parts" ? spent - money.keptOnShelf + money.stockTaken : spent;
    const needs = needsOf(prepared, sheet, HEAD_NEEDS[id]);
    const usedNeeds = id === "parts" ? needsOf(prepared, sheet, HEAD_NEEDS[id] | MISSING.stock) : needs;
    const known = money.used > 0n && wholeNeeds.length === 0;
    return {
      id,
      spent: figureOf(spent, needs),
      used: figureOf(used, usedNeeds),
      perKit: inBothViews(spent, used, kits, needs, usedNeeds),
      share: known
        ? figureOf(grainShare(ONE, used, money.used), [])
        : wholeFigure(null, wholeNeeds.length > 0 ? wholeNeeds : [need("nothing-made", [{}])]),
      lines: headLines(prepared, sheet, id, baskets),
    };
  });
}

/** One head of the spent view, in grains. */
export function headSpent({ money }: RunSheet, id: HeadId): bigint {
  return id === "one-off" ? money.oneOff : money[id];
}

function headLines(
  prepared: PreparedPlan,
  sheet: RunSheet,
  id: HeadId,
  baskets: readonly Basket[],
): HeadLine[] {
  if (id === "boards") return boardLines(sheet);
  if (id === "parts") return partLines(prepared, sheet);
  if (id === "freight") return freightLines(sheet, baskets);
  if (id === "packing") {
    return prepared.packing.map((packing) =>
      line(packing.item, costOf(packingCost(packing, sheet.kitsOf), "no-packing-cost", packing.item.id)),
    );
  }
  if (id === "work") {
    return prepared.tasks.map((task) => line(task, taskCost(prepared, sheet, task)));
  }
  if (id === "one-off")
    return prepared.charges.map((charge) =>
      line(charge.charge, figureOf(chargeShare(charge, sheet.kits), [])),
    );
  return [];
}

function line(of: { id: string; name: string }, amount: Figure): HeadLine {
  return { id: of.id, name: of.name, amount };
}

function costOf(cost: bigint | null, code: "no-packing-cost", packing: string): Figure {
  return wholeFigure(cost, cost === null ? [need(code, [{ packing }])] : []);
}

/** Cost of one task; nothing to do costs nothing even without a rate. */
export function taskCost(
  prepared: PreparedPlan,
  sheet: RunSheet,
  task: PreparedPlan["tasks"][number],
): Figure {
  const { minutes } = taskMinutes(task, sheet.kitsOf);
  const cost = minutes === 0n ? 0n : workCost(prepared.hourRate, minutes);
  return wholeFigure(cost, cost === null ? [need("no-hourly-rate", [{}])] : []);
}

function boardLines({ boards }: RunSheet): HeadLine[] {
  if (boards === null) return [];
  const { quote, order, charged } = boards;
  const worth = quote.worth as MinorWorth;
  const amount = (minor: number) => figureOf(convertMinor(minor, worth), []);
  const name = quote.quote.boardHouse;
  return [
    { id: `${quote.quote.id}:boards`, name, amount: amount(order.goods) },
    { id: `${quote.quote.id}:charges`, name, amount: amount(charged - order.goods) },
  ];
}

function partLines(prepared: PreparedPlan, sheet: RunSheet): HeadLine[] {
  return prepared.parts.map(({ part }, index) =>
    line(part, wholeFigure(partMoney(prepared, sheet, index).goods, partNeeds(prepared, sheet, index))),
  );
}

function freightLines({ boards }: RunSheet, baskets: readonly Basket[]): HeadLine[] {
  const lines = baskets.map((basket) => ({
    id: basket.supplier,
    name: basket.name,
    amount: basket.converted.charges,
  }));
  if (boards === null) return lines;
  const { freight, worth, quote } = boards.quote;
  const needs = freight === null ? [need("no-board-freight", [{ quote: quote.id }])] : [];
  const amount = figureOf(convertMinor(freight ?? 0, worth as MinorWorth), needs);
  return [...lines, { id: quote.id, name: quote.boardHouse, amount }];
}
