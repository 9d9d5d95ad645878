import type { Db } from "#db/client.ts";
import { can } from "#src/access.ts";
import type { Role } from "#src/shapes/limits.ts";
import { today } from "./clock.ts";
import { type RateView, rates } from "./currency-rate-changes.ts";
import { requirePermission } from "./route.ts";
import { quotedCurrencies } from "./store/board-quote.ts";
import type { WorkshopRow } from "./store/membership.ts";
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
  };
}
