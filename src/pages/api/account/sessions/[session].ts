import { endOwnSession } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";

/** Ends one of one's own sign-ins. */
export const DELETE = route({
  may: "in-person",
  run: ({ params, ...given }) => endOwnSession({ params, ...given }, params.session ?? ""),
});
