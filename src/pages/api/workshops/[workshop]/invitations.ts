import { invite, openInvitations } from "#src/server/invitations.ts";
import { requireBrowser, route } from "#src/server/route.ts";
import { NewInvitation } from "#src/shapes/invitation.ts";

/** Invitations that were not taken. */
export const GET = route({ may: "manage-workshop", run: openInvitations });

/** Asks somebody into the workshop by letter. */
export const POST = route({
  may: "manage-workshop",
  input: NewInvitation,
  status: 201,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    return invite(given, input);
  },
});
