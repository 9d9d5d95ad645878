import { confirmAgain } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";

/** Sends the letter that confirms one's own address once more. */
export const POST = route({
  may: "in-person",
  status: 202,
  run: (given) => {
    confirmAgain(given);
    return {};
  },
});
