import { divideDown } from "#src/costing/whole.ts";
import type { Rect, Size } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/** A hole by which the panel is held: its middle and how wide it is, in micrometres. */
export interface ToolingHole {
  x: number;
  y: number;
  across: number;
}

export interface Rail extends Rect {
  holes: ToolingHole[];
}

const HOLE = 3_000;
const HOLE_FROM_END = 8_000;

/**
 * The rails of a panel of this outer size. Rails along the long sides run through; those along the short sides
 * stand between them. A pair of rails has tooling holes of 3 mm, or three fifths of its width where that is less, in
 * its middle line and 8 mm from its ends, or a quarter of its length where that is less; a frame of four has them in
 * its corners, clear of scores: common practice, no source.
 *
 * @example 238 × 144 mm, rails of 5 mm along the long sides → two of 238 × 5 mm, holes at 8 and 230 mm
 */
export function railsOf(outer: Size, measures: PanelMeasures): Rail[] {
  const { rail, railsAlongLong, railsAlongShort } = measures;
  const { width, height } = outer;
  const inset = railsAlongLong ? rail : 0;
  const frame = railsAlongLong && railsAlongShort;
  const along = [0, height - rail].map((y) => ({ x: 0, y, width, height: rail }));
  const upright = [0, width - rail].map((x) => ({ x, y: inset, width: rail, height: height - 2 * inset }));
  return [
    ...(railsAlongLong ? along.map((rect) => ({ ...rect, holes: holesIn(rect, rail, frame) })) : []),
    ...(railsAlongShort
      ? upright.map((rect) => ({ ...rect, holes: frame ? [] : holesIn(rect, rail, false) }))
      : []),
  ];
}

function holesIn({ x, y, width, height }: Rect, rail: number, inCorners: boolean): ToolingHole[] {
  const across = Math.min(HOLE, divideDown(3 * rail, 5));
  const length = Math.max(width, height);
  const middle = divideDown(rail, 2);
  const fromEnd = inCorners ? middle : Math.min(HOLE_FROM_END, divideDown(length, 4));
  return [fromEnd, length - fromEnd].map((along) =>
    width >= height ? { x: x + along, y: y + middle, across } : { x: x + middle, y: y + along, across },
  );
}
