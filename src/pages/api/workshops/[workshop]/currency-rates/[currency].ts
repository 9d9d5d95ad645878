import { removeRate, setRate } from "#src/server/currency-rate-changes.ts";
import { route } from "#src/server/route.ts";
import { CurrencyRateInput } from "#src/shapes/currency-rate.ts";
import { RemovalQuery } from "#src/shapes/field.ts";

/** Sets a rate by hand, with its day. */
export const PUT = route({
  may: "change-supply",
  input: CurrencyRateInput,
  run: (given) => setRate(given, given.params.currency ?? "", given.input),
});

/** Removes a rate. */
export const DELETE = route({
  may: "change-supply",
  query: RemovalQuery,
  run: (given) => removeRate(given, given.params.currency ?? "", given.query.version),
});
