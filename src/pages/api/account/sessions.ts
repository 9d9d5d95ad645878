import { ownSessions } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";
import { endSessionsOf } from "#src/server/store/session.ts";

/** One's own sign-ins. */
export const GET = route({
  may: "in-person",
  run: ({ db, user, session, now }) => ownSessions(db, user, session, now),
});

/** Ends every other sign-in of the person. */
export const DELETE = route({
  may: "in-person",
  run: ({ db, user, session }) => endSessionsOf(db, user.id, session.tokenHash),
});
