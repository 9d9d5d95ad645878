import { addQuote } from "#src/server/board-changes.ts";
import { route } from "#src/server/route.ts";
import { NewBoardQuote } from "#src/shapes/board-quote.ts";

/** Adds a board house's quote. */
export const POST = route({
  may: "change-supply",
  input: NewBoardQuote,
  status: 201,
  run: (given) => addQuote(given, given.input),
});
