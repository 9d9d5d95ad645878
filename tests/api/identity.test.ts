import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { POST as connect, DELETE as disconnect } from "#src/pages/api/account/identity.ts";
import { GET as readAccount } from "#src/pages/api/account.ts";
import { GET as callback } from "#src/pages/api/identity/callback.ts";
import { POST as begin } from "#src/pages/api/identity.ts";
import { GET as see } from "#src/pages/api/invitation.ts";
import { POST as invite } from "#src/pages/api/workshops/[workshop]/invitations.ts";
import { identitiesOf } from "#src/server/store/identity.ts";
import { FakeIdentityProvider } from "#tests/fakes/identity-provider.ts";
import { type Answer, type Asking, call, cookieOf, testApp, tokenIn } from "#tests/support/app.ts";

const app = testApp();
const PEOPLE = [
  { sub: "outside-ines", name: "Ines M.", email: "Ines@example.org", email_verified: true },
  { sub: "outside-tom", name: "Tom", email: "tom@example.org", email_verified: true },
  { sub: "outside-liar", name: "Ines M.", email: "ines@example.org", email_verified: false },
];
let provider: FakeIdentityProvider;

beforeEach(async () => {
  const client = { clientId: "tinpenny", clientSecret: "of the fake: with colon?" };
  provider = await new FakeIdentityProvider({
    ...client,
    port: 0,
    people: PEOPLE,
    now: () => app.now,
  }).start();
  app.settings({
    identityProvider: { name: "Outside", issuer: provider.issuer, scopes: ["openid", "email"], ...client },
  });
});
afterEach(() => provider.stop());

/** What the browser does in between: it goes to the provider, where somebody is chosen, and comes back. */
async function atProvider(begun: Answer<{ location: string }>, sub: string) {
  const address = new URL(begun.body.location);
  address.searchParams.set("as", sub);
  const response = await fetch(address, { redirect: "manual" });
  const back = new URL(response.headers.get("location") ?? "");
  const query = Object.fromEntries(back.searchParams) as Record<string, string>;
  return { address, back, query, cookie: cookieOf(begun.headers.get("set-cookie")) };
}

const comeBack = (query: Record<string, string>, cookie: string) =>
  call(callback, { query, cookie, method: "GET", origin: null });

async function goThrough(sub: string, body: object = {}, asking: Asking = {}) {
  const begun = await call(begin, { ...asking, body });
  const { query, cookie } = await atProvider(begun, sub);
  return comeBack(query, cookie);
}

const sessionIn = (answer: Answer<unknown>) =>
  answer.headers
    .getSetCookie()
    .map(cookieOf)
    .find((cookie) => cookie.startsWith("tinpenny=")) ?? "";

const ines = (over = {}) => app.person(undefined, undefined, { email: "ines@example.org", ...over });

