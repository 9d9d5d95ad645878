import { makeEdition, orderEditions } from "#src/server/edition-changes.ts";
import { presentEditions } from "#src/server/present.ts";
import { route } from "#src/server/route.ts";
import { editionsOf } from "#src/server/store/edition.ts";
import { EditionEntry, EditionOrder } from "#src/shapes/edition.ts";

/** The editions of the kit. */
export const GET = route({
  may: "see-parts",
  run: ({ db, kit, role }) => presentEditions(editionsOf(db, kit.id), role),
});

/** Adds an edition. */
export const POST = route({
  may: "change-parts",
  input: EditionEntry,
  status: 201,
  run: (given) => presentEditions([makeEdition(given, given.input)], given.role)[0],
});

/** Puts the editions in a new order. */
export const PUT = route({
  may: "change-parts",
  input: EditionOrder,
  run: (given) => presentEditions(orderEditions(given, given.input.editions), given.role),
});
