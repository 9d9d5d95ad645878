import { grains } from "#src/costing/grains.ts";
import { count, from, money, rate, type Sheet, type Step, step } from "#src/costing/working-lines.ts";
import type { WorkingAmount } from "#src/costing/working-tree.ts";
import { type Aim, type AimBasis, type AimCondition, aimCondition } from "./aims.ts";
import type { KitSold, Scope } from "./edition-sale.ts";
import { kitSoldAt } from "./edition-sale.ts";
import { type Fraction, nearest, times } from "./fraction.ts";
import type { PriceContext } from "./price-context.ts";
import type { PriceEnding } from "./price-ending.ts";
import { aimBasis, aimGap, priceForAim } from "./price-for-aim.ts";
import { enoughSteps } from "./working-enough.ts";

/** What each aim is called on paper. */
const AIM_TITLES: Record<Aim["aim"], string> = {
  "next-kit": "no loss on the next kit",
  "run-even": "break-even of this run",
  margin: "a margin",
  "mark-up": "a mark-up",
  profit: "a profit of the run",
  hour: "an hour's pay",
};

/**
 * How the least price for an aim comes about: what must be kept, and both sides of the price: the one
 * below with the same ending fails, this one does not. Null where no price was found; `priceForAim`
 * says why.
 */
export function aimSheet(context: PriceContext, scope: Scope, aim: Aim, ending: PriceEnding): Sheet | null {
  const found = priceForAim(context, scope, aim, ending);
  if (!found.found) return null;
  const basis = aimBasis(context, scope);
  const condition = aimCondition(aim, basis);
  const sides = found.before === null ? [found.price] : [found.before, found.price];
  const cash = (value: Fraction) => money(nearest(value), context.plan.currency);
  return {
    title: `Least price for ${AIM_TITLES[aim.aim]}`,
    steps: [
      ...enoughSteps(aim, basis, condition),
      ...sides.flatMap((price) => sideSteps(basis, aim, condition, price, cash)),
      step(null, "Least price", money(found.price, context.plan.currency), "10", { result: true }),
    ],
    notes: [
      "Tax and fees are rounded as they are charged, so what is kept goes up in uneven steps; every lower price was looked at.",
      ...(scope.channel === null ? [] : ["As though the edition were sold in this channel alone."]),
    ],
    basis: `In ${context.plan.currency}, after tax, fees and postage`,
  };
}

/** What a price keeps, against what must be kept. */
function sideSteps(
  { context, sold }: AimBasis,
  aim: Aim,
  condition: AimCondition,
  price: string,
  cash: (value: Fraction) => WorkingAmount,
): Step[] {
  const kit = kitSoldAt(sold.sale, grains(price), context.unit) as KitSold;
  const gap = aimGap(condition, kit);
  const kits = condition.kept;
  const share = times(condition.net, kit.net);
  const onMargin = aim.aim === "margin";
  return [
    ...(onMargin
      ? [
          step(null, `Price without tax at ${price}`, cash(kit.net), "10"),
          step("×" as const, "Margin", rate(aim.rate), "10"),
          step("=" as const, "Margin to be kept", cash(share), "10"),
        ]
      : []),
    step(null, `Kept of one kit at ${price}`, cash(kit.kept), "10"),
    ...(kits.top === kits.bottom
      ? []
      : [
          step("×" as const, "Kits in the run", count(kits.top.toString(), "kits"), "2", {
            source: from("run"),
          }),
        ]),
    step("−", "To be kept", cash(condition.enough), "10"),
    ...(onMargin ? [step("−" as const, "Margin to be kept", cash(share), "10")] : []),
    step("=", gap.top < 0n ? "Not enough" : "Enough", cash(gap), "10"),
  ];
}
