import { divideUp } from "#src/costing/whole.ts";

/** Panels for a number of boards, the boards they hold, and how many are over. */
export interface PanelsNeeded {
  panels: number;
  boards: number;
  over: number;
}

/**
 * Panels that hold at least so many boards. `perPanel` is at least 1.
 *
 * @example panelsNeeded(113, 12) → 10 panels, 120 boards, 7 over
 */
export function panelsNeeded(toOrder: number, perPanel: number): PanelsNeeded {
  const panels = divideUp(toOrder, perPanel);
  return { panels, boards: panels * perPanel, over: panels * perPanel - toOrder };
}
