import type { LadderTerms } from "#src/costing/ladder.ts";
import { orderCurve } from "#src/costing/order-curve.ts";

/** A point of the chart; numbers are for pixels, the text is what is shown. */
export interface CurveRow {
  quantity: number;
  pays: number;
  /** Price list and price paid, where they differ: the area between is what buying up saves. */
  listed: number | null;
  saved: [number, number] | null;
  order: number;
  paysText: string;
  listedText: string;
}

/** Enough points that a straight line between two is the price. */
const POINTS = 240;

/** How far the chart goes: the numbers one would think of, past what is needed and what is ordered. */
export function curveEnd(need: number, ordered: number): number {
  return Math.max(Math.ceil(Math.max(need, ordered) * 1.6), 10);
}

/** Numbers that can be bought, and have a point: whole packs, or even steps with each break and the last piece before it. */
function quantitiesUpTo(terms: LadderTerms, end: number): number[] {
  const { orderMultiple, minimumOrder, breaks } = terms;
  const pack = orderMultiple * Math.max(1, Math.ceil(end / orderMultiple / POINTS));
  const even = Array.from({ length: Math.floor(end / pack) }, (_, place) => (place + 1) * pack);
  const edges =
    orderMultiple > 1 ? [] : breaks.flatMap(({ quantity }) => [quantity - 1, quantity, quantity + 1]);
  return [...new Set([minimumOrder, ...even, ...edges])]
    .filter((quantity) => quantity >= minimumOrder && quantity <= end && quantity % orderMultiple === 0)
    .sort((a, b) => a - b);
}

/** What any number that can be bought costs, up to `end` pieces. */
export function curveRows(terms: LadderTerms, end: number): CurveRow[] {
  const rows = orderCurve(terms, quantitiesUpTo(terms, end)).map((point): CurveRow => {
    const [pays, listed] = [Number(point.pays), Number(point.listed)];
    const saves = listed > pays;
    return {
      quantity: point.quantity,
      order: point.order,
      pays,
      listed: saves ? listed : null,
      saved: saves ? [pays, listed] : null,
      paysText: point.pays,
      listedText: point.listed,
    };
  });
  // The area begins on the line of what is paid, and ends upright at the break.
  return rows.map((row, place) => {
    if (row.saved || !rows[place + 1]?.saved) return row;
    return { ...row, listed: row.pays, saved: [row.pays, row.pays] };
  });
}

/** A stretch of the line on which each piece costs the same. */
export interface PriceStretch {
  price: string;
  from: number;
  to: number;
}

/** Where the price of each break is paid, piece by piece, up to `end`; none where prices are not for the whole order. */
export function priceStretches(terms: LadderTerms, rows: readonly CurveRow[]): PriceStretch[] {
  if (terms.priceModel !== "whole-order") return [];
  const rungs = terms.breaks.toSorted((a, b) => a.quantity - b.quantity);
  return rungs.flatMap(({ quantity, price }, place) => {
    const next = rungs[place + 1]?.quantity ?? Number.POSITIVE_INFINITY;
    const own = rows.filter(
      (row) => row.quantity >= quantity && row.quantity < next && row.order === row.quantity,
    );
    const [first, last] = [own[0], own.at(-1)];
    return first && last && first !== last ? [{ price, from: first.quantity, to: last.quantity }] : [];
  });
}
