import type { Need } from "#src/costing/problem.ts";
import { joinNeeds } from "#src/costing/run-needs.ts";
import type { Scope } from "./edition-sale.ts";
import { type Fraction, fraction, NOTHING, plus, times } from "./fraction.ts";
import type { PriceContext } from "./price-context.ts";
import type { SaleContext } from "./sale-context.ts";
import { type SoldKit, soldKit } from "./sold-kit.ts";
import { type Takings, takingsOf } from "./takings.ts";

/** A price tried in place of the plan's. */
export interface Tried {
  scope: Scope;
  price: bigint | null;
}

/** One kit of every edition sold over its channels, in the plan's order; `tried` takes its edition's place. */
export function kitsSold(context: SaleContext, tried: Tried | null = null): SoldKit[] {
  return context.plan.editions.map(({ id }) =>
    tried?.scope.edition === id
      ? soldKit(context, tried.scope, tried.price)
      : soldKit(context, { edition: id, channel: null }),
  );
}

/**
 * What one kit of each edition brings, ready to be added up over any number of kits: kept less the time
 * to sell it.
 */
export function bringsPerKit(kits: readonly SoldKit[]): Takings {
  return takingsOf(kits.map((kit) => (kit.needs.brings.length > 0 ? null : kit.brings)));
}

/** What the run brings if every kit sells, leaving one edition out; with what it needs. */
export function othersBring(
  context: PriceContext,
  kits: readonly SoldKit[],
  without: string,
): { brings: Fraction; needs: Need[] } {
  const others = context.cost.editions.flatMap(({ id, kits: count }, index) => {
    const kit = kits[index];
    return id === without || count === 0 || kit === undefined ? [] : [{ kit, count }];
  });
  return {
    brings: others.reduce(
      (sum, { kit, count }) => plus(sum, times(kit.brings, fraction(BigInt(count)))),
      NOTHING,
    ),
    needs: joinNeeds(...others.map(({ kit }) => kit.needs.brings)),
  };
}
