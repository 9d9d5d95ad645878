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
  if (before.total === null || before.brings === null || after.total === null || after.brings === null)
    return null;
  if (before.breaksAfter) return { kits: after.kits, money: after.brings };
  const gapBefore = before.brings - before.total;
  const gapAfter = after.brings - after.total;
  const share = gapBefore === gapAfter ? 1 : gapBefore / (gapBefore - gapAfter);
  return {
    kits: before.kits + share * (after.kits - before.kits),
    money: before.brings + share * (after.brings - before.brings),
  };
}

interface Pair {
  kits: number;
  cost: number;
  takings: number;
}

function gapOf({ cost, takings }: Pair): number {
  return takings - cost;
}

/** The unbroken courses of cost and takings, with both ends of every step; what is not known parts them. */
function courses(points: readonly CostPoint[]): Pair[][] {
  const all: Pair[][] = [[]];
  for (const [place, { kits, total, brings, breaksAfter }] of points.entries()) {
    if (total === null || brings === null) {
      all.push([]);
      continue;
    }
    const next = points[place + 1];
    all.at(-1)?.push({ kits, cost: total, takings: brings });
    // The old cost holds until the step, where the area closes on the vertical.
    if (breaksAfter && next && next.total !== null && next.brings !== null)
      all.at(-1)?.push({ kits: next.kits, cost: total, takings: next.brings });
  }
  return all;
}

/** Where the two lines cross between two places; on the vertical of a step they only change sides. */
function crossingOf(before: Pair, after: Pair): Pair | null {
  if (before.kits === after.kits) return null;
  const share = gapOf(before) / (gapOf(before) - gapOf(after));
  const money = before.takings + share * (after.takings - before.takings);
  return { kits: before.kits + share * (after.kits - before.kits), cost: money, takings: money };
}

/** A course cut where cost and takings change sides, and where they touch. */
function cut(course: readonly Pair[]): Pair[][] {
  const all: Pair[][] = [];
  let open: Pair[] = [];
  for (const pair of course) {
    const before = open.at(-1);
    if (before && gapOf(before) * gapOf(pair) < 0) {
      const cross = crossingOf(before, pair);
      all.push(cross ? [...open, cross] : open);
      open = cross ? [cross] : [];
    }
    open.push(pair);
    if (gapOf(pair) !== 0) continue;
    all.push(open);
    open = [pair];
  }
  return [...all, open].filter((stretch) => stretch.length > 1);
}

/** The areas of loss and profit, in order, each closed where the lines cross. */
export function gainAreas(points: readonly CostPoint[]): GainArea[] {
  return courses(points)
    .flatMap(cut)
    .map((run) => {
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
