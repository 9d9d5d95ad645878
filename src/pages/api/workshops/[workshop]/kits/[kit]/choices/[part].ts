import { choosePart } from "#src/server/part-steps.ts";
import { route } from "#src/server/route.ts";
import { inTransaction } from "#src/server/transaction.ts";
import { PartChoiceChange } from "#src/shapes/part-choice.ts";

/** Sets how this kit buys one part: which offer, spares, what is left over. */
export const PATCH = route({
  may: "change-run",
  input: PartChoiceChange,
  run: (given) => inTransaction(given.db, () => choosePart(given, given.params.part ?? "", given.input)),
});
