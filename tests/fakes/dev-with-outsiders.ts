import { FakeIdentityProvider } from "./identity-provider.ts";
import { FakeReferenceRates } from "./reference-rates.ts";

/**
 * `npx tsx tests/fakes/dev-with-outsiders.ts`: the development server with the fake identity provider beside
 * it, on the port after that of the letter box, and with the fake address of reference rates.
 */
const provider = await new FakeIdentityProvider({
  port: Number(process.env.TINPENNY_LETTERS_PORT ?? 4325) + 1,
  clientId: "tinpenny",
  clientSecret: "only for development",
  people: [
    { sub: "1", name: "Ines", email: "ines@example.org", email_verified: true },
    { sub: "2", name: "Nobody Known", email: "nobody@example.org", email_verified: true },
    { sub: "3", name: "Not Verified", email: "ines@example.org", email_verified: false },
  ],
}).start();

process.env.TINPENNY_RATES_URL = (await new FakeReferenceRates().start()).address;
process.env.TINPENNY_IDENTITY_NAME = "Fake provider";
process.env.TINPENNY_IDENTITY_ISSUER = provider.issuer;
process.env.TINPENNY_IDENTITY_CLIENT = provider.settings.clientId;
process.env.TINPENNY_IDENTITY_SECRET = provider.settings.clientSecret;
await import("#src/server/dev.ts");
