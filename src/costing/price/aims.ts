import { grains, scaled } from "#src/costing/grains.ts";
import type { Need } from "#src/costing/problem.ts";
import { joinNeeds, need } from "#src/costing/run-needs.ts";
import { MILLION } from "./charged.ts";
import type { EditionKit } from "./edition-kit.ts";
import { needsIn } from "./edition-kit.ts";
import { type Fraction, fraction, minus, NOTHING, over, plus, times } from "./fraction.ts";
import type { PriceContext } from "./price-context.ts";
import type { SoldKit } from "./sold-kit.ts";

/** What a price is to do (section 10). Rates as decimals, money in the plan's currency, as text. */
export type Aim =
  /** No loss on the next kit of this edition. */
  | { aim: "next-kit" }
  /** Break-even of this run: every kit sells, and the run makes no loss. */
  | { aim: "run-even" }
  /** Profit ÷ price without tax. */
  | { aim: "margin"; rate: string }
  /** Profit ÷ cost of the kit. */
  | { aim: "mark-up"; rate: string }
  /** Profit of the run; after so much of it is taxed away, where a tax rate below 1 is given. */
  | { aim: "profit"; amount: string; taxRate: string | null }
  /** Earned per hour: what is left for the hours of making and selling, over them. */
  | { aim: "hour"; rate: string };
/** What an aim is called in code. */
export type AimName = Aim["aim"];

/** An aim as a condition on one kit: `kept × per kit kept − net × price without tax ≥ enough`. */
export interface AimCondition {
  kept: Fraction;
  net: Fraction;
  enough: Fraction;
  needs: Need[];
}

/** What an aim's condition is made from: the kit sold, what it costs, and what the other editions bring. */
export interface AimBasis {
  context: PriceContext;
  sold: SoldKit;
  kit: EditionKit;
  others: { brings: Fraction; needs: Need[] };
}

const ONCE = fraction(1n);

/**
 * The condition of an aim, exact.
 *
 * @example a margin of 20 % on a cost of 4290: kept − 0.2 × net ≥ 4290
 */
export function aimCondition(aim: Aim, basis: AimBasis): AimCondition {
  const { sold, kit } = basis;
  const { timeCost, needs } = sold;
  const cost = plus(kit.cost, timeCost);
  const perKit = { kept: ONCE, net: NOTHING, needs: joinNeeds(kit.needs.cost, needs.timeCost) };
  switch (aim.aim) {
    case "next-kit":
      return {
        ...perKit,
        enough: plus(kit.nextKit, timeCost),
        needs: joinNeeds(kit.needs.nextKit, needs.timeCost),
      };
    case "margin":
      return { ...perKit, net: rateOf(aim.rate), enough: cost };
    case "mark-up":
      return { ...perKit, enough: plus(cost, times(rateOf(aim.rate), kit.cost)) };
    case "hour":
      return hourCondition(aim.rate, basis);
    case "run-even":
      return runCondition(NOTHING, basis);
    case "profit":
      return runCondition(beforeTax(aim.amount, aim.taxRate), basis);
  }
}

/** `(kept − cost but own work) × 60 ≥ rate × minutes`, of one kit. */
function hourCondition(rate: string, { sold, kit }: AimBasis): AimCondition {
  const minutes = plus(kit.minutes, sold.minutes);
  const pay = times(minutes, fraction(scaled(rate, 6), 60n * MILLION));
  const idle = minutes.top === 0n ? [need("no-work", [{}])] : [];
  return {
    kept: ONCE,
    net: NOTHING,
    enough: plus(kit.withoutWork, pay),
    needs: joinNeeds(kit.needs.withoutWork, sold.needs.minutes, idle),
  };
}

/** The run's kits of this edition bring its cost and the profit, less what the other editions bring. */
function runCondition(profit: Fraction, { context, sold, kit, others }: AimBasis): AimCondition {
  const { used } = context.cost;
  const cost = fraction(used.known ? grains(used.value) : 0n);
  const kits = fraction(BigInt(kit.kits));
  const selling = times(kits, sold.timeCost);
  return {
    kept: kits,
    net: NOTHING,
    enough: minus(plus(plus(cost, selling), profit), others.brings),
    needs: joinNeeds(needsIn(used), kit.needs.cost, sold.needs.timeCost, others.needs),
  };
}

/**
 * Profit before tax that leaves so much after it (section 11): `after ÷ (1 − rate)`, exact, in grains.
 *
 * @example beforeTax("540000", "0.4") is 900 000
 */
export function beforeTax(amount: string, taxRate: string | null): Fraction {
  return over(fraction(grains(amount)), fraction(MILLION - scaled(taxRate ?? "0", 6), MILLION));
}

function rateOf(rate: string): Fraction {
  return fraction(scaled(rate, 6), MILLION);
}
