import { route } from "#src/server/route.ts";
import { leaveSession } from "#src/server/session.ts";
import { endSessionsOf } from "#src/server/store/session.ts";

/** Ends every sign-in of the person. */
export const POST = route({
  may: "in-person",
  run: ({ db, user, session, headers }) => {
    endSessionsOf(db, user.id);
    headers.append("set-cookie", leaveSession(db, session));
  },
});
