import type { Arrangement } from "./arrangement.ts";
import type { Rect, Size } from "./micrometres.ts";
import { type PanelAreas, panelAreas } from "./panel-areas.ts";
import { outerOf } from "./panel-frame.ts";
import type { PanelMeasures } from "./panel-measures.ts";
import { type PlacedBoard, placeBoards } from "./place-boards.ts";
import { type Rail, railsOf } from "./rails.ts";
import { type ScoreLines, scoreLines } from "./score-lines.ts";
import { tabsBetween } from "./tabs.ts";

/** One panel, cut to what its boards need, place by place in whole micrometres from its upper left corner. */
export interface Panel {
  arrangement: Arrangement;
  measures: PanelMeasures;
  outer: Size;
  boards: PlacedBoard[];
  rails: Rail[];
  /** Routed panels only. */
  tabs: Rect[];
  /** V-scored panels only. */
  scores: ScoreLines;
  areas: PanelAreas;
}

/**
 * A layout as a panel: outer size, every board, rail, breaking tab and score, and the areas.
 *
 * @example 4 × 3 boards of 58 × 42 mm, routed with 2 mm, rails of 5 mm along the long sides → 238 × 144 mm
 */
export function layOutPanel(arrangement: Arrangement, measures: PanelMeasures): Panel {
  const outer = outerOf(arrangement, measures);
  const boards = placeBoards(arrangement, measures);
  const rails = railsOf(outer, measures);
  return {
    arrangement,
    measures,
    outer,
    boards,
    rails,
    tabs: tabsBetween(boards, rails, measures),
    scores: scoreLines(boards, outer, measures),
    areas: panelAreas(arrangement.count, rails, outer, measures),
  };
}
