import { dropPartsImport, editPartsImport, partsImport } from "#src/server/parts-import.ts";
import { route } from "#src/server/route.ts";
import { RemovalQuery } from "#src/shapes/field.ts";
import { DraftEdit } from "#src/shapes/import.ts";

/** A list being brought in, as it reads now. */
export const GET = route({
  may: "change-parts",
  run: (given) => partsImport(given, given.params.import ?? ""),
});

/** Says what columns mean, answers questions, and gets the list as it then reads. */
export const PATCH = route({
  may: "change-parts",
  input: DraftEdit,
  run: (given) => editPartsImport(given, given.params.import ?? "", given.input),
});

/** Drops a draft. */
export const DELETE = route({
  may: "change-parts",
  query: RemovalQuery,
  run: (given) => dropPartsImport(given, given.params.import ?? "", given.query.version),
});
