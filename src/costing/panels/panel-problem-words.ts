import { BOARDS_PER_PANEL_MOST, PANEL_BOARD_LEAST, PANEL_SIDE_MOST } from "#src/shapes/limits.ts";
import type { PanelField, PanelProblem, PanelProblemCode } from "./panel-problem.ts";

const FIELDS: Record<PanelField, string> = {
  board: "the board",
  largest: "the largest panel",
  quoted: "the quoted panel",
  least: "the least panel",
  "board.width": "the board's width",
  "board.height": "the board's height",
  "largest.width": "the largest panel's width",
  "largest.height": "the largest panel's height",
  "least.width": "the least panel's width",
  "least.height": "the least panel's height",
  separation: "how boards are parted",
  gap: "the gap",
  "rails.width": "the rail's width",
};

type Said = Required<Record<"board" | "room" | "panel", string>> & {
  most: number;
  count: number;
  field: string;
};

const SENTENCES: Record<PanelProblemCode, (said: Said) => string> = {
  "too-fine": ({ field }) => `Write ${field} in whole micrometres: at most 3 decimals of a millimetre.`,
  "too-small": ({ field }) => `Check ${field}: it is less than ${PANEL_BOARD_LEAST} mm.`,
  "too-large": ({ field }) => `Check ${field}: no panel has a side of more than ${PANEL_SIDE_MOST} mm.`,
  "gap-with-v-score": () => "Scored boards lie edge to edge. Write a gap of 0, or choose routing.",
  "routed-without-gap": () => "A router needs room between boards. Write its width, or choose V-scoring.",
  "rail-without-width": () => "Write how wide the rails are, or choose a panel without rails.",
  "round-v-score": () =>
    "A round board cannot be V-scored, because a score runs straight from edge to edge. Choose routing.",
  "least-above-largest": () =>
    "The least panel does not fit into the largest. Check which of the two is wrong.",
  "board-larger-than-panel": ({ board, room }) =>
    `A board of ${board} does not fit into the ${room} that rails and gaps leave. Narrow the rails, or ask for a larger panel.`,
  "below-least": ({ panel }) =>
    `The largest panel of this board would be ${panel}, which is below the least size. Widen the rails, or order single boards.`,
  "too-many-boards": ({ most }) =>
    `${most} boards would fit, and more than ${BOARDS_PER_PANEL_MOST} to a panel are not laid out. Check the board's size.`,
  "quoted-panel-too-small": ({ board, panel, count }) =>
    `${count} boards of ${board} do not fit on a panel of ${panel}, however they lie. Check its size and the boards on it.`,
};

/**
 * A problem as a sentence: what is wrong, and what to do.
 *
 * @example round-v-score → "A round board cannot be V-scored, because a score runs straight from edge to edge. Choose routing."
 */
export function panelSentence({ code, field, facts }: PanelProblem): string {
  return SENTENCES[code]({
    board: "",
    room: "",
    panel: "",
    most: 0,
    count: 0,
    ...facts,
    field: FIELDS[field],
  });
}
