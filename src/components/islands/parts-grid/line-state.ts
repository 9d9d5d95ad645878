import { daysBetween } from "#src/components/day-text.ts";
import type { PartLine } from "#src/costing/run-result.ts";
import type { LineView } from "#src/server/present.ts";
import type { Plan, PlanOffer, PlanPart } from "#src/shapes/plan.ts";

/** How a line stands: the word on its chip, and whether somebody must see to it. */
export interface LineState {
  kind: "plain" | "caution" | "neutral";
  word: string;
  toSettle: boolean;
}

/** A price older than this is worth asking for again. Common practice among small buyers, no source. */
export const PRICE_OLD_DAYS = 90;

const settle = (word: string): LineState => ({ kind: "caution", word, toSettle: true });
const note = (word: string): LineState => ({ kind: "neutral", word, toSettle: false });
const SETTLED: LineState = { kind: "plain", word: "Settled", toSettle: false };

/** What is wrong with a line whatever it costs: no quantity, or a designator that another line has too. */
export function listState(line: LineView, repeated: ReadonlySet<string>): LineState | null {
  if (line.part.name === "") return settle("Needs its part");
  const twice = line.designators.split(", ").find((name) => repeated.has(name));
  if (twice) return settle(`${twice} twice`);
  if (line.mark === "do-not-place") return note("Do not place");
  if (line.mark === "builders-own") return note("Builder’s own");
  if (Object.keys(line.quantities).length === 0) return settle("No quantity");
  return null;
}

function offersOrdered(part: PlanPart, bought: PartLine): PlanOffer[] {
  const ids = new Set(bought.orders.map(({ offer }) => offer));
  return part.offers.filter(({ id }) => ids.has(id));
}

function isOld(offer: PlanOffer, asOf: string): boolean {
  return offer.pricedOn !== null && daysBetween(offer.pricedOn, asOf) > PRICE_OLD_DAYS;
}

/** How the buying of a line's part stands in the run. */
export function buyingState(plan: Plan, part: PlanPart, bought: PartLine): LineState {
  if (bought.state === "unpriced") return settle("No price");
  if (bought.state === "short") return settle(`${bought.shortBy} short`);
  if (bought.state === "refused") return settle("Order too small");
  if (offersOrdered(part, bought).some((offer) => isOld(offer, plan.asOf))) return settle("Old price");
  return bought.state === "not-needed" ? note("Not in this run") : SETTLED;
}

/** A line of a list seen without money has nothing to settle but itself. */
export const IN_ORDER = SETTLED;
