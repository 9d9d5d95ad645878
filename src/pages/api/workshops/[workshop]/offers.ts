import { changeOffers } from "#src/server/offer-changes.ts";
import { route } from "#src/server/route.ts";
import { PLAN_BYTES } from "#src/shapes/limits.ts";
import { OfferBatch } from "#src/shapes/offer.ts";

/** Changes, adds and removes many offers at once, such as a pasted block: all of it, or nothing. */
export const POST = route({
  may: "change-supply",
  input: OfferBatch,
  limit: PLAN_BYTES,
  run: (given) => changeOffers(given, given.input),
});
