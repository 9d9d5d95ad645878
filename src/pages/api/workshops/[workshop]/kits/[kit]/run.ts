import { route } from "#src/server/route.ts";
import { setRunPlan } from "#src/server/run-changes.ts";
import { RunChange } from "#src/shapes/run-edit.ts";

/** Changes run size, spares, yield, learning, replacements. */
export const PATCH = route({
  may: "change-run",
  input: RunChange,
  run: (given) => setRunPlan(given, given.input),
});
