import type { SweepColumns, SweepResult } from "#src/costing/sweep-result.ts";
import type { CostPoint } from "./cost-points.ts";

export type WhyShown = "yours" | "sweet-spot" | "before-a-step" | "round";

/** A run size worth comparing, with its figures, exact; null where not known. */
export interface WorthALook {
  kits: number;
  why: WhyShown;
  perKit: string | null;
  cash: string | null;
  evenAfter: number | null;
  profit: string | null;
}

/** So many run sizes can be compared at a glance. */
const SHOWN = 7;

/** How far apart two run sizes are: in ratio, as people compare them. */
const distance = (kits: number, run: number) => Math.abs(Math.log(kits / run));

/** Half, one and two times the run, as numbers people would choose. */
function roundNumbers(run: number, to: number): number[] {
  const step = run >= 100 ? 50 : run >= 40 ? 25 : 10;
  return [0.5, 1, 2].flatMap((times) => {
    const near = Math.round((run * times) / step) * step;
    return near >= 1 && near <= to ? [near] : [];
  });
}

function reasons(sweep: SweepResult, points: readonly CostPoint[], run: number): Map<number, WhyShown> {
  const found = new Map<number, WhyShown>();
  for (const kits of roundNumbers(run, sweep.to)) found.set(kits, "round");
  for (const { kits, breaksAfter } of points) if (breaksAfter) found.set(kits, "before-a-step");
  for (const { kits } of sweep.sweetSpots) found.set(kits, "sweet-spot");
  return found;
}

/** The figures of one run size. */
export function rowAt(columns: SweepColumns, kits: number, why: WhyShown): WorthALook {
  const at = <T>(column: readonly (T | null)[]) => column[kits - 1] ?? null;
  return {
    kits,
    why,
    perKit: at(columns.perKitUsed),
    cash: at(columns.spent),
    evenAfter: at(columns.soldToPay),
    profit: at(columns.profit),
  };
}

/**
 * Runs worth comparing with the chosen one, smallest first: sweet spots, the last kit before a step in cost,
 * and round numbers, those nearest in ratio to the run. The chosen run is always among them.
 */
export function worthALook(
  sweep: SweepResult,
  columns: SweepColumns,
  points: readonly CostPoint[],
  run: number,
): WorthALook[] {
  const rank = { yours: 0, "sweet-spot": 0, "before-a-step": 0.35, round: 0.55 };
  const others = [...reasons(sweep, points, run)]
    .filter(([kits]) => kits !== run && kits >= run / 4 && kits <= run * 4)
    .sort(
      ([one, why], [other, otherWhy]) =>
        distance(one, run) + rank[why] - (distance(other, run) + rank[otherWhy]) || one - other,
    )
    .slice(0, SHOWN - 1);
  const shown: [number, WhyShown][] = run <= sweep.to ? [...others, [run, "yours"]] : others;
  return shown.sort(([one], [other]) => one - other).map(([kits, why]) => rowAt(columns, kits, why));
}
