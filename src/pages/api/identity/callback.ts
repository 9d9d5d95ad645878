import { finishIdentity } from "#src/server/identity-sign-in.ts";
import { route } from "#src/server/route.ts";
import { IdentityReturn } from "#src/shapes/identity.ts";

/** Where the outside identity provider sends people back to. */
export const GET = route({
  may: "anyone",
  query: IdentityReturn,
  run: ({ query, ...given }) => finishIdentity(given, query),
});
