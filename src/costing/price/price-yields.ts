import type { Figure } from "#src/costing/figure.ts";
import { wholeFigure } from "#src/costing/figure-of.ts";
import { grains, grainText, ONE } from "#src/costing/grains.ts";
import type { Need } from "#src/costing/problem.ts";
import { joinNeeds, need } from "#src/costing/run-needs.ts";
import { type AimBasis, aimCondition } from "./aims.ts";
import { type EditionKit, editionKit } from "./edition-kit.ts";
import type { Scope } from "./edition-sale.ts";
import { evenAfterAt } from "./even-after-at.ts";
import { type Fraction, fraction, minus, nearest, over, plus, times } from "./fraction.ts";
import type { PriceContext } from "./price-context.ts";
import { aimBasis, aimGap } from "./price-for-aim.ts";
import { priceNow, type SoldKit, soldKit } from "./sold-kit.ts";

/** What a price yields for every aim (section 10). Money in the plan's currency, exact to the grain. */
export interface PriceYields {
  price: string | null;
  /** Price without tax, over the channels by share. */
  net: Figure;
  kept: Figure;
  cost: Figure;
  /** Own time to sell a kit, at the plan's rate. */
  timeCost: Figure;
  /** `kept − timeCost`, to the last digit. */
  brings: Figure;
  /** `kept − cost − timeCost`, to the last digit. */
  left: Figure;
  /** Left ÷ price without tax, and ÷ cost. */
  margin: Figure;
  markUp: Figure;
  /** Left of the next kit of this edition. */
  nextKit: Figure;
  /** Of the whole run, every kit sold. */
  profit: Figure;
  /** Making and selling one kit. */
  minutes: Figure;
  perHour: Figure;
  /** How many of the run must sell for no loss, by the mix. */
  evenAfter: Figure;
}

/**
 * What a price yields: the reverse of `priceForAim`, in the same scope; the plan's own price where it
 * is left out, decimal text.
 *
 * @example yieldsAt(context, { edition: "full", channel: null }, "34.00").left → { known: true, value: "10.24…" }
 */
export function yieldsAt(context: PriceContext, scope: Scope, price?: string): PriceYields {
  const asked = price === undefined ? priceNow(context, scope) : grains(price);
  const basis = { ...aimBasis(context, scope), sold: soldKit(context, scope, asked) };
  const { sold, kit } = basis;
  const parts = keptParts(sold, kit);
  return {
    price: asked === null ? null : grainText(asked),
    ...parts.figures,
    ...ratios(basis, parts.needs),
    ...timeFigures(basis),
    nextKit: passedBy(basis, { aim: "next-kit" }),
    profit: passedBy(basis, { aim: "run-even" }),
    evenAfter: evenAfterAt(context, { scope, price: asked }),
  };
}

/** The parts of what is left, each to the nearest grain, so that they add up as shown. */
function keptParts(sold: SoldKit, kit: EditionKit) {
  const [kept, cost, timeCost] = [nearest(sold.kept), nearest(kit.cost), nearest(sold.timeCost)];
  const needs = joinNeeds(sold.needs.brings, kit.needs.cost);
  const figures = {
    net: wholeFigure(nearest(sold.net), sold.needs.kept),
    kept: wholeFigure(kept, sold.needs.kept),
    cost: wholeFigure(cost, kit.needs.cost),
    timeCost: wholeFigure(timeCost, sold.needs.timeCost),
    brings: wholeFigure(kept - timeCost, sold.needs.brings),
    left: wholeFigure(kept - cost - timeCost, needs),
  };
  return { figures, needs };
}

function ratios({ sold, kit }: AimBasis, needs: Need[]) {
  const left = minus(sold.brings, kit.cost);
  const { edition } = sold.sale.scope;
  return {
    margin: shareOf(left, sold.net, needs, need("no-price", [{ edition }])),
    markUp: shareOf(left, kit.cost, needs, need("costs-nothing", [{ edition }])),
  };
}

function shareOf(part: Fraction, whole: Fraction, needs: Need[], nothing: Need): Figure {
  if (needs.length > 0) return wholeFigure(null, needs);
  if (whole.top <= 0n) return wholeFigure(null, [nothing]);
  return wholeFigure(nearest(times(over(part, whole), fraction(ONE))), []);
}

/** By how much an aim without a figure of its own is passed: the run's profit, what the next kit leaves. */
function passedBy(basis: AimBasis, aim: { aim: "next-kit" | "run-even" }): Figure {
  const condition = aimCondition(aim, basis);
  const needs = joinNeeds(basis.sold.needs.kept, condition.needs);
  return wholeFigure(nearest(aimGap(condition, basis.sold)), needs);
}

/** Hours and what each earns (section 7): `(kept − all costs but own work) × 60 ÷ minutes`. */
function timeFigures({ sold, kit }: AimBasis) {
  const minutes = plus(kit.minutes, sold.minutes);
  const pay = times(minus(sold.kept, kit.withoutWork), fraction(60n * ONE));
  const needs = joinNeeds(sold.needs.kept, kit.needs.withoutWork, sold.needs.minutes);
  const idle = minutes.top === 0n;
  return {
    minutes: wholeFigure(nearest(minutes), joinNeeds(kit.needs.cost.filter(isAbsent), sold.needs.minutes)),
    perHour: wholeFigure(
      idle ? null : nearest(over(pay, minutes)),
      idle ? joinNeeds(needs, [need("no-work", [{}])]) : needs,
    ),
  };
}

function isAbsent({ code }: Need): boolean {
  return code === "not-in-run";
}

/** Left per kit alone, for a strip of many prices. */
export function leftAt(context: PriceContext, scope: Scope, price: bigint): Figure {
  return keptParts(soldKit(context, scope, price), editionKit(context, scope.edition)).figures.left;
}
