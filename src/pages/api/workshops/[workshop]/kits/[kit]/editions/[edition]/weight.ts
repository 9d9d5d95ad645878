import { route } from "#src/server/route.ts";
import { setEdition } from "#src/server/run-changes.ts";
import { WeightChange } from "#src/shapes/run-edit.ts";

/** Sets this edition's share of the run. */
export const PATCH = route({
  may: "change-run",
  input: WeightChange,
  run: (given) => setEdition(given, given.params.edition ?? "", given.input),
});
