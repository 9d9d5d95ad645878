import { packingChanges } from "#src/server/plan-list-changes.ts";
import { route } from "#src/server/route.ts";
import { PackingChange, SeenVersion } from "#src/shapes/run-edit.ts";

/** Changes a packing item. */
export const PATCH = route({
  may: "change-run",
  input: PackingChange,
  run: (given) => packingChanges.change(given, given.params.item ?? "", given.input),
});

/** Removes a packing item and hands it back. */
export const DELETE = route({
  may: "change-run",
  query: SeenVersion,
  run: (given) => packingChanges.remove(given, given.params.item ?? "", given.query.version),
});
