import { kitOffers } from "#src/server/kit-offers.ts";
import { route } from "#src/server/route.ts";

/** The parts the kit buys and every offer for them. */
export const GET = route({ may: "see-money", run: kitOffers });
