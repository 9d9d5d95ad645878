import { CodeChallengeMethod, decodeIdToken, OAuth2Client, type OAuth2Tokens } from "arctic";
import { z } from "zod";
import { config, type IdentityProviderSettings, listensOnLoopback } from "./config.ts";
import { Problem } from "./problem.ts";

/**
 * An outside identity provider, asked by OpenID Connect Core 1.0 with the authorization code flow and PKCE
 * (RFC 7636). Its addresses come from its own published document (OpenID Connect Discovery 1.0, RFC 8414).
 */
const PATIENCE = 10_000;
const DOCUMENT_LASTS = 60 * 60 * 1000;
const CLOCKS_APART = 60;

const Metadata = z.object({
  issuer: z.string(),
  authorization_endpoint: z.url(),
  token_endpoint: z.url(),
  userinfo_endpoint: z.url().optional(),
});
type Metadata = z.infer<typeof Metadata>;

const PersonClaims = z.object({
  sub: z.string().min(1).max(255),
  email: z.string().optional(),
  email_verified: z.union([z.boolean(), z.stringbool()]).optional(),
  name: z.string().optional(),
});
type PersonClaims = z.infer<typeof PersonClaims>;

const IdToken = PersonClaims.extend({
  iss: z.string(),
  aud: z.union([z.string(), z.array(z.string())]),
  azp: z.string().optional(),
  exp: z.number(),
  nonce: z.string().optional(),
});

/** Who the provider says somebody is. */
export interface OutsideIdentity {
  subject: string;
  /** In lower case, and only if the provider has verified it. */
  email: string | null;
  name: string | null;
}

/** What a beginning and its end must agree on. */
export interface Challenge {
  state: string;
  nonce: string;
  verifier: string;
}

/** The provider of this server. */
export function identityProvider(): IdentityProviderSettings {
  const provider = config().identityProvider;
  if (!provider) throw new Problem("not-found");
  return provider;
}

function problem(code: "identity-failed" | "identity-unreachable"): Problem {
  return new Problem(code, { parameters: { provider: identityProvider().name } });
}

function withoutSlash(text: string): string {
  return text.replace(/\/+$/, "");
}

/** Secrets go over HTTPS, or stay on this machine. */
function isPrivate(address: string): boolean {
  const { protocol, hostname } = new URL(address);
  return protocol === "https:" || listensOnLoopback(hostname);
}

async function fetchJson(address: string, headers: Record<string, string> = {}): Promise<unknown> {
  const response = await fetch(address, {
    headers: { accept: "application/json", ...headers },
    redirect: "error",
    signal: AbortSignal.timeout(PATIENCE),
  });
  if (!response.ok) throw new Error(`${address} answered ${response.status}.`);
  return response.json();
}

async function discover(issuer: string): Promise<Metadata> {
  const found = Metadata.parse(await fetchJson(`${issuer}/.well-known/openid-configuration`));
  if (withoutSlash(found.issuer) !== issuer) throw new Error(`${issuer} calls itself ${found.issuer}.`);
  const addresses = [found.authorization_endpoint, found.token_endpoint, found.userinfo_endpoint];
  if (!addresses.every((address) => address === undefined || isPrivate(address)))
    throw new Error(`${issuer} names an address without HTTPS.`);
  return found;
}

let known: { issuer: string; until: number; metadata: Metadata } | undefined;

async function metadataOf(issuer: string, now: number): Promise<Metadata> {
  if (known?.issuer === issuer && known.until > now) return known.metadata;
  try {
    const metadata = await discover(issuer);
    known = { issuer, until: now + DOCUMENT_LASTS, metadata };
    return metadata;
  } catch (error) {
    console.error("The identity provider:", (error as Error).message);
    throw problem("identity-unreachable");
  }
}

function clientOf({ clientId, clientSecret }: IdentityProviderSettings): OAuth2Client {
  return new OAuth2Client(clientId, clientSecret, `${config().origin}/api/identity/callback`);
}

/** Where to send a person so that the provider asks who they are. */
export async function authorizationAddress(challenge: Challenge, now: number): Promise<string> {
  const provider = identityProvider();
  const { authorization_endpoint } = await metadataOf(provider.issuer, now);
  const address = clientOf(provider).createAuthorizationURLWithPKCE(
    authorization_endpoint,
    challenge.state,
    CodeChallengeMethod.S256,
    challenge.verifier,
    provider.scopes,
  );
  address.searchParams.set("nonce", challenge.nonce);
  return address.href;
}

/** Gives up on a request that arctic cannot be told to give up on. */
async function within<T>(milliseconds: number, answer: Promise<T>): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Error("No answer in time.")), milliseconds);
  });
  try {
    return await Promise.race([answer, late]);
  } finally {
    clearTimeout(timer);
  }
}

/**
 * The claims of an ID token, after the checks of OpenID Connect Core 1.0, section 3.1.3.7. Its signature is
 * not among them: the token came straight from the token endpoint, which item 6 there allows to stand in.
 */
function checkedIdToken(token: string, issuer: string, nonce: string, now: number): PersonClaims {
  const { clientId } = identityProvider();
  const claims = IdToken.parse(decodeIdToken(token));
  const audience = [claims.aud].flat();
  const right =
    claims.iss === issuer &&
    audience.includes(clientId) &&
    (audience.length === 1 || claims.azp === clientId) &&
    claims.exp > now / 1000 - CLOCKS_APART &&
    claims.nonce === nonce;
  if (!right) throw new Error("The ID token is for another sign-in.");
  return claims;
}

async function userInfo(metadata: Metadata, tokens: OAuth2Tokens): Promise<PersonClaims> {
  if (!metadata.userinfo_endpoint) throw new Error("The provider does not say who somebody is.");
  const authorization = `Bearer ${tokens.accessToken()}`;
  return PersonClaims.parse(await fetchJson(metadata.userinfo_endpoint, { authorization }));
}

async function claimsOf(
  metadata: Metadata,
  tokens: OAuth2Tokens,
  { nonce }: Challenge,
  now: number,
): Promise<PersonClaims> {
  if (!("id_token" in tokens.data)) return userInfo(metadata, tokens);
  const claims = checkedIdToken(tokens.idToken(), metadata.issuer, nonce, now);
  if (claims.email !== undefined || !metadata.userinfo_endpoint) return claims;
  const more = await userInfo(metadata, tokens);
  if (more.sub !== claims.sub) throw new Error("The provider speaks of two people.");
  return more;
}

/**
 * Exchanges the code a person came back with for who they are.
 *
 * @throws Problem "identity-failed" or "identity-unreachable"; the reason is in the server's log.
 */
export async function identityBy(code: string, challenge: Challenge, now: number): Promise<OutsideIdentity> {
  const provider = identityProvider();
  const metadata = await metadataOf(provider.issuer, now);
  try {
    const exchange = clientOf(provider).validateAuthorizationCode(
      metadata.token_endpoint,
      code,
      challenge.verifier,
    );
    const claims = await claimsOf(metadata, await within(PATIENCE, exchange), challenge, now);
    const email = claims.email_verified ? (claims.email ?? null) : null;
    return { subject: claims.sub, email: email?.toLowerCase() ?? null, name: claims.name ?? null };
  } catch (error) {
    console.warn("The identity provider:", (error as Error).message);
    throw problem("identity-failed");
  }
}
