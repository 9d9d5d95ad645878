import { beforeAll, describe, expect, it } from "vitest";
import { sessions } from "#db/schema/people.ts";
import { GET as readAccount } from "#src/pages/api/account.ts";
import { POST as finish } from "#src/pages/api/sign-in/second-factor.ts";
import { POST as signIn } from "#src/pages/api/sign-in.ts";
import { POST as signOutEverywhere } from "#src/pages/api/sign-out/everywhere.ts";
import { POST as signOut } from "#src/pages/api/sign-out.ts";
import { hashPassword } from "#src/server/password.ts";
import { newRecoveryCodes, newTotpSecret, recoveryCodeHash } from "#src/server/second-factor.ts";
import { replaceRecoveryCodes } from "#src/server/store/recovery-code.ts";
import { type Asking, call, cookieOf, type TestPerson, testApp } from "#tests/support/app.ts";

const app = testApp();
const PASSWORD = "nine brown parcels by noon";
let passwordHash: string;
beforeAll(async () => {
  passwordHash = await hashPassword(PASSWORD);
});

const withPassword = () => app.person(undefined, undefined, { email: "ines@example.org", passwordHash });
const right = { email: "ines@example.org", password: PASSWORD };
const wrong = { ...right, password: "nine brown parcels at noon" };
const MINUTE = 60_000;

describe("signing in with a password", () => {
  it("begins a session whose cookie is not what is stored", async () => {
    const person = withPassword();
    const answer = await call(signIn, { body: { email: " Ines@Example.org ", password: PASSWORD } });
    expect(answer.status).toBe(200);
    expect(answer.body).toEqual({ next: "done" });
    const header = answer.headers.get("set-cookie") ?? "";
    expect(header).toMatch(/^tinpenny=\w{40}; /);
    expect(header).toContain("HttpOnly");
    expect(header).toContain("SameSite=Lax");
    expect(header).not.toContain("Secure");
    const cookie = cookieOf(header);
    expect((await call(readAccount, { cookie })).body).toMatchObject({ id: person.id });
    const stored = app.db.select().from(sessions).all();
    expect(JSON.stringify(stored)).not.toContain(cookie.split("=")[1]);
  });

  it("marks the cookie for HTTPS, and for this host alone, behind HTTPS", async () => {
    app.settings({ origin: "https://kits.example" });
    withPassword();
    const header = (await call(signIn, { body: right })).headers.get("set-cookie") ?? "";
    expect(header).toMatch(/^__Host-tinpenny=/);
    expect(header).toContain("Secure");
    expect(header).toContain("Path=/");
    expect(header).not.toContain("Domain");
  });

  it("ends the session the request came with", async () => {
    const person = withPassword();
    await call(signIn, { as: person, body: right });
    expect((await call(readAccount, { as: person })).status).toBe(401);
  });

  it("answers the same to a wrong password, an unknown address and a person without a password", async () => {
    withPassword();
    app.person(undefined, undefined, { email: "link@example.org", passwordHash: null });
    const answers = await Promise.all([
      call(signIn, { body: wrong }),
      call(signIn, { body: { ...right, email: "nobody@example.org" } }),
      call(signIn, { body: { ...right, email: "link@example.org" } }),
    ]);
    for (const answer of answers) {
      expect(answer.status).toBe(401);
      expect(answer.body).toEqual(answers[0]?.body);
      expect([...answer.headers]).toEqual([...(answers[0]?.headers ?? [])]);
    }
  });

  it("refuses another site, and fields that are wrong", async () => {
    expect((await call(signIn, { body: right, origin: "https://elsewhere.example" })).status).toBe(403);
    const answer = await call(signIn, { body: { email: "ines", password: "" } });
    expect(answer.problem?.errors?.map(({ at }) => at)).toEqual(["email", "password"]);
  });
});

describe("limits on signing in", () => {
  const attempts = async (times: number, asking: Asking) => {
    const answers = [];
    for (let i = 0; i < times; i++) answers.push((await call(signIn, asking)).status);
    return answers;
  };

  it("stop the sixth attempt at an account from one address for a quarter of an hour", async () => {
    withPassword();
    expect(await attempts(6, { body: wrong })).toEqual([401, 401, 401, 401, 401, 429]);
    const refused = await call(signIn, { body: right });
    expect(refused.status).toBe(429);
    expect(refused.headers.get("retry-after")).toBe("900");
    expect(refused.problem?.detail).toBe("Wait 15 minutes, then try again.");
    expect((await call(signIn, { body: right, address: "198.51.100.7" })).status).toBe(200);
    app.pass(15 * MINUTE);
    expect((await call(signIn, { body: right })).status).toBe(200);
  });

  it("count the same for an address nobody has", async () => {
    const body = { ...right, email: "nobody@example.org" };
    expect(await attempts(6, { body })).toEqual([401, 401, 401, 401, 401, 429]);
  });
});

