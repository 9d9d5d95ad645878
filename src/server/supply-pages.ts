import type { Db } from "#db/client.ts";
import { can } from "#src/access.ts";
import type { Role } from "#src/shapes/limits.ts";
import { boards } from "./board-changes.ts";
import { today } from "./clock.ts";
import { config } from "./config.ts";
import { type RateView, rates } from "./currency-rate-changes.ts";
import { kitOffers, type OfferPart } from "./kit-offers.ts";
import { kitPlan } from "./kit-plan.ts";
import { supplierOffers } from "./offer-changes.ts";
import { Problem } from "./problem.ts";
import { requirePermission } from "./route.ts";
import { quotedCurrencies } from "./store/board-quote.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { partsOf } from "./store/part.ts";
import { type SupplierView, suppliers } from "./supplier-changes.ts";

/** Whose page it is. */
interface Asking {
  db: Db;
  workshop: WorkshopRow;
  role: Role;
}

export interface SuppliersPage {
  workshop: string;
  reporting: string;
  suppliers: SupplierView[];
  rates: RateView[];
  quoted: string[];
  today: string;
  canChange: boolean;
  canFetchRates: boolean;
}

/** All that the page of suppliers shows. */
export function suppliersPage({ db, workshop, role }: Asking): SuppliersPage {
  requirePermission(role, "see-money");
  return {
    workshop: workshop.id,
    reporting: workshop.currency,
    suppliers: suppliers({ db, workshop }),
    rates: rates({ db, workshop }),
    quoted: quotedCurrencies(db, workshop.id),
    today: today(),
    canChange: can(role, "change-supply"),
    canFetchRates: config().ratesUrl !== null,
  };
}

/** All that the pages about a kit's offers show. */
export function kitSupplyPage({ db, workshop, role, kit }: Asking & { kit: KitRow }) {
  requirePermission(role, "see-money");
  const day = today();
  return {
    address: { workshop: workshop.id, kit: kit.id },
    plan: kitPlan(db, workshop, kit, day),
    offers: kitOffers({ db, workshop, kit }),
    today: day,
    canChange: can(role, "change-supply"),
    canChoose: can(role, "change-run"),
  };
}

/** The same for one part of the list; a part that the kit does not buy is not found. */
export function partOffersPage(asking: Asking & { kit: KitRow }, part: string) {
  const page = kitSupplyPage(asking);
  const found = page.offers.parts.find(({ id }) => id === part);
  if (!found) throw new Problem("not-found");
  return { page: { ...page, part }, name: found.name };
}

/** All that the page about a kit's boards shows. */
export function boardsPage({ db, workshop, role, kit }: Asking & { kit: KitRow }) {
  requirePermission(role, "see-money");
  const day = today();
  return {
    address: { workshop: workshop.id, kit: kit.id },
    plan: kitPlan(db, workshop, kit, day),
    boards: boards({ db, workshop, kit }),
    width: kit.boardWidth,
    height: kit.boardShape === "round" ? kit.boardWidth : kit.boardHeight,
    today: day,
    canChange: can(role, "change-supply"),
    canChoose: can(role, "change-run"),
  };
}

/** All that the page of one supplier shows. */
export function supplierPage({ db, workshop, role }: Asking, supplier: string) {
  requirePermission(role, "see-money");
  const offers = supplierOffers({ db, workshop }, supplier);
  const offered = new Set(offers.map(({ partId }) => partId));
  return {
    workshop: workshop.id,
    supplier,
    suppliers: suppliers({ db, workshop }),
    parts: partsOf(db, workshop.id)
      .filter(({ id }) => offered.has(id))
      .map(
        ({ id, name, spec, class: partClass, value }): OfferPart => ({
          ...{ id, name, spec, class: partClass, value },
          lines: [],
          designators: "",
          choiceVersion: 0,
        }),
      ),
    offers,
    canChange: can(role, "change-supply"),
  };
}
