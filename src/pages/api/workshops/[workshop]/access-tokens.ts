import { makeAccessToken, ownAccessTokens } from "#src/server/own-access-tokens.ts";
import { requireBrowser, route } from "#src/server/route.ts";
import { NewAccessToken } from "#src/shapes/access-token.ts";

export const GET = route({ may: "member", run: ownAccessTokens });

export const POST = route({
  may: "member",
  input: NewAccessToken,
  status: 201,
  run: ({ input, ...given }) => {
    requireBrowser(given.session);
    return makeAccessToken(given, input);
  },
});
