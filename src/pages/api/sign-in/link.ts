import { route } from "#src/server/route.ts";
import { signInWithLink } from "#src/server/sign-in-link.ts";
import { LinkOnly } from "#src/shapes/person.ts";

/** Signs in with a link from a letter. */
export const POST = route({
  may: "anyone",
  input: LinkOnly,
  run: ({ input, ...given }) => signInWithLink(given, input.token),
});
