import { isOldPrice } from "#src/costing/order-cautions.ts";
import type { PartLine } from "#src/costing/run-result.ts";
import type { LineFault } from "#src/partslist/line-faults.ts";
import type { LineView } from "#src/server/present.ts";
import type { Plan, PlanOffer, PlanPart } from "#src/shapes/plan.ts";

/** How a line stands: the word on its chip, and whether somebody must see to it. */
export interface LineState {
  kind: "plain" | "caution" | "neutral";
  word: string;
  toSettle: boolean;
}

const settle = (word: string): LineState => ({ kind: "caution", word, toSettle: true });
const note = (word: string): LineState => ({ kind: "neutral", word, toSettle: false });
const SETTLED: LineState = { kind: "plain", word: "Settled", toSettle: false };

/** What is to settle about the line itself, or how its mark keeps it from being bought; `null`: nothing. */
export function listState(line: LineView, fault: LineFault | undefined): LineState | null {
  if (fault?.kind === "twice") return settle(`${fault.designator} twice`);
  if (fault?.kind === "no-quantity") return settle("No quantity");
  if (fault?.kind === "at-odds") return settle(`${fault.named} named`);
  if (line.mark === "do-not-place") return note("Do not place");
  return line.mark === "builders-own" ? note("Builder’s own") : null;
}

function offersOrdered(part: PlanPart, bought: PartLine): PlanOffer[] {
  const ids = new Set(bought.orders.map(({ offer }) => offer));
  return part.offers.filter(({ id }) => ids.has(id));
}

/** How the buying of a line's part stands in the run. */
export function buyingState(plan: Plan, part: PlanPart, bought: PartLine): LineState {
  if (bought.state === "unpriced") return settle("No price");
  if (bought.state === "short") return settle(`${bought.shortBy} short`);
  if (bought.state === "refused") return settle("Order too small");
  if (offersOrdered(part, bought).some((offer) => isOldPrice(offer, plan.asOf))) return settle("Old price");
  return bought.state === "not-needed" ? note("Not in this run") : SETTLED;
}

/** A line of a list seen without money has nothing to settle but itself. */
export const IN_ORDER = SETTLED;
