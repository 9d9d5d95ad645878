import { beginIdentity } from "#src/server/identity-sign-in.ts";
import { route } from "#src/server/route.ts";
import { IdentityBeginning } from "#src/shapes/identity.ts";

/** Begins to sign in with the outside identity provider: the reply says where to go. */
export const POST = route({
  may: "anyone",
  input: IdentityBeginning,
  run: ({ input, ...given }) => beginIdentity(given, input),
});
