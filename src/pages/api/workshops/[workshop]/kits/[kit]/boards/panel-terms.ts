import { addTerms } from "#src/server/panel-terms-changes.ts";
import { route } from "#src/server/route.ts";
import { NewPanelTerms } from "#src/shapes/panel-terms.ts";

/** Writes down what a board house makes panels of the kit's board like. */
export const POST = route({
  may: "change-supply",
  input: NewPanelTerms,
  status: 201,
  run: (given) => addTerms(given, given.input),
});
