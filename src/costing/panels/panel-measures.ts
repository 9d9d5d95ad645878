import { PANEL_BOARD_LEAST, PANEL_SIDE_MOST } from "#src/shapes/limits.ts";
import { micrometres, type Size } from "./micrometres.ts";
import type { PanelField, PanelProblem, PanelProblemCode } from "./panel-problem.ts";
import type { PanelBoard, PanelSize, PanelTerms } from "./panel-terms.ts";

/** A board and a house's terms in whole micrometres, the panels lying on their long sides. */
export interface PanelMeasures {
  round: boolean;
  routed: boolean;
  board: Size;
  largest: Size;
  least: Size | null;
  gap: number;
  /** Width of a rail; 0 where there is none. */
  rail: number;
  railsAlongLong: boolean;
  railsAlongShort: boolean;
}

/** Either the measures, or every reason against them. */
export type MeasuresRead = { ok: true; measures: PanelMeasures } | { ok: false; problems: PanelProblem[] };

const MICRO = 1000;

/**
 * Reads a board and a house's terms, in decimal millimetres, and refuses what no panel can be.
 *
 * @example 58 × 42 mm, routed with 2 mm, largest panel 200 × 250 → largest 250 000 × 200 000 µm
 */
export function readMeasures(board: PanelBoard, terms: PanelTerms): MeasuresRead {
  const problems: PanelProblem[] = [];
  const refuse = (code: PanelProblemCode, field: PanelField) => problems.push({ code, field, facts: {} });
  const length = (text: string, field: PanelField, least: number): number => {
    const read = micrometres(text);
    if (read === null) refuse("too-fine", field);
    else if (read > PANEL_SIDE_MOST * MICRO) refuse("too-large", field);
    else if (read < least) refuse("too-small", field);
    return read ?? 0;
  };
  const size = (of: PanelSize, field: "board" | "largest" | "least", least: number): Size => ({
    width: length(of.width, `${field}.width`, least),
    height: length(of.height, `${field}.height`, least),
  });
  const { separation, rails } = terms;
  const measures: PanelMeasures = {
    round: board.shape === "round",
    routed: separation === "routed",
    board: size(board, "board", PANEL_BOARD_LEAST * MICRO),
    largest: lying(size(terms.largest, "largest", PANEL_BOARD_LEAST * MICRO)),
    least: terms.least && lying(size(terms.least, "least", 0)),
    gap: length(terms.gap, "gap", 0),
    rail: rails.sides === "none" ? 0 : length(rails.width, "rails.width", 0),
    railsAlongLong: rails.sides === "long" || rails.sides === "all",
    railsAlongShort: rails.sides === "short" || rails.sides === "all",
  };
  if (problems.length === 0) together(measures, rails.sides !== "none", refuse);
  return problems.length === 0 ? { ok: true, measures } : { ok: false, problems };
}

/** What is wrong only in combination. */
function together(
  { round, routed, gap, rail, least, largest }: PanelMeasures,
  railed: boolean,
  refuse: (code: PanelProblemCode, field: PanelField) => void,
): void {
  if (!routed && round) refuse("round-v-score", "separation");
  if (!routed && gap > 0) refuse("gap-with-v-score", "gap");
  if (routed && gap === 0) refuse("routed-without-gap", "gap");
  if (railed && rail === 0) refuse("rail-without-width", "rails.width");
  if (least && (least.width > largest.width || least.height > largest.height))
    refuse("least-above-largest", "least");
}

/** A size lying on its long side. */
function lying({ width, height }: Size): Size {
  return width >= height ? { width, height } : { width: height, height: width };
}
