import { makeFirstOwner } from "#src/server/first-owner.ts";
import { route } from "#src/server/route.ts";
import { FirstOwner } from "#src/shapes/person.ts";

/** Makes the first owner and their workshop, while there is nobody. */
export const POST = route({
  may: "anyone",
  input: FirstOwner,
  run: ({ input, ...given }) => makeFirstOwner(given, input),
});
