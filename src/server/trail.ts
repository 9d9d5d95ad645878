import { can } from "#src/access.ts";
import { type CAUTION_CODES, NEED_CODES, type NeedCode, type Problem } from "#src/costing/problem.ts";
import { need } from "#src/costing/run-needs.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { Role } from "#src/shapes/limits.ts";
import type { Plan } from "#src/shapes/plan.ts";

export type StopKey = "parts" | "offers" | "boards" | "run";

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
  /** Lines that somebody must see to, whatever they cost: without a quantity, named twice, at odds. */
  linesToSettle: number;
  lines: number;
}

/** Cautions that wait for a person; the others only say what the reckoning did. */
const TO_SETTLE: readonly (typeof CAUTION_CODES)[number][] = [
  "offer-expired",
  "pinned-offer-unusable",
  "quote-expired",
  "pinned-quote-unusable",
];

function isNeed(code: Problem["code"]): code is NeedCode {
  return (NEED_CODES as readonly string[]).includes(code);
}

/** The stop on which a problem is settled; prices stand on the run page. */
function stopOf({ code, at }: Problem): StopKey | null {
  if (isNeed(code)) {
    const { page } = need(code, []);
    return page === "price" ? "run" : page;
  }
  if (!TO_SETTLE.includes(code)) return null;
  return at.quote ? "boards" : "offers";
}

/** Things to settle at a stop: a part with two problems is one thing. */
function countAt(stop: StopKey, problems: readonly Problem[]): number {
  const things = problems
    .filter((problem) => stopOf(problem) === stop)
    .map(({ code, at }) => at.part ?? at.quote ?? at.supplier ?? at.currency ?? code);
  return new Set(things).size;
}

function settled(count: number): StopState {
  return count > 0 ? { kind: "to-settle", count } : { kind: "done" };
}

function stateOf(stop: StopKey, { plan, result, lines, linesToSettle }: KitState): StopState {
  const begun: Record<StopKey, boolean> = {
    parts: lines > 0,
    offers: plan.parts.some(({ offers }) => offers.length > 0),
    boards: plan.boards.quotes.length > 0 || (!plan.boards.needed && lines > 0),
    run: lines > 0 && plan.parts.length > 0,
  };
  if (!begun[stop]) return { kind: "not-started" };
  return settled(countAt(stop, result.problems) + (stop === "parts" ? linesToSettle : 0));
}

/** What waits for a person, in the order of the stops; nothing for a kit that is not begun. */
export function waitingProblems({ result, lines }: KitState): Problem[] {
  if (lines === 0) return [];
  const order: readonly StopKey[] = ["parts", "offers", "boards", "run"];
  return order.flatMap((stop) => result.problems.filter((problem) => stopOf(problem) === stop));
}

const NAMES: Record<StopKey, string> = { parts: "Parts", offers: "Offers", boards: "Boards", run: "Run" };

/** The stops of the job so far, in order, each with its state; a role without money has only the parts. */
export function kitStops(role: Role, state: KitState): KitStop[] {
  const keys: StopKey[] = can(role, "see-money") ? ["parts", "offers", "boards", "run"] : ["parts"];
  return keys.map((key) => ({ key, name: NAMES[key], state: stateOf(key, state) }));
}
