import { moneyText } from "#src/components/amount-text.ts";
import { freePlace, type NameBox, nameWidth } from "#src/components/islands/charts/label-room.ts";
import type { Pixels } from "#src/components/islands/charts/pixels.ts";
import type { ChartScale } from "./chart-scale.ts";
import type { CostPoint } from "./cost-points.ts";
import type { EvenChartProps } from "./EvenChart.tsx";
import { type ChartPlace, type GainArea, meeting } from "./even-shapes.ts";

/** A crossing with its place in the chart. */
export interface PlacedCrossing {
  letter: string;
  kits: number;
  place: ChartPlace;
}

/** Every crossing of the chart at the place where the lines meet. */
export function placedCrossings({ points, crossings }: EvenChartProps): PlacedCrossing[] {
  return crossings.flatMap(({ letter, kits }) => {
    const after = points.findIndex((point) => point.kits === kits);
    const [before, at] = [points[after - 1], points[after]];
    const place = before && at ? meeting(before, at) : null;
    return place ? [{ letter, kits, place }] : [];
  });
}

/** An area lower than this has no room for its name. */
const NAME_HEIGHT = 30;

/** The middle of an area where it is tallest, or so far to the side of that as it stays tall enough for a name. */
export function middleOf(
  points: readonly CostPoint[],
  gain: GainArea["gain"],
  scale: ChartScale,
  aside: number,
): Pixels | null {
  const tall = points.flatMap(({ kits, total, brings }) => {
    if (total === null || brings === null || brings >= total !== (gain === "profit")) return [];
    const [one, other] = [scale({ kits, money: total }), scale({ kits, money: brings })];
    return [{ x: one.x, y: (one.y + other.y) / 2, height: Math.abs(one.y - other.y) }];
  });
  const none = { x: 0, y: 0, height: 0 };
  const tallest = tall.reduce((best, place) => (place.height > best.height ? place : best), none);
  const wanted = tallest.x + aside;
  const near = tall
    .filter(({ height }) => height > NAME_HEIGHT)
    .reduce(
      (best, place) => (Math.abs(place.x - wanted) < Math.abs(best.x - wanted) ? place : best),
      tallest,
    );
  return near.height > NAME_HEIGHT ? near : null;
}

/** How high and how low on the screen the cost line stands between two places across. */
function costReach(points: readonly CostPoint[], scale: ChartScale, left: number, right: number) {
  const within = points.flatMap(({ kits, total }) => {
    const at = total === null ? null : scale({ kits, money: total });
    return at && at.x >= left - 6 && at.x <= right + 6 ? [at.y] : [];
  });
  return { head: Math.min(...within), foot: Math.max(0, ...within) };
}

/** The box of a name of one line by its baseline. */
function named(left: number, right: number, baseline: number): NameBox {
  return { left, right, top: baseline - 15, bottom: baseline + 5 };
}

/** Half of the room that the name of the cost line takes. */
const HALF = 38;

/** Where along the span the cost line has room below it, or above, for its name. */
export function costNamePlace(
  points: readonly CostPoint[],
  scale: ChartScale,
  taken: readonly NameBox[],
): Pixels | undefined {
  const known = points.filter(({ total }) => total !== null);
  const first = known[0];
  if (!first) return undefined;
  const start = scale({ kits: first.kits, money: 0 }).x + HALF;
  const across = (share: number) => {
    const point = known[Math.floor((known.length - 1) * share)] ?? first;
    return Math.max(start, scale({ kits: point.kits, money: 0 }).x);
  };
  const reach = (x: number) => costReach(points, scale, x - HALF, x + HALF);
  const below = [0.62, 0.8, 0.48].map(across).map((x) => ({ x, y: reach(x).foot + 22 }));
  const above = [0.1, 0.2, 0.3]
    .map(across)
    .flatMap((x) => [12, 34].map((away) => ({ x, y: reach(x).head - away })));
  const places = [...below, ...above];
  return freePlace(
    places.map((place) => ({ ...place, ...named(place.x - HALF, place.x + HALF, place.y) })),
    taken,
  );
}

/** Places of the run's ring, of the takings that pay for it, and of both names. */
export interface PaidPlaces {
  ring: Pixels;
  cost: string;
  back: Pixels | null;
  foot: number;
  runName: Pixels & { anchor: "start" | "end"; words: string };
  /** What both names and the line down from the takings cover. */
  taken: NameBox[];
}

/** From the run's cost back to the takings that pay for it, and down. */
export function paidBack(
  { points, run, soldToPay, currency }: EvenChartProps,
  scale: ChartScale,
  plot: { x: number; y: number; width: number; height: number },
): PaidPlaces | null {
  const made = points.find(({ kits }) => kits === run);
  if (!made || made.total === null || made.exact.total === null) return null;
  const ring = scale({ kits: run, money: made.total });
  const sold = soldToPay === null ? undefined : points.find(({ kits }) => kits === soldToPay);
  const back = sold ? scale({ kits: sold.kits, money: made.total }) : null;
  const foot = plot.y + plot.height;
  const words = `${run} cost ${moneyText(made.exact.total, currency)}`;
  const width = nameWidth(words);
  const fits = ring.x + 12 + width <= plot.x + plot.width;
  const [left, right] = fits ? [ring.x + 12, ring.x + 12 + width] : [ring.x + 8 - width, ring.x + 8];
  const below = Math.max(ring.y + 26, costReach(points, scale, left, right).foot + 22);
  // Below the line where there is room above the names at the foot; else above the ring.
  const y = below < foot - 66 ? below : ring.y - 16;
  const runBox = named(left, right, y);
  // Two names one below the other would read as one.
  const taken = [{ ...runBox, top: runBox.top - 8, bottom: runBox.bottom + 8 }];
  if (back)
    taken.push(
      { left: back.x - 4, right: back.x + 140, top: foot - 54, bottom: foot },
      { left: back.x - 6, right: back.x + 6, top: ring.y, bottom: foot },
    );
  const runName = { x: fits ? left : right, y, anchor: fits ? "start" : "end", words } as const;
  return { ring, cost: made.exact.total, back, foot, runName, taken };
}
