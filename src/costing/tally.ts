import type { Plan } from "#src/shapes/plan.ts";
import { costRun } from "./cost-run.ts";
import type { Figure } from "./figure.ts";
import { figurePer } from "./figure-of.ts";
import { grains } from "./grains.ts";
import { need } from "./run-needs.ts";
import type { RunResult } from "./run-result.ts";

/** The six figures of the strip. Money in the plan's currency; `evenAfter` is a count of kits. */
export interface Tally {
  currency: string;
  run: number;
  /** Used cost per kit. */
  costPerKit: Figure;
  /** The price; with several editions the mean over the kits of the run. */
  price: Figure;
  earnsPerKit: Figure;
  evenAfter: Figure;
  /** The spent view: all the money the run needs. */
  cashNeeded: Figure;
}

/**
 * The headline figures of a run (sections 8, 10, 11), each with what it needs while it is not known.
 * `kits` as in `costRun`.
 *
 * @example tally(plan, 120).evenAfter → { known: true, value: "72" }
 */
export function tally(plan: Plan, kits: number = plan.run.kits): Tally {
  return tallyOf(costRun(plan, kits));
}

/** The same figures from a result already at hand. */
export function tallyOf(result: RunResult): Tally {
  return {
    currency: result.currency,
    run: result.kits,
    costPerKit: result.perKit.used,
    price: meanPrice(result),
    earnsPerKit: result.earnsPerKit,
    evenAfter: result.evenAfter,
    cashNeeded: result.spent,
  };
}

/** `Σ kits of the edition × its price ÷ kits`, to the nearest grain. */
function meanPrice({ editions, kits }: RunResult): Figure {
  const sold = editions.filter((edition) => edition.kits > 0);
  const unpriced = sold.filter(({ price }) => price === null).map(({ id }) => ({ edition: id }));
  if (unpriced.length > 0) return { known: false, needs: [need("no-price", unpriced)], without: null };
  if (sold.length === 0) {
    return {
      known: false,
      needs: [
        need(
          "no-mix",
          editions.map(({ id }) => ({ edition: id })),
        ),
      ],
      without: null,
    };
  }
  const total = sold.reduce((sum, edition) => sum + grains(edition.price ?? "0") * BigInt(edition.kits), 0n);
  return figurePer(total, kits, []);
}
