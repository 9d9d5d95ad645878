import type { Plan } from "#src/shapes/plan.ts";
import { orderCautions } from "./order-cautions.ts";
import {
  type CautionCode,
  NEED_CODES,
  type NeedCode,
  type Place,
  type Problem,
  type SourcePage,
} from "./problem.ts";
import { need } from "./run-needs.ts";
import type { RunResult } from "./run-result.ts";

/** Cautions that wait for a person, by the page on which they are settled; the others are worth knowing. */
const SETTLED_ON: Partial<Record<CautionCode, SourcePage>> = {
  "offer-expired": "offers",
  "offer-stock-not-known": "offers",
  "pinned-offer-unusable": "offers",
  "price-old": "offers",
  "stock-short": "offers",
  "quote-expired": "boards",
  "pinned-quote-unusable": "boards",
};

/** A supplier that is left out was left out on purpose; what follows from it is said by itself. */
const ON_PURPOSE: readonly Problem["code"][] = ["supplier-shut-out"];

const PAGES: readonly SourcePage[] = ["parts", "offers", "boards", "run", "price"];

/** One thing somebody must see to, a part or a supplier for instance, with all that is open about it. */
export interface OpenThing {
  /** Its id; the code of what is open where it belongs to no thing. */
  key: string;
  page: SourcePage;
  at: Place;
  problems: Problem[];
}

/** Whether figures wait for it. */
export function isNeed(code: Problem["code"]): code is NeedCode {
  return (NEED_CODES as readonly string[]).includes(code);
}

/** The page on which a problem is settled; null: it is only worth knowing. */
function pageOf({ code }: Problem): SourcePage | null {
  return isNeed(code) ? need(code, []).page : (SETTLED_ON[code] ?? null);
}

function keyOf({ code, at }: Problem): string {
  return at.part ?? at.quote ?? at.supplier ?? at.channel ?? at.currency ?? code;
}

/**
 * Everything somebody must see to before a run is ordered, the one list behind every count and heading: a
 * part with two problems is one thing. In the order of the pages, then as the run names its problems.
 *
 * @example a part without a price and another whose offer has expired → two things on "offers"
 */
export function toSettle(plan: Plan, result: RunResult): OpenThing[] {
  const things = new Map<string, OpenThing>();
  for (const problem of [...result.problems, ...orderCautions(plan, result)]) {
    const page = pageOf(problem);
    if (page === null) continue;
    const key = keyOf(problem);
    const place = `${page} ${key}`;
    const thing = things.get(place) ?? { key, page, at: problem.at, problems: [] };
    thing.problems.push(problem);
    things.set(place, thing);
  }
  return PAGES.flatMap((page) => [...things.values()].filter((thing) => thing.page === page));
}

/** Problems of a run that nobody must see to. */
export function worthKnowing(result: RunResult): Problem[] {
  return result.problems.filter((problem) => pageOf(problem) === null && !ON_PURPOSE.includes(problem.code));
}
