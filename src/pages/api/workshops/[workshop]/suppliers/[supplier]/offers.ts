import { supplierOffers } from "#src/server/offer-changes.ts";
import { route } from "#src/server/route.ts";

/** Every offer of a supplier. */
export const GET = route({
  may: "see-money",
  run: (given) => supplierOffers(given, given.params.supplier ?? ""),
});
