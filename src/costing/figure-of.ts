import type { Figure } from "./figure.ts";
import { grainShare, grainText } from "./grains.ts";
import type { Need } from "./problem.ts";

/** A figure from grains: known when nothing is needed; else with the partial total it would have. */
export function figureOf(value: bigint, needs: Need[]): Figure {
  if (needs.length === 0) return { known: true, value: grainText(value) };
  return { known: false, needs, without: grainText(value) };
}

/** A figure that is known, or of which nothing can be said yet. */
export function wholeFigure(value: bigint | null, needs: Need[]): Figure {
  if (value !== null && needs.length === 0) return { known: true, value: grainText(value) };
  return { known: false, needs, without: null };
}

/** `figure ÷ divisor`, to the nearest grain, for counts above 0; with 0 the needs are handed in. */
export function figurePer(value: bigint, divisor: number, needs: Need[]): Figure {
  if (divisor === 0) return { known: false, needs, without: null };
  return figureOf(grainShare(value, 1n, BigInt(divisor)), needs);
}

/** A figure per kit in both views. */
export function inBothViews(
  spent: bigint,
  used: bigint,
  kits: number,
  spentNeeds: Need[],
  usedNeeds: Need[],
) {
  return { spent: figurePer(spent, kits, spentNeeds), used: figurePer(used, kits, usedNeeds) };
}
