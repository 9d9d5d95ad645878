import { basketBill } from "./basket-bill.ts";
import type { BasketTerms, CustomsTerms } from "./basket-terms.ts";

const MILLION = 1_000_000;
const NEVER = Number.POSITIVE_INFINITY;

/**
 * A range of goods and weight within which a supplier's charges follow one straight line but for rounding:
 * total = fixed + multiple × goods ± slack, in minor units. Near enough for bounds; never part of a figure.
 */
export interface BasketCell {
  /** Both ends belong to the range; the upper may be Infinity. */
  goodsFrom: number;
  goodsTo: number;
  weightFrom: number;
  weightTo: number;
  fixed: number;
  multiple: number;
  /** Most that rounding of duty and tax takes off the line. */
  slack: number;
  /** The order may hold parts of unknown weight. */
  anyWeight: boolean;
  /** Freight is not known here, and `fixed` leaves it out. */
  freightUnknown: boolean;
}

/**
 * Cuts a supplier's terms into such ranges. Ranges in which it refuses the order are left out.
 *
 * @example flat 490, free from 5000 → goods 0 to 4999 at 490, goods 5000 upward at 0
 */
export function basketCells(terms: BasketTerms): BasketCell[] {
  const goods = goodsSteps(terms);
  const weights = terms.freight.model === "by-weight" ? terms.freight.bands.map(({ from }) => from) : [0];
  weights[0] = 0;
  const cells: BasketCell[] = [];
  goods.forEach((goodsFrom, index) => {
    const goodsTo = (goods[index + 1] ?? NEVER) - 1;
    if (terms.freight.model !== "by-weight" || isFree(terms, goodsFrom)) {
      add(cells, cellAt(terms, { goodsFrom, goodsTo, weightFrom: 0, weightTo: NEVER }, 0));
      return;
    }
    weights.forEach((weightFrom, band) => {
      const weightTo = (weights[band + 1] ?? NEVER) - 1;
      const cell = cellAt(terms, { goodsFrom, goodsTo, weightFrom, weightTo }, weightFrom);
      if (cell !== null) add(cells, { ...cell, anyWeight: false });
    });
    add(cells, cellAt(terms, { goodsFrom, goodsTo, weightFrom: 0, weightTo: NEVER }, null));
  });
  return cells;
}

function isFree({ freeFrom }: BasketTerms, goods: number): boolean {
  return freeFrom !== null && goods >= freeFrom;
}

/** Every value of goods at which some charge may change, ascending from 0. */
function goodsSteps({ minimum, freeFrom, freight, customs }: BasketTerms): number[] {
  const steps = new Set([0, minimum, freeFrom ?? 0]);
  if (freight.model === "by-goods") for (const { from } of freight.bands) steps.add(from);
  if (customs !== null && customs.dutyMillionths > 0) {
    const amounts =
      freight.model === "flat"
        ? [freight.amount]
        : "bands" in freight
          ? freight.bands.map((b) => b.amount)
          : [];
    for (const amount of customs.withFreight ? [0, ...amounts] : [0])
      steps.add(customs.dutyOver + 1 - amount);
  }
  return [...steps].filter((step) => step >= 0).sort((a, b) => a - b);
}

type Range = Pick<BasketCell, "goodsFrom" | "goodsTo" | "weightFrom" | "weightTo">;

function cellAt(terms: BasketTerms, range: Range, weight: number | null): BasketCell | null {
  const bill = basketBill(terms, range.goodsFrom, weight);
  if (bill.refused) return null;
  const charges = bill.fee + bill.handling + bill.broker;
  const freight = bill.freight ?? 0;
  const { multiple, slack } = lineOf(terms.customs, bill.customsValue);
  const onFreight = terms.customs?.withFreight ? multiple : 1;
  return {
    ...range,
    fixed: charges + onFreight * freight,
    multiple,
    slack,
    anyWeight: true,
    freightUnknown: bill.freight === null,
  };
}

function lineOf(customs: CustomsTerms | null, customsValue: number): { multiple: number; slack: number } {
  if (customs === null) return { multiple: 1, slack: 0 };
  const duty = customsValue > customs.dutyOver ? customs.dutyMillionths / MILLION : 0;
  const tax = customs.taxReclaimed ? 0 : customs.taxMillionths / MILLION;
  return {
    multiple: (1 + duty) * (1 + tax),
    slack: (duty > 0 ? (1 + tax) / 2 : 0) + (tax > 0 ? 1 / 2 : 0),
  };
}

/** Joins a cell to the one it continues, where nothing but the range differs. */
function add(cells: BasketCell[], cell: BasketCell | null): void {
  if (cell === null) return;
  const before = cells.find(
    (other) =>
      other.goodsTo + 1 === cell.goodsFrom &&
      other.weightFrom === cell.weightFrom &&
      other.weightTo === cell.weightTo &&
      other.fixed === cell.fixed &&
      other.multiple === cell.multiple &&
      other.anyWeight === cell.anyWeight &&
      other.freightUnknown === cell.freightUnknown,
  );
  if (before === undefined) cells.push(cell);
  else before.goodsTo = cell.goodsTo;
}
