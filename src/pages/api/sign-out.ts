import { route } from "#src/server/route.ts";
import { leaveSession } from "#src/server/session.ts";

export const POST = route({
  may: "half-signed-in",
  run: ({ db, session, headers }) => headers.append("set-cookie", leaveSession(db, session)),
});
