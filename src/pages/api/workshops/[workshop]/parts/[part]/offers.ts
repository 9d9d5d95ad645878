import { addOffer, partOffers } from "#src/server/offer-changes.ts";
import { route } from "#src/server/route.ts";
import { NewOffer } from "#src/shapes/offer.ts";

/** Every offer for a part. */
export const GET = route({
  may: "see-money",
  run: (given) => partOffers(given, given.params.part ?? ""),
});

/** Adds an offer for a part. */
export const POST = route({
  may: "change-supply",
  input: NewOffer,
  status: 201,
  run: (given) => addOffer(given, given.params.part ?? "", given.input),
});
