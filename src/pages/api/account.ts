import { accountOf, changeAccount } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";
import { AccountChange } from "#src/shapes/account.ts";

export const GET = route({ may: "in-person", run: ({ db, user }) => accountOf(db, user) });

export const PATCH = route({
  may: "in-person",
  input: AccountChange,
  run: ({ input, ...given }) => changeAccount(given, input),
});