describe("the second factor", () => {
  function withFactor(): { person: TestPerson; codes: string[] } {
    const id = "person0with0codes";
    const person = app.person(undefined, undefined, {
      ...{ id, email: "ines@example.org", passwordHash },
      totpSecret: newTotpSecret(id),
      totpConfirmedAt: app.now,
    });
    const codes = newRecoveryCodes();
    const hashes = codes.map((code) => recoveryCodeHash(id, code));
    replaceRecoveryCodes(app.db, id, hashes);
    return { person, codes };
  }
  const half = async () => {
    const answer = await call(signIn, { body: right });
    expect(answer.body).toEqual({ next: "second-factor" });
    return cookieOf(answer.headers.get("set-cookie"));
  };

  it("is asked after the password, and opens nothing before", async () => {
    withFactor();
    const cookie = await half();
    expect((await call(readAccount, { cookie })).problem?.code).toBe("second-factor-needed");
  });

  it("takes a recovery code once, tells the person, and gives a new cookie", async () => {
    const { codes } = withFactor();
    const first = await half();
    const code = codes[3]?.toUpperCase();
    const answer = await call(finish, { cookie: first, body: { code } });
    expect(answer.body).toEqual({ next: "done" });
    const cookie = cookieOf(answer.headers.get("set-cookie"));
    expect(cookie).not.toBe(first);
    expect((await call(readAccount, { cookie })).status).toBe(200);
    expect((await call(finish, { cookie: first, body: { code } })).status).toBe(401);
    expect((await call(finish, { cookie: await half(), body: { code } })).status).toBe(422);
    expect((await app.letters()).map(({ subject }) => subject)).toEqual(["A recovery code was used"]);
  });

  it("stops after five wrong codes, whatever address they come from and however often one signs in", async () => {
    const { person, codes } = withFactor();
    const half = () => app.signIn(person, false);
    for (let i = 0; i < 5; i++) {
      const asking = { cookie: half(), body: { code: "000000" }, address: `198.51.100.${i}` };
      expect((await call(finish, asking)).status).toBe(422);
    }
    expect((await call(finish, { cookie: half(), body: { code: codes[0] } })).status).toBe(429);
    app.pass(15 * MINUTE);
    expect((await call(finish, { cookie: half(), body: { code: codes[0] } })).status).toBe(200);
  });

  it("has to come within ten minutes of the password", async () => {
    const { codes } = withFactor();
    const cookie = await half();
    app.pass(10 * MINUTE);
    expect((await call(finish, { cookie, body: { code: codes[0] } })).status).toBe(401);
  });

  it("is not for those who are not signed in at all, nor for scripts", async () => {
    expect((await call(finish, { body: { code: "000000" } })).status).toBe(401);
    expect((await call(finish, { token: "a", body: { code: "000000" } })).problem?.code).toBe(
      "not-for-scripts",
    );
  });
});

describe("signing out", () => {
  it("ends the session and empties the cookie", async () => {
    const person = app.person();
    const answer = await call(signOut, { as: person });
    expect([answer.status, answer.headers.get("location")]).toEqual([303, "/sign-in"]);
    expect(answer.headers.get("set-cookie")).toMatch(/^tinpenny=; .*Max-Age=0/);
    expect((await call(readAccount, { as: person })).status).toBe(401);
  });

  it("can be done while the second factor is still owed", async () => {
    const cookie = app.signIn(app.person(), false);
    expect((await call(signOut, { cookie })).status).toBe(303);
    expect((await call(signOutEverywhere, { cookie })).status).toBe(401);
  });

  it("everywhere ends every session of the person and nobody else's", async () => {
    const [person, other] = [app.person(), app.person()];
    const elsewhere = app.signIn(person);
    expect((await call(signOutEverywhere, { as: person })).status).toBe(204);
    expect((await call(readAccount, { cookie: elsewhere })).status).toBe(401);
    expect((await call(readAccount, { as: person })).status).toBe(401);
    expect((await call(readAccount, { as: other })).status).toBe(200);
  });

  it("does not happen because another site asks", async () => {
    const person = app.person();
    expect((await call(signOut, { as: person, origin: "https://elsewhere.example" })).status).toBe(403);
    expect((await call(readAccount, { as: person })).status).toBe(200);
  });
});
