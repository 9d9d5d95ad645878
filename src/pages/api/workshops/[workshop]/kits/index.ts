import { makeKit } from "#src/server/kit-changes.ts";
import { presentKit } from "#src/server/present.ts";
import { route } from "#src/server/route.ts";
import { visibleKits } from "#src/server/visible-kits.ts";
import { KitEntry } from "#src/shapes/kit.ts";

/** The kits of the workshop that this person may see. */
export const GET = route({
  may: "see-parts",
  run: ({ db, workshop, role, user }) => visibleKits(db, workshop.id, role, user.id).map(presentKit),
});

/** Begins a kit. */
export const POST = route({
  may: "change-parts",
  input: KitEntry,
  status: 201,
  run: (given) => presentKit(makeKit(given, given.input)),
});
