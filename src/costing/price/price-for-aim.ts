import { grainText, ONE } from "#src/costing/grains.ts";
import type { AimProblem, Need } from "#src/costing/problem.ts";
import { joinNeeds } from "#src/costing/run-needs.ts";
import { type Aim, type AimBasis, type AimCondition, aimCondition } from "./aims.ts";
import { MILLION } from "./charged.ts";
import { editionKit } from "./edition-kit.ts";
import { type EditionSale, type KitSold, kitSoldAt, type Scope } from "./edition-sale.ts";
import { type Fraction, fraction, minus, nearest, over, plus, times } from "./fraction.ts";
import { leastPrice, PRICE_END } from "./least-price.ts";
import type { PriceContext } from "./price-context.ts";
import { gridOf, type PriceEnding, type PriceGrid } from "./price-ending.ts";
import { kitsSold, othersBring } from "./run-sold.ts";
import { soldKit } from "./sold-kit.ts";

/** The least price that reaches an aim, or why there is none. Decimal text in the plan's currency. */
export type AimPrice =
  | { found: true; price: string; before: string | null }
  | { found: false; needs: Need[]; problem: AimProblem | null };

/**
 * The least price that reaches an aim (section 10), among prices with the ending: of an edition over
 * all its channels by share, its list price followed by those that have none of their own; or what one
 * channel asks, as though the edition were sold there alone. Other editions keep their prices. `before`
 * is the price below with the same ending, at which the aim fails; null where there is none below.
 *
 * Expected failures: what it needs, or a problem that names the field in the way.
 *
 * @example margin 30 %, ending .00 → { found: true, price: "34", before: "33" }
 */
export function priceForAim(
  context: PriceContext,
  scope: Scope,
  aim: Aim,
  ending: PriceEnding = "none",
): AimPrice {
  const basis = aimBasis(context, scope);
  const condition = aimCondition(aim, basis);
  const needs = joinNeeds(withoutPrice(basis), condition.needs);
  if (needs.length > 0) return { found: false, needs, problem: null };
  const grid = gridOf(ending, context.unit);
  if (grid === null) return failure({ code: "no-such-ending", field: "ending", at: scope });
  const found = leastPrice(searchFor(basis, condition, grid));
  if (found.found === "too-large") return failure({ code: "price-too-large", field: "aim", at: scope });
  if (found.found === "nothing-left") return failure(whyNothing(basis, condition, scope));
  const { price, before } = found;
  return { found: true, price: grainText(price), before: before === null ? null : grainText(before) };
}

/** What an aim in a scope rests on. */
export function aimBasis(context: PriceContext, scope: Scope): AimBasis {
  return {
    context,
    sold: soldKit(context, scope),
    kit: editionKit(context, scope.edition),
    others: othersBring(context, kitsSold(context), scope.edition),
  };
}

/** How far an aim is passed with a kit sold so; below nothing it is not reached. */
export function aimGap({ kept, net, enough }: AimCondition, sold: KitSold): Fraction {
  return minus(minus(times(kept, sold.kept), times(net, sold.net)), enough);
}

/** What a kit sold needs besides the price that is looked for. */
function withoutPrice({ context, sold }: AimBasis): Need[] {
  return soldKit(context, sold.sale.scope, 0n).needs.kept;
}

/**
 * The slack: an order differs from its unrounded self by at most half a unit of tax, half of the fee
 * and half a fee rate of what it is taken on, so by less than two units; a price that follows the list
 * by half a unit, which moves what is kept by no more than itself and its tax; per kit by no more, as
 * an order has at least one.
 */
function searchFor({ context, sold }: AimBasis, condition: AimCondition, grid: PriceGrid) {
  const at = (price: bigint, unit: bigint) => aimGap(condition, kitSoldAt(sold.sale, price, unit) as KitSold);
  const taxes = sold.sale.lines.reduce((sum, { prepared }) => sum + prepared.taxRate, 0n);
  const offKept = fraction((3n * MILLION + taxes) * context.unit, MILLION);
  return {
    grid,
    gap: (price: bigint) => at(price, context.unit),
    line: (price: bigint) => at(price, 1n),
    slack: plus(times(condition.kept, offKept), times(condition.net, fraction(context.unit))),
    whole: condition.kept,
  };
}

function failure(problem: AimProblem): AimPrice {
  return { found: false, needs: [], problem };
}

/** Which of the inputs stands in the way where a higher price leaves nothing. */
function whyNothing({ sold }: AimBasis, condition: AimCondition, at: Scope): AimProblem {
  const most = mostMargin(sold.sale);
  if (most === null) return { code: "price-fixed", field: "ownPrices", at };
  if (condition.net.top > 0n && most.top > 0n)
    return {
      code: "margin-too-high",
      field: "aim",
      at,
      most: grainText(nearest(times(most, fraction(ONE)))),
    };
  return { code: "nothing-kept", field: "feeRate", at };
}

/** Share of a higher price without tax that is kept: no margin can come up to it. Null: the price moves nothing. */
function mostMargin(sale: EditionSale): Fraction | null {
  const low = kitSoldAt(sale, 0n, 1n) as KitSold;
  const high = kitSoldAt(sale, PRICE_END, 1n) as KitSold;
  const net = minus(high.net, low.net);
  return net.top === 0n ? null : over(minus(high.kept, low.kept), net);
}
