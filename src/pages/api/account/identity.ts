import { identityProvider } from "#src/server/identity-provider.ts";
import { beginIdentity } from "#src/server/identity-sign-in.ts";
import { makeSure } from "#src/server/make-sure.ts";
import { route } from "#src/server/route.ts";
import { removeIdentities } from "#src/server/store/identity.ts";
import { MadeSure } from "#src/shapes/account.ts";

/** Begins to connect the outside identity provider to one's account: the reply says where to go. */
export const POST = route({
  may: "in-person",
  input: MadeSure,
  run: async ({ input, ...given }) => {
    await makeSure(given, input.password);
    return beginIdentity(given, { connect: given.user.id });
  },
});

/** Ends the connection. A link by email still opens the account. */
export const DELETE = route({
  may: "in-person",
  run: ({ db, user }) => removeIdentities(db, user.id, identityProvider().issuer),
});
