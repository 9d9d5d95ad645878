import { giveRole, removePerson } from "#src/server/people.ts";
import { requireBrowser, route } from "#src/server/route.ts";
import { RoleChange } from "#src/shapes/workshop-person.ts";

export const PATCH = route({
  may: "manage-workshop",
  input: RoleChange,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    return giveRole(given, given.params.person ?? "", input);
  },
});

export const DELETE = route({
  may: "manage-workshop",
  run: (given) => {
    requireBrowser(given.session);
    removePerson(given, given.params.person ?? "");
  },
});
