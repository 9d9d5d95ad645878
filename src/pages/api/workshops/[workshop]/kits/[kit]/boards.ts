import { boards, changeChoice } from "#src/server/board-changes.ts";
import { route } from "#src/server/route.ts";
import { BoardChoiceChange } from "#src/shapes/board-quote.ts";

/** The quotes for the kit's board and how it orders them. */
export const GET = route({ may: "see-money", run: boards });

/** Chooses a quote or the cheapest, sets yield and confidence; the version is the run plan's. */
export const PATCH = route({
  may: "change-supply",
  input: BoardChoiceChange,
  run: (given) => changeChoice(given, given.input),
});
