import { beginSecondFactor, confirmSecondFactor } from "#src/server/own-second-factor.ts";
import { route } from "#src/server/route.ts";
import { FirstCode, MadeSure } from "#src/shapes/account.ts";

/** Makes a secret for an authenticator. */
export const POST = route({
  may: "in-person",
  input: MadeSure,
  run: ({ input, ...given }) => beginSecondFactor(given, input.password),
});

/** Turns the second factor on with the first code. */
export const PUT = route({
  may: "in-person",
  input: FirstCode,
  run: ({ input, ...given }) => confirmSecondFactor(given, input.code),
});
