import { route } from "#src/server/route.ts";
import { acceptInvitation, seeInvitation } from "#src/server/take-invitation.ts";
import { InvitationLink, TakenInvitation } from "#src/shapes/invitation.ts";

/** What the holder of an invitation's link may see of it. */
export const GET = route({
  may: "anyone",
  query: InvitationLink,
  run: ({ query, ...given }) => seeInvitation(given, query.token),
});

/** Takes an invitation: as the person signed in, or with a new account. */
export const POST = route({
  may: "anyone",
  input: TakenInvitation,
  run: ({ input, ...given }) => acceptInvitation(given, input),
});
