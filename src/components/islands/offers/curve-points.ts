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

/** Round steps of an axis, so that there are four to seven of them. */
function roundStep(reach: number): number {
  const size = 10 ** Math.floor(Math.log10(reach / 4));
  return ([1, 2, 5, 10].find((step) => reach / (step * size) <= 7) ?? 10) * size;
}

/** Ticks of an axis from 0 to at least `reach`, at least `least` apart. */
export function roundTicks(reach: number, least = 1): number[] {
  const step = Math.max(least, roundStep(Math.max(reach, least)));
  return Array.from({ length: Math.ceil(reach / step) + 1 }, (_, place) => place * step);
}

/** How far the chart goes: past what is ordered and past the next break. */
export function curveEnd(terms: LadderTerms, need: number, ordered: number): number {
  const next = terms.breaks.map(({ quantity }) => quantity).filter((quantity) => quantity > ordered);
  return Math.max(need * 1.6, ordered * 1.6, Math.min(...next, ordered * 2), 10);
}

/** Quantities at which the chart has points: even steps, each break, and the last piece before it. */
function quantitiesUpTo(terms: LadderTerms, end: number): number[] {
  const step = Math.max(1, Math.floor(end / POINTS));
  const even = Array.from({ length: Math.floor(end / step) + 1 }, (_, place) => place * step);
  const edges = terms.breaks.flatMap(({ quantity }) => [quantity - 1, quantity, quantity + 1]);
  return [...new Set([1, ...even, ...edges, ...packEdges(terms, end), end])]
    .filter((quantity) => quantity >= 1 && quantity <= end)
    .sort((a, b) => a - b);
}

/** The ends of packs, where the cost steps up; none where the packs are too small to be seen. */
function packEdges({ orderMultiple }: LadderTerms, end: number): number[] {
  const packs = Math.floor(end / orderMultiple);
  if (orderMultiple === 1 || packs > POINTS / 2) return [];
  return Array.from({ length: packs }, (_, place) => (place + 1) * orderMultiple).flatMap((pack) => [
    pack,
    pack + 1,
  ]);
}

/** What any number costs, from one piece to `end`. */
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
  // The area begins and ends on the line of what is paid.
  return rows.map((row, place) => {
    const before = rows[place - 1]?.saved ?? null;
    const after = rows[place + 1]?.saved ?? null;
    if (row.saved || (!before && !after)) return row;
    return { ...row, listed: row.pays, saved: [row.pays, row.pays] };
  });
}
