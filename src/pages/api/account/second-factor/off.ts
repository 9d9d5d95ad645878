import { removeSecondFactor } from "#src/server/own-second-factor.ts";
import { route } from "#src/server/route.ts";
import { MadeSure } from "#src/shapes/account.ts";

/** Turns the second factor off. */
export const POST = route({
  may: "in-person",
  input: MadeSure,
  run: ({ input, ...given }) => removeSecondFactor(given, input.password),
});
