import { changePassword } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";
import { PasswordChange } from "#src/shapes/account.ts";

/** Sets one's own password and ends every other sign-in. */
export const PUT = route({
  may: "in-person",
  input: PasswordChange,
  run: ({ input, ...given }) => changePassword(given, input),
});
