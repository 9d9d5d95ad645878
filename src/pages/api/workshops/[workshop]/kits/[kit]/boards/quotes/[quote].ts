import { changeQuote, removeQuote } from "#src/server/board-changes.ts";
import { route } from "#src/server/route.ts";
import { BoardQuoteChange } from "#src/shapes/board-quote.ts";
import { RemovalQuery } from "#src/shapes/field.ts";

/** Changes a quote; its lots or breaks are replaced as a whole. */
export const PATCH = route({
  may: "change-supply",
  input: BoardQuoteChange,
  run: (given) => changeQuote(given, given.params.quote ?? "", given.input),
});

/** Removes a quote. */
export const DELETE = route({
  may: "change-supply",
  query: RemovalQuery,
  run: (given) => removeQuote(given, given.params.quote ?? "", given.query.version),
});