describe("signing in with an outside identity provider", () => {
  it("asks with PKCE, state and nonce for the scopes set, to come back to our own address", async () => {
    const begun = await call(begin, { body: {} });
    const asked = new URL(begun.body.location).searchParams;
    expect(asked.get("redirect_uri")).toBe("http://127.0.0.1:4321/api/identity/callback");
    expect(asked.get("scope")).toBe("openid email");
    expect(asked.get("code_challenge_method")).toBe("S256");
    for (const name of ["state", "nonce", "code_challenge"])
      expect(asked.get(name)?.length).toBeGreaterThan(40);
    const header = begun.headers.get("set-cookie") ?? "";
    expect(header).toContain("HttpOnly");
    expect(header).toContain("SameSite=Lax");
    expect(decodeURIComponent(header)).not.toContain(asked.get("state"));
  });

  it("finds a person by an address both sides have verified, connects them and tells them", async () => {
    const person = ines();
    const answer = await goThrough("outside-ines", { back: "/workshops/one" });
    expect(answer.status).toBe(303);
    expect(answer.headers.get("location")).toBe("/workshops/one");
    expect((await call(readAccount, { cookie: sessionIn(answer) })).body).toMatchObject({
      id: person.id,
      identity: { provider: "Outside", connected: true },
    });
    expect((await app.letters()).map(({ subject }) => subject)).toEqual(["Another way to sign in"]);
    await goThrough("outside-ines");
    expect(await app.letters()).toHaveLength(1);
  });

  it.each([
    ["the provider has not verified the address", "outside-liar", {}],
    ["we have not confirmed the address", "outside-ines", { emailConfirmedAt: null }],
    ["nobody has the address", "outside-tom", {}],
  ])("lets nobody in where %s", async (_, sub, over) => {
    const person = ines(over);
    const answer = await goThrough(sub);
    expect(answer.headers.get("location")).toBe("/sign-in?problem=identity-not-known");
    expect(sessionIn(answer)).toBe("");
    expect(identitiesOf(app.db, person.id)).toEqual([]);
  });

  it("still asks for the second factor", async () => {
    ines({ totpSecret: "sealed", totpConfirmedAt: app.now });
    const answer = await goThrough("outside-ines", { back: "/account" });
    expect(answer.headers.get("location")).toBe("/sign-in/second-factor?back=%2Faccount");
    expect((await call(readAccount, { cookie: sessionIn(answer) })).status).toBe(401);
  });

  it("does not go on to another site", async () => {
    ines();
    const answer = await goThrough("outside-ines", { back: "https://elsewhere.example/" });
    expect(answer.headers.get("location")).toBe("/");
  });

  it("works without ID tokens, from the user-info address (plain OAuth 2)", async () => {
    provider.givesIdTokens = false;
    const person = ines();
    const answer = await goThrough("outside-ines");
    expect((await call(readAccount, { cookie: sessionIn(answer) })).body.id).toBe(person.id);
  });

  it("is not there where no provider is set up", async () => {
    app.settings({ identityProvider: null });
    expect((await call(begin, { body: {} })).status).toBe(404);
    expect((await call(callback, { query: { code: "a", state: "b" }, method: "GET" })).status).toBe(404);
  });

  it("begins at our own site only, and at most forty times in a quarter of an hour", async () => {
    expect((await call(begin, { body: {}, origin: "https://elsewhere.example" })).status).toBe(403);
    const statuses = [];
    for (let i = 0; i < 41; i++) statuses.push((await call(begin, { body: {} })).status);
    expect(statuses.slice(39)).toEqual([200, 429]);
  });
});

describe("coming back from the provider fails", () => {
  const FAILED = "/sign-in?problem=identity-failed";

  it("with another state, without the cookie, with an error, or after ten minutes", async () => {
    ines();
    const begun = await call(begin, { body: {} });
    const { query, cookie } = await atProvider(begun, "outside-ines");
    const answers = [
      await comeBack({ ...query, state: "another" }, cookie),
      await comeBack(query, ""),
      await comeBack({ error: "access_denied", state: query.state ?? "" }, cookie),
    ];
    app.pass(10 * 60_000);
    answers.push(await comeBack(query, cookie));
    expect(answers.map(({ headers }) => headers.get("location"))).toEqual([FAILED, FAILED, FAILED, FAILED]);
    expect(answers.map(sessionIn)).toEqual(["", "", "", ""]);
  });

  it("with a code of somebody else's sign-in: its verifier is another", async () => {
    vi.spyOn(console, "warn").mockImplementation(() => undefined);
    ines();
    const mine = await atProvider(await call(begin, { body: {} }), "outside-ines");
    const theirs = await atProvider(await call(begin, { body: {} }), "outside-tom");
    const answer = await comeBack({ ...mine.query, code: theirs.query.code ?? "" }, mine.cookie);
    expect(answer.headers.get("location")).toBe(FAILED);
  });

  it("with the same code a second time", async () => {
    vi.spyOn(console, "warn").mockImplementation(() => undefined);
    ines();
    const { query, cookie } = await atProvider(await call(begin, { body: {} }), "outside-ines");
    expect((await comeBack(query, cookie)).headers.get("location")).toBe("/");
    expect((await comeBack(query, cookie)).headers.get("location")).toBe(FAILED);
  });

  /** OpenID Connect Core 1.0, section 3.1.3.7: issuer, audience, authorized party, expiry, nonce. */
  it.each([
    ["of another issuer", { iss: "https://elsewhere.example" }],
    ["for another client", { aud: "another" }],
    ["for several clients without naming ours", { aud: ["tinpenny", "another"] }],
    ["that ran out", { exp: Date.UTC(2026, 2, 9, 9, 58) / 1000 }],
    ["with another nonce", { nonce: "another" }],
    ["without a subject", { sub: "" }],
  ])("with an ID token %s", async (_, wrong) => {
    vi.spyOn(console, "warn").mockImplementation(() => undefined);
    ines();
    provider.changeClaims = (claims) => ({ ...claims, ...wrong });
    expect((await goThrough("outside-ines")).headers.get("location")).toBe(FAILED);
  });

  it("when the provider is away", async () => {
    const errors = vi.spyOn(console, "error").mockImplementation(() => undefined);
    await provider.stop();
    const answer = await call(begin, { body: {} });
    expect(answer.problem).toMatchObject({ status: 502, title: "Outside does not answer." });
    expect(errors).toHaveBeenCalledOnce();
    await provider.start();
  });
});

