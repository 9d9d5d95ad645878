import type { SweepColumns, SweepResult } from "#src/costing/sweep-result.ts";

/** Which of the two named views of cost a chart shows (section 8). */
export type CostView = "used" | "spent";

/** Run sizes a chart shows, both included. */
export interface Span {
  from: number;
  to: number;
}

/** One run size. Floating-point numbers are for pixels only; `exact` holds the figures themselves. */
export interface CostPoint {
  kits: number;
  perKit: number | null;
  total: number | null;
  brings: number | null;
  exact: { perKit: string | null; total: string | null; brings: string | null };
  /** The next kit costs so much more that the line breaks after this one. */
  breaksAfter: boolean;
}

/** A step in money larger than this breaks a line, if it is also far above what a usual next kit costs. */
const STEP_MONEY = 40;
const STEP_TIMES = 3;

/** For pixels. */
export const pixels = (text: string | null) => (text === null ? null : Number(text));

function middle(values: readonly number[]): number {
  const sorted = [...values].sort((one, other) => one - other);
  return sorted[Math.floor(sorted.length / 2)] ?? 0;
}

/** The columns a chart draws: exact ones, or, where nothing is known exactly, those that leave out what is missing. */
export function drawnColumns(sweep: SweepResult): { columns: SweepColumns; partial: boolean } {
  const exact = sweep.columns.used.some((value) => value !== null);
  return exact || !sweep.without
    ? { columns: sweep.columns, partial: false }
    : { columns: sweep.without, partial: true };
}

/**
 * The points of a span, one for every whole number of kits. Frozen: a chart's store would otherwise freeze every
 * point one by one.
 */
export function costPoints(columns: SweepColumns, view: CostView, { from, to }: Span): readonly CostPoint[] {
  const totals = view === "used" ? columns.used : columns.spent;
  const perKit = view === "used" ? columns.perKitUsed : columns.perKitSpent;
  const sizes = Array.from({ length: Math.max(0, to - from + 1) }, (_, place) => from + place);
  const points = sizes.map((kits) => {
    const at = (column: readonly (string | null)[]) => column[kits - 1] ?? null;
    const exact = { perKit: at(perKit), total: at(totals), brings: at(columns.brings) };
    return {
      kits,
      perKit: pixels(exact.perKit),
      total: pixels(exact.total),
      brings: pixels(exact.brings),
      exact,
    };
  });
  const rises = points.map(({ total }, place) => {
    const next = points[place + 1]?.total;
    return total === null || next === null || next === undefined ? 0 : next - total;
  });
  const usual = Math.abs(middle(rises));
  const drawn = points.map((point, place) => {
    const rise = Math.abs(rises[place] ?? 0);
    return { ...point, breaksAfter: rise > STEP_MONEY && rise > STEP_TIMES * usual };
  });
  return Object.freeze(drawn);
}

/** From two fifths of the run to about twice the run: where the decision lies. */
export function spanAround(run: number, end: number): Span {
  const round = run >= 60 ? 10 : 5;
  const from = Math.max(1, Math.floor((run * 0.4) / round) * round);
  const to = Math.min(end, Math.max(Math.ceil((run * 2.1) / round) * round, run + 20));
  return { from: Math.min(from, Math.max(1, to - 20)), to };
}

/** From a third of the first crossing to past the run and the last crossing. */
export function spanOfCrossings(run: number, crossings: readonly number[], end: number): Span {
  const first = Math.min(run, ...crossings);
  const last = Math.max(run, ...crossings);
  const to = Math.min(end, Math.max(Math.ceil((last * 1.25) / 10) * 10, 20));
  return { from: Math.max(1, Math.floor((first * 0.35) / 10) * 10), to };
}

/** The money axis of unit costs, and whether what a kit brings in lies within it. */
export interface UnitCostRange {
  low: number;
  high: number;
  brings: "drawn" | "above" | "below";
}

/** The line of what a kit brings in is drawn where the costs still get two fifths of the height. */
const NEAR = 2.5;
/** Below the cheapest kit there is room for the name of a ring. */
const ROOM = 0.24;

/**
 * The money axis of unit costs. The smallest runs cost many times the usual kit; the axis ends at three times
 * the cost at the run, and the line leaves at the top. What a kit brings in widens it unless it lies so far off
 * that the steps would no longer be seen.
 */
export function unitCostRange(
  points: readonly CostPoint[],
  run: number,
  brings: number | null,
): UnitCostRange {
  const known = points.flatMap(({ perKit }) => (perKit === null ? [] : [perKit]));
  const atRun = points.find(({ kits }) => kits === run)?.perKit ?? middle(known);
  const dearest = Math.min(Math.max(0, ...known), atRun * 3);
  const cheapest = known.length > 0 ? Math.min(...known) : 0;
  const height = Math.max(dearest - cheapest, atRun * 0.05);
  const off = brings === null ? "drawn" : placeOf(brings, cheapest, dearest, height * NEAR);
  const drawn = brings === null || off !== "drawn" ? [] : [brings];
  const high = Math.max(dearest, ...drawn.map((net) => net + (net - cheapest) * 0.06), atRun * 1.02);
  const lowest = Math.min(cheapest, ...drawn);
  const low = Math.max(0, lowest - (high - lowest) * ROOM);
  return { low: low < high * 0.15 ? 0 : low, high: Math.max(high, 0.01), brings: off };
}

function placeOf(net: number, cheapest: number, dearest: number, reach: number): UnitCostRange["brings"] {
  if (net > cheapest + reach) return "above";
  return net < dearest - reach ? "below" : "drawn";
}
