import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import { usePlan } from "#src/components/islands/plan/use-plan.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { KitOffers } from "#src/server/kit-offers.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { useKitOffers } from "./offers-store.ts";

/** What every page about a kit's offers is handed by the server. */
export interface KitSupplyProps {
  address: KitAddress;
  plan: KitPlan;
  offers: KitOffers;
  today: string;
  /** May change offers and suppliers. */
  canChange: boolean;
  /** May choose among them for the run. */
  canChoose: boolean;
}

/** A kit's offers with the run that is reckoned from them, as they stand on this screen. */
export interface KitSupply extends KitOffers {
  plan: Plan;
  run: RunResult;
  supplier: (id: string) => SupplierView | undefined;
  /** "Lumenhof"; a supplier that is gone is "nobody". */
  nameOf: (supplier: string) => string;
  /** One unit of a currency in what the run is reckoned in; null: no rate. */
  rateOf: (currency: string) => string | null;
  partHref: (part: string) => string;
  supplierHref: (supplier: string) => string;
}

/** Keeps a page's offers and figures current. */
export function useKitSupply({ address, plan: first, offers: firstOffers }: KitSupplyProps): KitSupply {
  const { held } = usePlan(address);
  const offers = useKitOffers(address, firstOffers);
  const { plan } = held ?? first;
  const supplier = (id: string) => offers.suppliers.find((one) => one.id === id);
  return {
    ...offers,
    plan,
    run: runOf(plan),
    supplier,
    nameOf: (id) => supplier(id)?.name ?? "nobody",
    rateOf: (code) =>
      code === plan.currency
        ? "1"
        : (plan.rates.find(({ currency }) => currency === code)?.perForeignUnit ?? null),
    partHref: (part) => kitPath(address, `/offers/${part}`),
    supplierHref: (id) => `/workshops/${address.workshop}/suppliers/${id}`,
  };
}
