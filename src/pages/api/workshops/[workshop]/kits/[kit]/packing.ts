import { packingChanges } from "#src/server/plan-list-changes.ts";
import { route } from "#src/server/route.ts";
import { PackingEntry } from "#src/shapes/run-edit.ts";

/** Adds a packing item. */
export const POST = route({
  may: "change-run",
  input: PackingEntry,
  status: 201,
  run: (given) => packingChanges.add(given, given.input),
});
