import { dropPriceImport, editPriceImport, priceImport } from "#src/server/price-import.ts";
import { route } from "#src/server/route.ts";
import { RemovalQuery } from "#src/shapes/field.ts";
import { DraftEdit } from "#src/shapes/import.ts";

/** A price list being brought in, as it reads now. */
export const GET = route({
  may: "change-supply",
  run: (given) => priceImport(given, given.params.import ?? ""),
});

/** Says what columns mean, answers questions, says whose the list is, and gets it as it then reads. */
export const PATCH = route({
  may: "change-supply",
  input: DraftEdit,
  run: (given) => editPriceImport(given, given.params.import ?? "", given.input),
});

/** Drops a draft. */
export const DELETE = route({
  may: "change-supply",
  query: RemovalQuery,
  run: (given) => dropPriceImport(given, given.params.import ?? "", given.query.version),
});
