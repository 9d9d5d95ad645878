import { route } from "#src/server/route.ts";
import { takeBackPriceImport } from "#src/server/take-price-import.ts";
import { TakeBack } from "#src/shapes/import.ts";

/** Takes a price list back that was brought in last. */
export const POST = route({
  may: "change-supply",
  input: TakeBack,
  run: (given) => takeBackPriceImport(given, given.params.import ?? "", given.input),
});
