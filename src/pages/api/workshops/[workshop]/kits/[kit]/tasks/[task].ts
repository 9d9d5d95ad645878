import { taskChanges } from "#src/server/plan-list-changes.ts";
import { route } from "#src/server/route.ts";
import { SeenVersion, TaskChange } from "#src/shapes/run-edit.ts";

/** Changes a task of the work. */
export const PATCH = route({
  may: "change-run",
  input: TaskChange,
  run: (given) => taskChanges.change(given, given.params.task ?? "", given.input),
});

/** Removes a task of the work and hands it back. */
export const DELETE = route({
  may: "change-run",
  query: SeenVersion,
  run: (given) => taskChanges.remove(given, given.params.task ?? "", given.query.version),
});
