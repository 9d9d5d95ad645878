import { route } from "#src/server/route.ts";
import { confirmEmail } from "#src/server/sign-in-link.ts";
import { LinkOnly } from "#src/shapes/person.ts";

/** Confirms an email address through a link from a letter. */
export const POST = route({
  may: "anyone",
  input: LinkOnly,
  run: ({ input, ...given }) => confirmEmail(given, input.token),
});
