import { route } from "#src/server/route.ts";
import { setRunPlan } from "#src/server/run-changes.ts";
import { SaleChange } from "#src/shapes/run-edit.ts";

/** Changes tax, fees and postage of a sale; the version is the run plan's. */
export const PATCH = route({
  may: "change-price",
  input: SaleChange,
  run: (given) => setRunPlan(given, given.input),
});
