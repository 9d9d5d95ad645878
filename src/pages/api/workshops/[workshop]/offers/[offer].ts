import { changeOffer, removeOffer } from "#src/server/offer-changes.ts";
import { route } from "#src/server/route.ts";
import { RemovalQuery } from "#src/shapes/field.ts";
import { OfferChange } from "#src/shapes/offer.ts";

/** Changes an offer; its ladder is replaced as a whole. */
export const PATCH = route({
  may: "change-supply",
  input: OfferChange,
  run: (given) => changeOffer(given, given.params.offer ?? "", given.input),
});

/** Removes an offer. */
export const DELETE = route({
  may: "change-supply",
  query: RemovalQuery,
  run: (given) => removeOffer(given, given.params.offer ?? "", given.query.version),
});
