import { dropEdition, editionLoss, setEditionFields } from "#src/server/edition-changes.ts";
import { presentEditions } from "#src/server/present.ts";
import { route } from "#src/server/route.ts";
import { EditionChange } from "#src/shapes/edition.ts";
import { RemovalQuery } from "#src/shapes/field.ts";

/** What would be lost with this edition. */
export const GET = route({
  may: "change-parts",
  run: (given) => editionLoss(given, given.params.edition ?? ""),
});

/** Changes an edition's name, share of the run or boards. */
export const PATCH = route({
  may: "change-parts",
  input: EditionChange,
  run: (given) =>
    presentEditions([setEditionFields(given, given.params.edition ?? "", given.input)], given.role)[0],
});

/** Removes an edition and says what was lost. */
export const DELETE = route({
  may: "change-parts",
  query: RemovalQuery,
  run: (given) => dropEdition(given, given.params.edition ?? "", given.query.version),
});
