import { route } from "#src/server/route.ts";
import { takePriceImport } from "#src/server/take-price-import.ts";
import { TakeList } from "#src/shapes/import.ts";

/** Brings the prices in: all of them in one step, or none. */
export const POST = route({
  may: "change-supply",
  input: TakeList,
  run: (given) => takePriceImport(given, given.params.import ?? "", given.input),
});
