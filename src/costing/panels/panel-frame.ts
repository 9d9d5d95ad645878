import type { Size } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/**
 * What rails and the gaps towards them take at each end, in micrometres: `x` left and right, `y` above and below.
 *
 * @example rails of 5 mm along the long sides, routed with 2 mm → x 0, y 7 000
 */
export function margins({ rail, gap, railsAlongLong, railsAlongShort }: PanelMeasures) {
  return { x: railsAlongShort ? rail + gap : 0, y: railsAlongLong ? rail + gap : 0 };
}

/**
 * What rails and gaps leave for boards in the largest panel; a side may come out below 0.
 *
 * @example 250 × 200 mm, rails of 5 mm along the long sides, routed with 2 mm → 250 000 × 186 000
 */
export function roomIn(measures: PanelMeasures): Size {
  const { x, y } = margins(measures);
  return { width: measures.largest.width - 2 * x, height: measures.largest.height - 2 * y };
}

/**
 * Outer size of a panel cut to what its boards need.
 *
 * @example boards of 238 × 130 mm together, the rails above → 238 000 × 144 000
 */
export function outerOf(boards: Size, measures: PanelMeasures): Size {
  const { x, y } = margins(measures);
  return { width: boards.width + 2 * x, height: boards.height + 2 * y };
}

/**
 * Whether a panel is at least as large as the house's least, either way round.
 *
 * @example 60 × 100 mm reaches a least of 80 × 50 mm
 */
export function reachesLeast({ width, height }: Size, least: Size | null): boolean {
  if (least === null) return true;
  return (width >= least.width && height >= least.height) || (width >= least.height && height >= least.width);
}
