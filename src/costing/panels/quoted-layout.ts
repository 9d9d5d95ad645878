import type { Arrangement } from "./arrangement.ts";
import { type FittedPanels, layoutsIn } from "./fit-panels.ts";
import { micrometres, type Size } from "./micrometres.ts";
import { outerOf, roomIn } from "./panel-frame.ts";
import type { PanelSize } from "./panel-terms.ts";

/**
 * The layout a house's quote is for: one of that count whose panel has the size quoted, either way round; where
 * none has, or no size is stated, the smallest of that count. `null`: the house's terms hold no panel of that count.
 *
 * @example 12 boards of 58 × 42 mm, quoted for 238 × 144 mm → 4 × 3, although 3 × 4 turned needs less
 */
export function quotedLayout(
  fitted: FittedPanels,
  count: number,
  quoted: PanelSize | null,
): Arrangement | null {
  const { measures, arrangements } = fitted;
  const size = quoted && [micrometres(quoted.width), micrometres(quoted.height)];
  const asQuoted = size
    ? layoutsIn(roomIn(measures), measures).find(
        (one) => one.count === count && isOf(outerOf(one, measures), size),
      )
    : undefined;
  return asQuoted ?? arrangements.find((one) => one.count === count) ?? null;
}

function isOf({ width, height }: Size, [one, other]: (number | null)[]): boolean {
  return (width === one && height === other) || (width === other && height === one);
}
