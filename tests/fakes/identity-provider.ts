import { createHash, generateKeyPairSync, randomUUID, sign } from "node:crypto";
import { createServer, type IncomingMessage, type ServerResponse } from "node:http";
import type { AddressInfo } from "node:net";

/** Somebody with an account at the fake provider. */
export interface OutsidePerson {
  sub: string;
  name: string;
  email: string;
  email_verified: boolean;
}

export interface FakeProviderSettings {
  port: number;
  clientId: string;
  clientSecret: string;
  people: OutsidePerson[];
  now?: () => number;
}

interface Grant {
  person: OutsidePerson;
  redirectUri: string;
  challenge: string;
  nonce: string | null;
}

const KEYS = generateKeyPairSync("rsa", { modulusLength: 2048 });
const base64url = (value: object) => Buffer.from(JSON.stringify(value)).toString("base64url");

function signed(claims: object): string {
  const content = `${base64url({ alg: "RS256", kid: "fake" })}.${base64url(claims)}`;
  return `${content}.${sign("RSA-SHA256", Buffer.from(content), KEYS.privateKey).toString("base64url")}`;
}

function json(response: ServerResponse, status: number, body: object): void {
  response.writeHead(status, { "content-type": "application/json" }).end(JSON.stringify(body));
}

async function formOf(request: IncomingMessage): Promise<URLSearchParams> {
  const chunks: Buffer[] = [];
  for await (const chunk of request) chunks.push(chunk as Buffer);
  return new URLSearchParams(Buffer.concat(chunks).toString());
}

/**
 * An identity provider for development and tests: discovery, authorization with PKCE, token, user info. It
 * is a separate small server and asks no password: whoever opens it chooses which person to be.
 */
export class FakeIdentityProvider {
  /** Changes the claims of the next ID tokens, to see what is refused. */
  changeClaims: (claims: Record<string, unknown>) => Record<string, unknown> = (claims) => claims;
  /** Without ID tokens it is plain OAuth 2 with a user-info address. */
  givesIdTokens = true;
  issuer = "";
  readonly #grants = new Map<string, Grant>();
  readonly #accessTokens = new Map<string, OutsidePerson>();
  readonly #server = createServer((request, response) => void this.#answer(request, response));

  constructor(readonly settings: FakeProviderSettings) {}

  async start(): Promise<this> {
    await new Promise<void>((resolve) => this.#server.listen(this.settings.port, "127.0.0.1", resolve));
    this.issuer = `http://127.0.0.1:${(this.#server.address() as AddressInfo).port}`;
    return this;
  }

  stop(): Promise<void> {
    this.#server.closeAllConnections();
    return new Promise((resolve) => this.#server.close(() => resolve()));
  }

  async #answer(request: IncomingMessage, response: ServerResponse): Promise<unknown> {
    const url = new URL(request.url ?? "/", this.issuer);
    if (url.pathname === "/.well-known/openid-configuration") return json(response, 200, this.#document());
    if (url.pathname === "/jwks")
      return json(response, 200, { keys: [KEYS.publicKey.export({ format: "jwk" })] });
    if (url.pathname === "/authorize") return this.#authorize(url, response);
    if (url.pathname === "/token") return this.#token(await formOf(request), request, response);
    if (url.pathname === "/userinfo") return this.#userInfo(request, response);
    return response.writeHead(404).end();
  }

  #document() {
    return {
      issuer: this.issuer,
      authorization_endpoint: `${this.issuer}/authorize`,
      token_endpoint: `${this.issuer}/token`,
      userinfo_endpoint: `${this.issuer}/userinfo`,
      jwks_uri: `${this.issuer}/jwks`,
      response_types_supported: ["code"],
      subject_types_supported: ["public"],
      id_token_signing_alg_values_supported: ["RS256"],
      code_challenge_methods_supported: ["S256"],
    };
  }

  #authorize(url: URL, response: ServerResponse): unknown {
    const asked = url.searchParams;
    const right =
      asked.get("client_id") === this.settings.clientId &&
      asked.get("response_type") === "code" &&
      asked.get("code_challenge_method") === "S256";
    if (!right) return json(response, 400, { error: "invalid_request" });
    const person = this.settings.people.find(({ sub }) => sub === asked.get("as"));
    if (!person) return this.#choose(url, response);
    const code = randomUUID();
    const redirectUri = asked.get("redirect_uri") ?? "";
    const challenge = asked.get("code_challenge") ?? "";
    this.#grants.set(code, { person, redirectUri, challenge, nonce: asked.get("nonce") });
    const back = new URL(redirectUri);
    back.searchParams.set("code", code);
    back.searchParams.set("state", asked.get("state") ?? "");
    return response.writeHead(303, { location: back.href }).end();
  }

  #choose(url: URL, response: ServerResponse): void {
    const items = this.settings.people.map(({ sub, name, email }) => {
      const address = new URL(url);
      address.searchParams.set("as", sub);
      return `<li><a href="${address.pathname}${address.search.replaceAll("&", "&amp;")}">${name}, ${email}</a></li>`;
    });
    const page = `<!doctype html><html lang="en"><title>Fake identity provider</title><h1>Who are you?</h1><ul>${items.join("")}</ul>`;
    response.writeHead(200, { "content-type": "text/html; charset=utf-8" }).end(page);
  }

  #token(form: URLSearchParams, request: IncomingMessage, response: ServerResponse): unknown {
    const { clientId, clientSecret, now = Date.now } = this.settings;
    const basic = `Basic ${Buffer.from(`${clientId}:${clientSecret}`).toString("base64")}`;
    if (request.headers.authorization !== basic) return json(response, 401, { error: "invalid_client" });
    const code = form.get("code") ?? "";
    const grant = this.#grants.get(code);
    this.#grants.delete(code);
    const verifier = createHash("sha256")
      .update(form.get("code_verifier") ?? "")
      .digest("base64url");
    if (!grant || grant.redirectUri !== form.get("redirect_uri") || grant.challenge !== verifier)
      return json(response, 400, { error: "invalid_grant" });
    const accessToken = randomUUID();
    this.#accessTokens.set(accessToken, grant.person);
    const seconds = Math.floor(now() / 1000);
    const claims = { iss: this.issuer, aud: clientId, iat: seconds, exp: seconds + 300, nonce: grant.nonce };
    const idToken = signed(this.changeClaims({ ...claims, ...grant.person }));
    return json(response, 200, {
      access_token: accessToken,
      token_type: "Bearer",
      ...(this.givesIdTokens && { id_token: idToken }),
    });
  }

  #userInfo(request: IncomingMessage, response: ServerResponse): void {
    const person = this.#accessTokens.get(request.headers.authorization?.slice("Bearer ".length) ?? "");
    if (person) json(response, 200, person);
    else json(response, 401, { error: "invalid_token" });
  }
}
