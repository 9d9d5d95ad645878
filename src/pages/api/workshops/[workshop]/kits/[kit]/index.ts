import { dropKit, setKit } from "#src/server/kit-changes.ts";
import { presentKit } from "#src/server/present.ts";
import { route } from "#src/server/route.ts";
import { RemovalQuery } from "#src/shapes/field.ts";
import { KitChange } from "#src/shapes/kit.ts";

/** A kit. */
export const GET = route({ may: "see-parts", run: ({ kit }) => presentKit(kit) });

/** Changes a kit's name, summary or board; closes it or opens it again. */
export const PATCH = route({
  may: "change-parts",
  input: KitChange,
  run: (given) => presentKit(setKit(given, given.input)),
});

/** Removes a kit for good. */
export const DELETE = route({
  may: "change-parts",
  query: RemovalQuery,
  run: (given) => dropKit(given, given.query.version),
});
