import { presentKit } from "#src/server/present.ts";
import { endRevision } from "#src/server/revision.ts";
import { route } from "#src/server/route.ts";
import { inTransaction } from "#src/server/transaction.ts";

/** Ends the current revision of the parts list and begins the next. */
export const POST = route({
  may: "change-parts",
  status: 201,
  run: (given) => inTransaction(given.db, () => presentKit(endRevision(given, given.kit).kit)),
});
