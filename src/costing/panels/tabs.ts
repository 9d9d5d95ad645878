import { divideDown, divideUp } from "#src/costing/whole.ts";
import type { Rect } from "./micrometres.ts";
import type { PanelMeasures } from "./panel-measures.ts";

/** Width of a breaking tab, and the length of a side beyond which each such length more has one more, in micrometres. */
export const TAB_WIDTH = 5_000;
const ONE_MORE_EVERY = 50_000;
/** A side shorter than this has room for one tab only. */
const ROOM_FOR_TWO = 20_000;

/**
 * Breaking tabs of a routed panel, each across the gap between two boards or a board and a rail that face each
 * other: one where they do so for less than 20 mm, else two, and three from more than 100 mm on, one more for each
 * 50 mm begun; evenly spread, each in the middle of its share. A tab is 5 mm wide, or half of what faces where that
 * is less; corners that face for less than a tab's width have none. A round board is held where it comes nearest:
 * one tab in the middle. Common practice, no source.
 *
 * @example sides of 58 mm face each other → two tabs, 14.5 and 43.5 mm along
 */
export function tabsBetween(
  boards: readonly Rect[],
  rails: readonly Rect[],
  { routed, round, gap }: PanelMeasures,
): Rect[] {
  if (!routed) return [];
  const pieces = [...boards, ...rails];
  return [...across(pieces, gap, round), ...across(pieces.map(lying), gap, round).map(lying)];
}

/** Tabs between all pieces that stand side by side a gap apart. */
function across(pieces: readonly Rect[], gap: number, round: boolean): Rect[] {
  const startingAt = new Map<number, Rect[]>();
  for (const piece of pieces) {
    const held = startingAt.get(piece.x);
    if (held) held.push(piece);
    else startingAt.set(piece.x, [piece]);
  }
  return pieces.flatMap((left) => {
    const x = left.x + left.width;
    return (startingAt.get(x + gap) ?? []).flatMap((right) => tabsAt(x, left, right, gap, round));
  });
}

function tabsAt(x: number, left: Rect, right: Rect, gap: number, round: boolean): Rect[] {
  const from = Math.max(left.y, right.y);
  const facing = Math.min(left.y + left.height, right.y + right.height) - from;
  if (facing < Math.min(TAB_WIDTH, left.height, right.height)) return [];
  const tabs = round ? 1 : tabsAlong(facing);
  const height = Math.min(TAB_WIDTH, divideDown(facing, 2));
  return Array.from({ length: tabs }, (_, tab) => {
    const middle = from + divideDown(facing * (2 * tab + 1), 2 * tabs);
    return { x, y: middle - divideDown(height, 2), width: gap, height };
  });
}

/**
 * Tabs along a facing length in micrometres.
 *
 * @example tabsAlong(15_000) === 1; tabsAlong(58_000) === 2; tabsAlong(120_000) === 3
 */
export function tabsAlong(facing: number): number {
  return facing < ROOM_FOR_TWO ? 1 : Math.max(2, divideUp(facing, ONE_MORE_EVERY));
}

/** A rectangle with x and y exchanged. */
function lying({ x, y, width, height }: Rect): Rect {
  return { x: y, y: x, width: height, height: width };
}
