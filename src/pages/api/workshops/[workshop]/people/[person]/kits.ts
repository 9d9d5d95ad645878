import { askToKits } from "#src/server/people.ts";
import { requireBrowser, route } from "#src/server/route.ts";
import { KitsAskedTo } from "#src/shapes/workshop-person.ts";

/** Which kits a co-builder is asked to. */
export const PUT = route({
  may: "manage-workshop",
  input: KitsAskedTo,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    return askToKits(given, given.params.person ?? "", input.kits);
  },
});
