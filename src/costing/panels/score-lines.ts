import type { Rect } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/** Straight scores from edge to edge of a panel: where they cross its upper and its left edge, in micrometres. */
export interface ScoreLines {
  x: number[];
  y: number[];
}

/**
 * Scores of a V-scored panel: along every edge of a board that is not the panel's own. None for a routed panel.
 *
 * @example 2 × 1 boards of 30 × 20 mm with rails of 5 mm above and below → x 30 000; y 5 000 and 25 000
 */
export function scoreLines(
  boards: readonly Rect[],
  outer: { width: number; height: number },
  { routed }: PanelMeasures,
): ScoreLines {
  if (routed) return { x: [], y: [] };
  return {
    x: within(
      boards.flatMap(({ x, width }) => [x, x + width]),
      outer.width,
    ),
    y: within(
      boards.flatMap(({ y, height }) => [y, y + height]),
      outer.height,
    ),
  };
}

function within(edges: readonly number[], end: number): number[] {
  return [...new Set(edges)].filter((edge) => edge > 0 && edge < end).sort((a, b) => a - b);
}
