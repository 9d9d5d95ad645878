import { route } from "#src/server/route.ts";
import { signInWithPassword } from "#src/server/sign-in.ts";
import { SignIn } from "#src/shapes/person.ts";

/** Signs in with address and password. */
export const POST = route({
  may: "anyone",
  input: SignIn,
  run: ({ input, ...given }) => signInWithPassword(given, input),
});
