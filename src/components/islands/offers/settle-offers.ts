import { thingKind } from "#src/components/islands/plan/thing-words.ts";
import type { Problem } from "#src/costing/problem.ts";
import type { PartLine } from "#src/costing/run-result.ts";
import { type OpenThing, toSettle, worthKnowing } from "#src/costing/to-settle.ts";
import type { KitSupply } from "./kit-supply.ts";

/** Everything to settle about a kit's offers, the worst first: the same list as the trail counts. */
export function offerThings({ plan, run }: Pick<KitSupply, "plan" | "run">): OpenThing[] {
  const things = toSettle(plan, run).filter(({ page }) => page === "offers");
  return [
    ...things.filter((thing) => thingKind(thing) === "bad"),
    ...things.filter((thing) => thingKind(thing) === "caution"),
  ];
}

/** What is worth knowing about a kit's offers and suppliers, and waits for nobody. */
export function offerNotes({ run }: Pick<KitSupply, "run">): Problem[] {
  return worthKnowing(run).filter(({ at }) => at.part || at.supplier);
}

/** Lines that one supplier alone can deliver now. */
export function singleSourced({ run }: Pick<KitSupply, "run">): PartLine[] {
  return run.parts.filter(({ state, considered }) => {
    const usable = considered.filter(({ standing }) => standing === "usable");
    return state === "settled" && new Set(usable.map(({ supplier }) => supplier)).size === 1;
  });
}
