import { inviteAgain, withdrawInvitation } from "#src/server/invitations.ts";
import { requireBrowser, route } from "#src/server/route.ts";

/** Sends the letter once more, with a new link. */
export const POST = route({
  may: "manage-workshop",
  run: (given) => {
    requireBrowser(given.session);
    return inviteAgain(given, given.params.invitation ?? "");
  },
});

/** Takes an invitation back. */
export const DELETE = route({
  may: "manage-workshop",
  run: (given) => withdrawInvitation(given, given.params.invitation ?? ""),
});
