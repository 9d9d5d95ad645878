import type { BoardShape, RailSides, Separation } from "#src/shapes/limits.ts";

/** Width and height in millimetres, decimal text; either may be the longer. */
export interface PanelSize {
  width: string;
  height: string;
}

/** A board as it lies on panels: its outline is taken for a rectangle, or a round one for an ellipse. */
export interface PanelBoard extends PanelSize {
  shape: BoardShape;
}

/** What a board house accepts; decimal text in millimetres. */
export interface PanelTerms {
  /** Largest outer size, rails included, either way round. */
  largest: PanelSize;
  /** Least outer size, either way round; null: none stated. */
  least: PanelSize | null;
  separation: Separation;
  /** Between boards and towards a rail: the router's width; 0 where boards are scored. */
  gap: string;
  /** Which sides of the largest panel carry a rail, and how wide it is. */
  rails: { sides: RailSides; width: string };
}
