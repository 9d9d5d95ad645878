import { type LadderTerms, prepareLadder } from "#src/costing/ladder.ts";
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

/** How far the chart goes: past what is ordered and past the next break, to a round number. */
export function curveEnd(terms: LadderTerms, need: number, ordered: number): number {
  const next = terms.breaks.map(({ quantity }) => quantity).filter((quantity) => quantity > ordered);
  const reach = Math.max(need * 1.6, ordered * 1.6, Math.min(...next, ordered * 3), 10);
  const size = 10 ** Math.floor(Math.log10(reach));
  return Math.ceil((reach / size) * 5) * (size / 5);
}

/** Quantities at which the chart has points: even steps, each break, and the last piece before it. */
function quantitiesUpTo(terms: LadderTerms, end: number): number[] {
  const first = Math.max(1, prepareLadder(terms, Number.POSITIVE_INFINITY, end).minimum);
  const step = Math.max(1, Math.floor(end / POINTS));
  const even = Array.from({ length: Math.floor(end / step) + 1 }, (_, place) => place * step);
  const edges = terms.breaks.flatMap(({ quantity }) => [quantity - 1, quantity]);
  return [...new Set([first, ...even, ...edges, end])]
    .filter((quantity) => quantity >= first && quantity <= end)
    .sort((a, b) => a - b);
}

/** What any number costs, from the least that may be ordered to `end`. */
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
