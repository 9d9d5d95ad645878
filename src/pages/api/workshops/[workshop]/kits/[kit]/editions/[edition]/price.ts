import { route } from "#src/server/route.ts";
import { setEdition } from "#src/server/run-changes.ts";
import { PriceChange } from "#src/shapes/run-edit.ts";

/** Sets what a buyer pays for one of this edition. */
export const PATCH = route({
  may: "change-price",
  input: PriceChange,
  run: (given) => setEdition(given, given.params.edition ?? "", given.input),
});
