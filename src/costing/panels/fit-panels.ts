import { BOARDS_PER_PANEL_MOST } from "#src/shapes/limits.ts";
import { type Arrangement, asItLies, howMany } from "./arrangement.ts";
import { gridsIn, waysRound } from "./grids.ts";
import { type Size, sizeWords } from "./micrometres.ts";
import { mostByArea } from "./most-boards.ts";
import { outerOf, reachesLeast, roomIn } from "./panel-frame.ts";
import { type PanelMeasures, readMeasures } from "./panel-measures.ts";
import type { PanelProblem } from "./panel-problem.ts";
import type { PanelBoard, PanelTerms } from "./panel-terms.ts";
import { twoBlocksIn } from "./two-blocks.ts";

/**
 * What the largest count claims to be. `proven`: no layout that may be made holds more. `best-tried`: the most of
 * all grids and two-block layouts; `mostByArea` says how many a cleverer layout might hold at best.
 */
export type PanelClaim = "proven" | "best-tried";

export interface FittedPanels {
  ok: true;
  measures: PanelMeasures;
  /** By count, ascending, at least one: of each count the layout with the least outer area. */
  arrangements: Arrangement[];
  most: number;
  mostByArea: number;
  claim: PanelClaim;
}

/** Either all counts that fit, or why none does. */
export type PanelsFitted = FittedPanels | { ok: false; problems: PanelProblem[] };

/**
 * How many boards fit on a house's panels (section 6): every count that some layout has, each in the layout that
 * needs the smallest panel. Ties: grids before two blocks, as drawn before turned, wider before taller.
 *
 * @example 58 × 42 mm, largest 250 × 200 mm, rails of 5 mm along the long sides, routed with 2 mm → most 16
 */
export function fitPanels(board: PanelBoard, terms: PanelTerms): PanelsFitted {
  const read = readMeasures(board, terms);
  if (!read.ok) return read;
  const { measures } = read;
  const problem = tooLarge(measures) ?? tooMany(measures);
  if (problem) return { ok: false, problems: [problem] };
  const room = roomIn(measures);
  const all = layoutsIn(room, measures);
  const arrangements = smallestOfEach(all, measures);
  const last = arrangements.at(-1);
  if (last === undefined) return { ok: false, problems: [belowLeast(all, measures)] };
  const byArea = mostByArea(room, measures);
  const proven = !measures.round && (!measures.routed || last.count === byArea);
  const claim = proven ? "proven" : "best-tried";
  return { ok: true, measures, arrangements, most: last.count, mostByArea: byArea, claim };
}

/**
 * Every layout that is tried: grids, and for routed panels two blocks.
 *
 * @example V-scored 250 × 190 mm, boards of 58 × 42 mm → the grids 4 × 4 … 1 × 1 and the turned ones
 */
export function layoutsIn(room: Size, measures: PanelMeasures): Arrangement[] {
  return [...gridsIn(room, measures), ...(measures.routed ? twoBlocksIn(room, measures) : [])];
}

function tooLarge(measures: PanelMeasures): PanelProblem | null {
  const room = roomIn(measures);
  const fits = waysRound(measures).some((turned) => {
    const { width, height } = asItLies(measures.board, turned);
    return width <= room.width && height <= room.height;
  });
  if (fits) return null;
  const left = { width: Math.max(0, room.width), height: Math.max(0, room.height) };
  const facts = { board: sizeWords(measures.board), room: sizeWords(left) };
  return { code: "board-larger-than-panel", field: "board", facts };
}

/** Bounds the work before it is begun. */
function tooMany(measures: PanelMeasures): PanelProblem | null {
  const room = roomIn(measures);
  const counts = waysRound(measures).map((turned) => {
    const { width, height } = asItLies(measures.board, turned);
    return howMany(room.width, width, measures.gap) * howMany(room.height, height, measures.gap);
  });
  const most = Math.max(...counts);
  return most > BOARDS_PER_PANEL_MOST ? { code: "too-many-boards", field: "board", facts: { most } } : null;
}

function smallestOfEach(all: readonly Arrangement[], measures: PanelMeasures): Arrangement[] {
  const best = new Map<number, { arrangement: Arrangement; area: number }>();
  for (const arrangement of all) {
    const outer = outerOf(arrangement, measures);
    const area = outer.width * outer.height;
    const held = best.get(arrangement.count);
    if (held !== undefined && held.area <= area) continue;
    if (reachesLeast(outer, measures.least)) best.set(arrangement.count, { arrangement, area });
  }
  return [...best.values()].map(({ arrangement }) => arrangement).sort((a, b) => a.count - b.count);
}

function belowLeast(all: readonly Arrangement[], measures: PanelMeasures): PanelProblem {
  const largest = all.reduce((most, one) => (one.count > most.count ? one : most));
  const facts = { panel: sizeWords(outerOf(largest, measures)) };
  return { code: "below-least", field: "least", facts };
}
