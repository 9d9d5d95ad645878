import { evenRuns } from "./even-runs.ts";
import { grainShare, grainText, ONE } from "./grains.ts";
import { BRINGS_NEEDS, USED_NEEDS } from "./run-sheet.ts";
import type { BreakEven, Crossing } from "./sweep-result.ts";
import type { Swept } from "./swept.ts";

/**
 * Break-even over the sweep (section 11): profit(n) = brought by n sales − used cost of a run of n.
 * Costs go up in steps, so every passing of zero is listed with what stepped; `first` is the first
 * run without a loss and `safe` the one from which no run up to `upTo` loses.
 *
 * @example fixed 20 000, price 400, variable 250 → first and safe 134, one crossing up
 */
export function breakEvenOf(swept: Swept, planned: number): BreakEven {
  const upTo = knownUpTo(swept);
  const profit = (kits: number) => (swept.brings[kits] as bigint) - (swept.used[kits] as bigint);
  const { turns, first, safe } = evenRuns(profit, upTo);
  const crossings = turns.map(
    ({ kits, way }): Crossing => ({
      kits,
      way,
      profitBefore: grainText(profit(kits - 1)),
      profit: grainText(profit(kits)),
      changes: swept.changesAt(kits),
    }),
  );
  return { known: upTo > 0, crossings, first, safe, upTo, marginOfSafety: marginOfSafety(planned, safe) };
}

/**
 * Margin of safety (section 11): `(planned − break-even) ÷ planned`, as a share; negative where fewer
 * are planned than pay.
 *
 * @example planned 120, safe from 65: 0.458333…
 */
export function marginOfSafety(planned: number, breakEven: number | null): string | null {
  return breakEven === null ? null : grainText(grainShare(ONE, BigInt(planned - breakEven), BigInt(planned)));
}

function knownUpTo({ missing, to }: Swept): number {
  for (let kits = 1; kits <= to; kits += 1) {
    if (((missing[kits] as number) & (USED_NEEDS | BRINGS_NEEDS)) !== 0) return kits - 1;
  }
  return to;
}