describe("connecting an outside identity to one's account", () => {
  async function connectAs(person: Asking["as"], sub: string) {
    const begun = await call(connect, { as: person, body: {} });
    const { query, cookie } = await atProvider(begun, sub);
    return comeBack(query, `${cookie}; ${person?.cookie}`);
  }

  it("needs no same address, opens the account from then on, and can be ended", async () => {
    const person = ines();
    const answer = await connectAs(person, "outside-tom");
    expect(answer.headers.get("location")).toBe("/account");
    const signedIn = await goThrough("outside-tom");
    expect((await call(readAccount, { cookie: sessionIn(signedIn) })).body.id).toBe(person.id);
    expect((await call(disconnect, { as: person })).status).toBe(204);
    expect((await goThrough("outside-tom")).headers.get("location")).toBe(
      "/sign-in?problem=identity-not-known",
    );
  });

  it("is refused for an identity that is another person's", async () => {
    const [person, tom] = [ines(), app.person()];
    await connectAs(tom, "outside-tom");
    const answer = await connectAs(person, "outside-tom");
    expect(answer.headers.get("location")).toBe("/account?problem=identity-taken");
    expect(identitiesOf(app.db, person.id)).toEqual([]);
  });

  it("is refused when somebody else is signed in by the time it comes back", async () => {
    const [person, other] = [ines(), app.person()];
    const begun = await call(connect, { as: person, body: {} });
    const { query, cookie } = await atProvider(begun, "outside-ines");
    const answer = await comeBack(query, `${cookie}; ${other.cookie}`);
    expect(answer.headers.get("location")).toBe("/account?problem=identity-failed");
    expect(identitiesOf(app.db, other.id)).toEqual([]);
  });

  it("needs a person who is signed in", async () => {
    expect((await call(connect, { body: {} })).status).toBe(401);
    expect((await call(disconnect, { as: ines(), origin: null })).status).toBe(403);
  });
});

describe("taking an invitation with an outside identity", () => {
  async function invited(email: string) {
    const workshop = app.workshop();
    const owner = app.person("owner", workshop);
    const params = { workshop: workshop.id };
    await call(invite, { as: owner, params, body: { email, role: "seller", kit: null } });
    return { workshop, token: tokenIn((await app.letters()).at(-1)) };
  }

  it("makes an account with the address the invitation went to", async () => {
    const { workshop, token } = await invited("office@example.org");
    const answer = await goThrough("outside-tom", { invitation: token });
    expect(answer.headers.get("location")).toBe(`/workshops/${workshop.id}`);
    expect((await call(readAccount, { cookie: sessionIn(answer) })).body).toMatchObject({
      ...{ name: "Tom", email: "office@example.org", emailConfirmed: true, hasPassword: false },
    });
    expect((await call(see, { query: { token }, method: "GET" })).status).toBe(410);
  });

  it("signs in a person who has an account, who then takes it on its page", async () => {
    const { token } = await invited("ines@example.org");
    ines();
    const answer = await goThrough("outside-ines", { invitation: token });
    expect(answer.headers.get("location")).toBe(`/invitation?token=${token}`);
    expect((await call(see, { query: { token }, method: "GET" })).status).toBe(200);
  });

  it("does not open the account of the address it went to", async () => {
    const { token } = await invited("ines@example.org");
    const person = ines();
    const answer = await goThrough("outside-tom", { invitation: token });
    expect(answer.headers.get("location")).toBe(`/invitation?token=${token}&problem=account-exists`);
    expect(identitiesOf(app.db, person.id)).toEqual([]);
  });
});
