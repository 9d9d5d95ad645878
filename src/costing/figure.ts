import type { Need } from "./problem.ts";

/**
 * A figure of the reckoning: known exactly, or not known with every reason. Missing never counts as
 * zero (section 1.5). Money is decimal text in the plan's currency; nothing is rounded for display.
 *
 * `without` is the partial total: what can be reckoned leaving the needs out. Show it only with
 * its label ("without 3 unpriced lines"); it is null where leaving things out makes no sense.
 */
export type Figure = KnownFigure | UnknownFigure;

export interface KnownFigure {
  known: true;
  value: string;
}

export interface UnknownFigure {
  known: false;
  needs: Need[];
  without: string | null;
}
