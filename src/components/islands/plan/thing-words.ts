import { problemSentence } from "#src/costing/problem-words.ts";
import type { OpenThing } from "#src/costing/to-settle.ts";
import { isNeed } from "#src/costing/to-settle.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** All that is open about a thing, in sentences. */
export function thingWords({ problems }: OpenThing, plan: Plan): string {
  return problems.map((problem) => problemSentence(problem, plan)).join(" ");
}

/** How bad a thing is: figures wait for it, or for a choice that cannot be followed; or it is only doubtful. */
export function thingKind({ problems }: OpenThing): "bad" | "caution" {
  return problems.some(({ code }) => isNeed(code) || code === "pinned-offer-unusable") ? "bad" : "caution";
}
