import { renewRecoveryCodes } from "#src/server/own-second-factor.ts";
import { route } from "#src/server/route.ts";
import { MadeSure } from "#src/shapes/account.ts";

/** Makes new recovery codes; the old ones stop working. */
export const POST = route({
  may: "in-person",
  input: MadeSure,
  run: ({ input, ...given }) => renewRecoveryCodes(given, input.password),
});
