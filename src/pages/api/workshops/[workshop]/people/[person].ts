import { giveRole, removePerson } from "#src/server/people.ts";
import { requireBrowser, route } from "#src/server/route.ts";
import { RoleChange } from "#src/shapes/workshop-person.ts";

/** Gives a person another role. */
export const PATCH = route({
  may: "manage-workshop",
  input: RoleChange,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    return giveRole(given, given.params.person ?? "", input);
  },
});

/** Takes a person out of the workshop. */
export const DELETE = route({
  may: "manage-workshop",
  run: (given) => {
    requireBrowser(given.session);
    removePerson(given, given.params.person ?? "");
  },
});
