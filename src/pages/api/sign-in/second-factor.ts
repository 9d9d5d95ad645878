import { route } from "#src/server/route.ts";
import { finishSignIn } from "#src/server/sign-in.ts";
import { SecondFactor } from "#src/shapes/person.ts";

/** Finishes a sign-in with a code of the second factor. */
export const POST = route({
  may: "half-signed-in",
  input: SecondFactor,
  run: ({ input, ...given }) => finishSignIn(given, input.code),
});
