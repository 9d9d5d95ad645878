import { exact } from "#src/costing/decimal.ts";
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

const PI = "3.141592653589793238462643383279502884197";
/** Decimals of an area in square centimetres that is a whole number of square micrometres. */
const PLACES = 8;

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
  const enclosing = squareCentimetres(area(board) * BigInt(count));
  const boards = round ? exact(enclosing).times(PI).div(4).toDecimalPlaces(PLACES).toFixed() : enclosing;
  const railed = squareCentimetres(rails.reduce((sum, rail) => sum + area(rail), 0n));
  const panel = squareCentimetres(area(outer));
  return {
    boards,
    rails: railed,
    gaps: exact(panel).minus(boards).minus(railed).toFixed(),
    panel,
    used: exact(boards).div(panel).toDecimalPlaces(4).toFixed(),
  };
}
