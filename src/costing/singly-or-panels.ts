import type { Plan } from "#src/shapes/plan.ts";
import { needOf } from "./need.ts";
import { comparePieces, type PanelsPay } from "./panels/compare-pieces.ts";
import { preparePlan } from "./prepare-plan.ts";
import { splitKits } from "./split-kits.ts";

/**
 * From which run on panels cost less than single boards (section 6), for runs of 1 to `to` kits, whatever quote is
 * chosen: the cheapest of each way, landed. `null` where one way has no quote that can be reckoned.
 *
 * @example singly 9 + 2.40 a board, panels of 12 at 39 + 21.20 each, to 60 kits → first 48, then 58 to 60
 */
export function singlyOrPanels(plan: Plan, to: number): PanelsPay | null {
  const prepared = preparePlan({ ...plan, parts: [] }, to);
  const usable = prepared.quotes.filter(({ standing }) => standing === "usable");
  const required = Array.from({ length: to }, (_, place) =>
    plan.boards.needed ? needOf(splitKits(place + 1, prepared.weights), prepared.boardsPerKit) : 0,
  );
  return comparePieces(
    usable.filter(({ quote }) => quote.boardsPerPiece === 1),
    usable.filter(({ quote }) => quote.boardsPerPiece > 1),
    { required, yield: plan.boards.yield, confidence: plan.boards.confidence },
  );
}
