import { route } from "#src/server/route.ts";
import { leaveSession } from "#src/server/session.ts";

/** Ends the session. The header's form posts here without a script, so the reply leads on to a page. */
export const POST = route({
  may: "half-signed-in",
  run: ({ db, session, headers }) => {
    headers.append("set-cookie", leaveSession(db, session));
    return new Response(null, { status: 303, headers: { location: "/sign-in" } });
  },
});
