import { route } from "#src/server/route.ts";
import { inTransaction } from "#src/server/transaction.ts";
import { beginWorkshop, settingsOf } from "#src/server/workshop.ts";
import { NewWorkshop } from "#src/shapes/workshop.ts";

/** Makes a workshop of one's own. */
export const POST = route({
  may: "in-person",
  input: NewWorkshop,
  status: 201,
  run: ({ db, input, ...given }) =>
    settingsOf(inTransaction(db, () => beginWorkshop({ db, ...given }, input))),
});
