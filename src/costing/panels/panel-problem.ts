/** Why a board cannot be put on panels; `panel-problem-words.ts` turns codes into sentences. */
export const PANEL_PROBLEM_CODES = [
  "too-fine",
  "too-small",
  "too-large",
  "gap-with-v-score",
  "routed-without-gap",
  "rail-without-width",
  "round-v-score",
  "least-above-largest",
  "board-larger-than-panel",
  "below-least",
  "too-many-boards",
  "quoted-panel-too-small",
] as const;
export type PanelProblemCode = (typeof PANEL_PROBLEM_CODES)[number];

/** The input a problem is about. */
export type PanelField =
  | `${"board" | "largest" | "least"}.${"width" | "height"}`
  | "board"
  | "largest"
  | "quoted"
  | "least"
  | "separation"
  | "gap"
  | "rails.width";

/** `board`, `room`, `panel`: sizes in words, "58 × 42 mm"; `most`, `count`: of boards. */
export interface PanelFacts {
  board?: string;
  room?: string;
  panel?: string;
  most?: number;
  count?: number;
}

export interface PanelProblem {
  code: PanelProblemCode;
  field: PanelField;
  facts: PanelFacts;
}
