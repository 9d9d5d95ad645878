import { accountOf, changeAccount } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";
import { AccountChange } from "#src/shapes/account.ts";

/** One's own account. */
export const GET = route({ may: "in-person", run: ({ db, user }) => accountOf(db, user) });

/** Changes one's own name and keys. */
export const PATCH = route({
  may: "in-person",
  input: AccountChange,
  run: ({ input, ...given }) => changeAccount(given, input),
});
