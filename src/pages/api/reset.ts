import { route } from "#src/server/route.ts";
import { resetPassword } from "#src/server/sign-in-link.ts";
import { Reset } from "#src/shapes/person.ts";

/** Sets a new password through a link from a letter. */
export const POST = route({
  may: "anyone",
  input: Reset,
  run: ({ input, ...given }) => resetPassword(given, input.token, input.password),
});
