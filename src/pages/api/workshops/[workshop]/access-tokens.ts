import { makeAccessToken, ownAccessTokens } from "#src/server/own-access-tokens.ts";
import { requireBrowser, route } from "#src/server/route.ts";
import { NewAccessToken } from "#src/shapes/access-token.ts";

/** One's own access tokens in this workshop. */
export const GET = route({ may: "member", run: ownAccessTokens });

/** Makes an access token; its secret is in this reply only. */
export const POST = route({
  may: "member",
  input: NewAccessToken,
  status: 201,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    return makeAccessToken(given, input);
  },
});
