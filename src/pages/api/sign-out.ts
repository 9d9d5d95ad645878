import { route } from "#src/server/route.ts";
import { leaveSession } from "#src/server/session.ts";

/** A form's sign-out leads to the sign-in page; a script's has nothing to be told. */
export const POST = route({
  may: "half-signed-in",
  run({ db, session, headers, request }) {
    if (session) headers.append("set-cookie", leaveSession(db, session));
    const page = request.headers.get("accept")?.includes("text/html");
    return page ? new Response(null, { status: 303, headers: { location: "/sign-in" } }) : undefined;
  },
});
