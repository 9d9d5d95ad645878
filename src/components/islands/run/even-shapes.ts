import type { CostPoint } from "./cost-points.ts";

/** A place in a chart, in kits and money. */
export interface ChartPlace {
  kits: number;
  money: number;
}

/** The area between cost and takings over a stretch without a crossing. */
export interface GainArea {
  gain: "profit" | "loss";
  upper: ChartPlace[];
  lower: ChartPlace[];
}

/** Where the lines cross between two run sizes; on a step it is the step itself. */
export function meeting(before: CostPoint, after: CostPoint): ChartPlace | null {
  if (before.total === null || before.kept === null || after.total === null || after.kept === null)
    return null;
  if (before.breaksAfter) return { kits: after.kits, money: after.kept };
  const gapBefore = before.kept - before.total;
  const gapAfter = after.kept - after.total;
  const share = gapBefore === gapAfter ? 1 : gapBefore / (gapBefore - gapAfter);
  return {
    kits: before.kits + share * (after.kits - before.kits),
    money: before.kept + share * (after.kept - before.kept),
  };
}

interface Pair {
  kits: number;
  cost: number;
  takings: number;
}

/** What follows a run size on the way to the next: both ends of a step, or the crossing between the two. */
function between(point: CostPoint, next: CostPoint): { last: Pair; turns: boolean } | null {
  const [gap, nextGap] = [gapOf(point), gapOf(next)];
  if (gap === null || nextGap === null) return null;
  const turns = Math.sign(gap) * Math.sign(nextGap) < 0;
  // The old cost holds until the step, where the area closes on the vertical.
  if (point.breaksAfter)
    return {
      last: { kits: next.kits, cost: point.total as number, takings: next.kept as number },
      turns,
    };
  const cross = turns ? meeting(point, next) : null;
  return cross && { last: { kits: cross.kits, cost: cross.money, takings: cross.money }, turns };
}

function gapOf({ total, kept }: CostPoint): number | null {
  return total === null || kept === null ? null : kept - total;
}

/** Cost and takings along the span, cut where the lines cross, with both ends of every step. */
function stretches(points: readonly CostPoint[]): Pair[][] {
  const all: Pair[][] = [];
  let open: Pair[] = [];
  for (const [place, point] of points.entries()) {
    const next = points[place + 1];
    if (gapOf(point) !== null)
      open.push({ kits: point.kits, cost: point.total as number, takings: point.kept as number });
    const way = next ? between(point, next) : null;
    if (way) open.push(way.last);
    if (!way?.turns && gapOf(point) !== null && next && gapOf(next) !== null) continue;
    all.push(open);
    open = way && !point.breaksAfter ? [way.last] : [];
  }
  return [...all, open].filter((stretch) => stretch.length > 1);
}

/** The areas of loss and profit, in order, each closed where the lines cross. */
export function gainAreas(points: readonly CostPoint[]): GainArea[] {
  return stretches(points).map((run) => {
    const gap = run.reduce((sum, { cost, takings }) => sum + takings - cost, 0);
    const costs = run.map(({ kits, cost }) => ({ kits, money: cost }));
    const takings = run.map(({ kits, takings: money }) => ({ kits, money }));
    return gap >= 0
      ? { gain: "profit", upper: takings, lower: costs }
      : { gain: "loss", upper: costs, lower: takings };
  });
}

/** A, B, C …; after Z comes AA. */
export function crossingLetter(place: number): string {
  const rest = Math.floor(place / 26);
  return (rest > 0 ? crossingLetter(rest - 1) : "") + String.fromCharCode(65 + (place % 26));
}

/** The first group of crossings that stand nearer than `least` to their neighbour, as run sizes to enlarge. */
export function crowded(kits: readonly number[], perKitPixels: number, least: number): number[] {
  for (let place = 0; place + 1 < kits.length; place++) {
    const group = [kits[place] as number];
    for (let next = place + 1; next < kits.length; next++) {
      const gap = ((kits[next] as number) - (group.at(-1) as number)) * perKitPixels;
      if (gap >= least) break;
      group.push(kits[next] as number);
    }
    if (group.length > 1) return group;
  }
  return [];
}
