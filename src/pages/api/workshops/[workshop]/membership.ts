import { removePerson } from "#src/server/people.ts";
import { requireBrowser, route } from "#src/server/route.ts";

/** Leaves the workshop. */
export const DELETE = route({
  may: "member",
  run: (given) => {
    requireBrowser(given.session);
    removePerson(given, given.user.id);
  },
});
