import { askForEmail } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";
import { EmailChange } from "#src/shapes/account.ts";

/** Sends a letter to an address one wants to change to; it is taken once it is confirmed. */
export const POST = route({
  may: "in-person",
  input: EmailChange,
  status: 202,
  run: async ({ input, ...given }) => {
    await askForEmail(given, input.email, input.password);
    return {};
  },
});
