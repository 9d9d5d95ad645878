import { route } from "#src/server/route.ts";
import { sendSignInLink } from "#src/server/sign-in-link.ts";
import { SendLink } from "#src/shapes/person.ts";

/** Sends a link that signs in, if anybody has the address. */
export const POST = route({
  may: "anyone",
  input: SendLink,
  status: 202,
  run: ({ input, ...given }) => {
    sendSignInLink(given, input.email, input.back);
    return {};
  },
});
