import { setPart } from "#src/server/part-changes.ts";
import { route } from "#src/server/route.ts";
import { PartChange } from "#src/shapes/part.ts";

/** Changes a part of the workshop, in every kit that uses it. */
export const PATCH = route({
  may: "change-parts",
  input: PartChange,
  run: (given) => setPart(given, given.params.part ?? "", given.input),
});
