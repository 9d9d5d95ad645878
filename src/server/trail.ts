import { can } from "#src/access.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { OpenThing } from "#src/costing/to-settle.ts";
import type { Role } from "#src/shapes/limits.ts";
import type { Plan } from "#src/shapes/plan.ts";

export type StopKey = "parts" | "offers" | "boards" | "run" | "price";

/** How far a stop is: a count of what is open, or nothing left, or not begun. */
export type StopState = { kind: "done" } | { kind: "to-settle"; count: number } | { kind: "not-started" };

/** Where a kit stands at one stop of the job. */
export interface KitStop {
  key: StopKey;
  name: string;
  state: StopState;
}

/** What a kit's stops are judged by. */
export interface KitState {
  plan: Plan;
  result: RunResult;
  /** What somebody must see to about the run. */
  open: OpenThing[];
  /** Lines that somebody must see to, whatever they cost: without a quantity, named twice, at odds. */
  linesToSettle: number;
}

function settled(count: number): StopState {
  return count > 0 ? { kind: "to-settle", count } : { kind: "done" };
}

function stateOf(stop: StopKey, { plan, open, linesToSettle }: KitState): StopState {
  const { lines } = plan;
  const begun: Record<StopKey, boolean> = {
    parts: lines > 0,
    offers: plan.parts.some(({ offers }) => offers.length > 0),
    boards: plan.boards.quotes.length > 0 || (!plan.boards.needed && lines > 0),
    run: lines > 0 && plan.parts.length > 0,
    price: lines > 0,
  };
  if (!begun[stop]) return { kind: "not-started" };
  const count = open.filter(({ page }) => page === stop).length;
  return settled(count + (stop === "parts" ? linesToSettle : 0));
}

/** What waits for a person, in the order of the stops; nothing for a kit that is not begun. */
export function waitingThings({ open, plan }: KitState): OpenThing[] {
  return plan.lines === 0 ? [] : open;
}

const NAMES: Record<StopKey, string> = {
  parts: "Parts",
  offers: "Offers",
  boards: "Boards",
  run: "Run",
  price: "Price",
};

const WITH_MONEY: readonly StopKey[] = ["parts", "offers", "boards", "run", "price"];

/** The stops of the job so far, in order, each with its state; a role without money has only the parts. */
export function kitStops(role: Role, state: KitState): KitStop[] {
  const keys: readonly StopKey[] = can(role, "see-money") ? WITH_MONEY : ["parts"];
  return keys.map((key) => ({ key, name: NAMES[key], state: stateOf(key, state) }));
}
