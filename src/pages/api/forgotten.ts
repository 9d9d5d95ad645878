import { route } from "#src/server/route.ts";
import { sendReset } from "#src/server/sign-in-link.ts";
import { Forgotten } from "#src/shapes/person.ts";

/** Sends a link to choose a new password, if anybody has the address. */
export const POST = route({
  may: "anyone",
  input: Forgotten,
  status: 202,
  run: ({ input, ...given }) => {
    sendReset(given, input.email);
    return {};
  },
});
