import type { KitAddress } from "#src/components/islands/kit-address.ts";
import type { PriceContext } from "#src/costing/price/price-context.ts";
import type { PlanEdition } from "#src/shapes/plan.ts";

/** What the parts of the price page are handed. */
export interface PriceProps {
  address: KitAddress;
  context: PriceContext;
  edition: PlanEdition;
  mayChange: boolean;
}
