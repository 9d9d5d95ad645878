import { scaled, scaledText } from "#src/costing/grains.ts";
import { divideBigHalfAway } from "#src/costing/whole.ts";
import { type Rect, type Size, squareCentimetres } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/** What a panel's laminate goes into, in square centimetres, decimal text: boards, rails and gaps add up to the panel. */
export interface PanelAreas {
  boards: string;
  rails: string;
  /** All that is neither: gaps, what two blocks leave over, the corners round a round board. */
  gaps: string;
  panel: string;
  /** Share of the panel that is board, to 4 decimals, halves up. */
  used: string;
}

/** π with 39 decimals, as a whole number. */
const PI_PLACES = 39;
const PI = scaled("3.141592653589793238462643383279502884197", PI_PLACES);
const USED_PLACES = 4;

/**
 * Areas of a panel. A board counts as its enclosing rectangle, or as an ellipse where it is round (to 8 decimals).
 *
 * @example 12 boards of 58 × 42 mm on 238 × 144 mm, two rails of 5 mm → 292.32, 23.8, 26.6 of 342.72 cm², used 0.8529
 */
export function panelAreas(
  count: number,
  rails: readonly Rect[],
  outer: Size,
  { board, round }: PanelMeasures,
): PanelAreas {
  const area = ({ width, height }: Size) => BigInt(width) * BigInt(height);
  const enclosing = area(board) * BigInt(count);
  const boards = round ? divideBigHalfAway(enclosing * PI, 4n * 10n ** BigInt(PI_PLACES)) : enclosing;
  const railed = rails.reduce((sum, rail) => sum + area(rail), 0n);
  const panel = area(outer);
  const used = divideBigHalfAway(boards * 10n ** BigInt(USED_PLACES), panel);
  return {
    boards: squareCentimetres(boards),
    rails: squareCentimetres(railed),
    gaps: squareCentimetres(panel - boards - railed),
    panel: squareCentimetres(panel),
    used: scaledText(used, USED_PLACES),
  };
}
