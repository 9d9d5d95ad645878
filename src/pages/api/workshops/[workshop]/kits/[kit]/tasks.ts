import { taskChanges } from "#src/server/plan-list-changes.ts";
import { route } from "#src/server/route.ts";
import { TaskEntry } from "#src/shapes/run-edit.ts";

/** Adds a task of the work. */
export const POST = route({
  may: "change-run",
  input: TaskEntry,
  status: 201,
  run: (given) => taskChanges.add(given, given.input),
});
