import { confirmAgain } from "#src/server/account.ts";
import { route } from "#src/server/route.ts";

export const POST = route({
  may: "in-person",
  status: 202,
  run: (given) => {
    confirmAgain(given);
    return {};
  },
});
