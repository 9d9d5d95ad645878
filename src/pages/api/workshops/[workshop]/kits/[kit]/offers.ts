import { kitOffers } from "#src/server/offer-changes.ts";
import { route } from "#src/server/route.ts";

/** Every offer for a part of the kit's list. */
export const GET = route({ may: "see-money", run: kitOffers });
