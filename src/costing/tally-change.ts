import type { Figure } from "./figure.ts";
import { grains, grainText } from "./grains.ts";
import { minorDecimals } from "./money.ts";
import { roundedText } from "./rounded-text.ts";
import type { Tally } from "./tally.ts";

/** The figures of the strip that can change. */
export const TALLY_FIGURES = ["costPerKit", "price", "earnsPerKit", "evenAfter", "cashNeeded"] as const;
export type TallyFigure = (typeof TALLY_FIGURES)[number];

export interface TallyChange {
  figure: TallyFigure;
  /** Signed decimal text, money rounded to the minor unit: "-2.14"; never zero. */
  by: string;
  turn: "better" | "worse" | "neither";
}

/** Which way is better; a price that changes is neither. */
const BETTER: Record<TallyFigure, "less" | "more" | null> = {
  costPerKit: "less",
  price: null,
  earnsPerKit: "more",
  evenAfter: "less",
  cashNeeded: "less",
};

/**
 * What an edit did to the figures of the strip: the difference of each figure that is known before and
 * after, rounded to the currency's minor unit, halves away from zero. Figures that stayed are left out.
 *
 * @example tallyChanges(at100, at120)[0] → { figure: "costPerKit", by: "-2.14", turn: "better" }
 */
export function tallyChanges(before: Tally, after: Tally): TallyChange[] {
  return TALLY_FIGURES.flatMap((figure) => {
    const by = difference(before[figure], after[figure], after.currency, figure);
    if (by === null || Number(by) === 0) return [];
    const went = by.startsWith("-") ? "less" : "more";
    const better = BETTER[figure];
    return [
      { figure, by, turn: better === null ? "neither" : better === went ? "better" : "worse" } as const,
    ];
  });
}

function difference(before: Figure, after: Figure, currency: string, figure: TallyFigure): string | null {
  if (!before.known || !after.known) return null;
  const places = figure === "evenAfter" ? 0 : minorDecimals(currency);
  return roundedText(grainText(grains(after.value) - grains(before.value)), places);
}
