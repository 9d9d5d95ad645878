import { chargeChanges } from "#src/server/plan-list-changes.ts";
import { route } from "#src/server/route.ts";
import { ChargeChange, SeenVersion } from "#src/shapes/run-edit.ts";

/** Changes a once-only charge. */
export const PATCH = route({
  may: "change-run",
  input: ChargeChange,
  run: (given) => chargeChanges.change(given, given.params.charge ?? "", given.input),
});

/** Removes a once-only charge and hands it back. */
export const DELETE = route({
  may: "change-run",
  query: SeenVersion,
  run: (given) => chargeChanges.remove(given, given.params.charge ?? "", given.query.version),
});
