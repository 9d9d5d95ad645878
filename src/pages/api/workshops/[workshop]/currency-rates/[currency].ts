import { removeRate, setRate } from "#src/server/currency-rate-changes.ts";
import { route } from "#src/server/route.ts";
import { CurrencyRateInput, RateRemoval } from "#src/shapes/currency-rate.ts";

/** Sets the rate of a day by hand. */
export const PUT = route({
  may: "change-supply",
  input: CurrencyRateInput,
  run: (given) => setRate(given, given.params.currency ?? "", given.input),
});

/** Removes the rate of a day. */
export const DELETE = route({
  may: "change-supply",
  query: RateRemoval,
  run: (given) => removeRate(given, given.params.currency ?? "", given.query),
});
