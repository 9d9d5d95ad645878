import { route } from "#src/server/route.ts";
import { setHourRate } from "#src/server/run-changes.ts";
import { HourRateChange } from "#src/shapes/run-edit.ts";

/** Sets what an hour's own work costs, for every kit of the workshop. */
export const PATCH = route({
  may: "change-run",
  input: HourRateChange,
  run: (given) => setHourRate(given, given.input),
});
