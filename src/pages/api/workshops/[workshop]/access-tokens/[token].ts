import { dropAccessToken } from "#src/server/own-access-tokens.ts";
import { requireBrowser, route } from "#src/server/route.ts";

/** Removes one of one's own access tokens. */
export const DELETE = route({
  may: "member",
  run: (given) => {
    requireBrowser(given.session);
    dropAccessToken(given, given.params.token ?? "");
  },
});
