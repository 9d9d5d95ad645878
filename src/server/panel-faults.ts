import { fitPanels } from "#src/costing/panels/fit-panels.ts";
import { readMeasures } from "#src/costing/panels/panel-measures.ts";
import type { PanelField, PanelProblem } from "#src/costing/panels/panel-problem.ts";
import { panelSentence } from "#src/costing/panels/panel-problem-words.ts";
import type { PanelBoard, PanelTerms } from "#src/costing/panels/panel-terms.ts";
import { quotedPanelProblem } from "#src/costing/panels/quoted-panel.ts";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";
import { PANEL_BOARD_LEAST } from "#src/shapes/limits.ts";
import type { PanelTermsFields } from "#src/shapes/panel-terms.ts";
import { type FieldError, Problem } from "./problem.ts";

/** The field of panel terms that a problem is shown at; what is about the board shows at the largest panel. */
const TERMS_FIELD: Record<PanelField, keyof PanelTermsFields> = {
  board: "largestWidth",
  "board.width": "largestWidth",
  "board.height": "largestWidth",
  largest: "largestWidth",
  "largest.width": "largestWidth",
  "largest.height": "largestHeight",
  quoted: "largestWidth",
  least: "leastWidth",
  "least.width": "leastWidth",
  "least.height": "leastHeight",
  separation: "separation",
  gap: "gap",
  "rails.width": "railWidth",
};

/** Panel terms as the core takes them. */
export function coreTerms(fields: Omit<PanelTermsFields, "boardHouse">): PanelTerms {
  const { leastWidth, leastHeight, separation, gap } = fields;
  return {
    largest: { width: fields.largestWidth, height: fields.largestHeight },
    least: leastWidth === null || leastHeight === null ? null : { width: leastWidth, height: leastHeight },
    separation,
    gap,
    rails: { sides: fields.railSides, width: fields.railWidth },
  };
}

/** The least board there is: with it only what contradicts itself is found. */
const LEAST_BOARD: PanelBoard = {
  shape: "rectangle",
  width: String(PANEL_BOARD_LEAST),
  height: String(PANEL_BOARD_LEAST),
};

/** Refuses terms by which no panel can be made, or none of the kit's board where its size is known. */
export function refuseTerms(fields: PanelTermsFields, board: PanelBoard | null): void {
  const terms = coreTerms(fields);
  const read = board === null ? readMeasures(LEAST_BOARD, terms) : fitPanels(board, terms);
  if (read.ok) return;
  throw new Problem("wrong-input", { errors: read.problems.map(errorAt) });
}

function errorAt(problem: PanelProblem): FieldError {
  return { at: TERMS_FIELD[problem.field], message: panelSentence(problem) };
}

/** Refuses a quote whose boards do not fit on its panel; the kit's board where the quote states none. */
export function refuseQuotedPanel(quote: BoardQuoteFields, board: PanelBoard | null): void {
  const { boardsPerPanel, panelWidth, panelHeight } = quote;
  const [width, height] = [quote.width ?? board?.width ?? null, quote.height ?? board?.height ?? null];
  if (boardsPerPanel === null || panelWidth === null || panelHeight === null) return;
  if (width === null || height === null) return;
  const quoted = { shape: board?.shape ?? "rectangle", width, height };
  const problem = quotedPanelProblem(quoted, { width: panelWidth, height: panelHeight }, boardsPerPanel);
  if (problem)
    throw new Problem("wrong-input", { errors: [{ at: "panelWidth", message: panelSentence(problem) }] });
}
