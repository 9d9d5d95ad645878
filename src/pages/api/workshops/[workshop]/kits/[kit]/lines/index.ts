import { changePartsList } from "#src/server/change-parts-list.ts";
import { partsListOf } from "#src/server/parts-list.ts";
import { presentPartsList } from "#src/server/present.ts";
import { route } from "#src/server/route.ts";
import { LIST_CHANGE_BYTES } from "#src/shapes/limits.ts";
import { PartsChanges } from "#src/shapes/parts-change.ts";

/** The parts list, with as much of it as the role may see. */
export const GET = route({
  may: "see-parts",
  run: ({ db, kit, role }) => presentPartsList(partsListOf(db, kit), role),
});

/** Changes the parts list: all steps are taken or none. */
export const PATCH = route({
  may: "change-parts",
  input: PartsChanges,
  limit: LIST_CHANGE_BYTES,
  run: (given) => changePartsList(given, given.input.changes),
});
