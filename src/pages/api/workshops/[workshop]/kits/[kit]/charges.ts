import { chargeChanges } from "#src/server/plan-list-changes.ts";
import { route } from "#src/server/route.ts";
import { ChargeEntry } from "#src/shapes/run-edit.ts";

/** Adds a once-only charge. */
export const POST = route({
  may: "change-run",
  input: ChargeEntry,
  status: 201,
  run: (given) => chargeChanges.add(given, given.input),
});
