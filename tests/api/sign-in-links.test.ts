import { beforeAll, describe, expect, it } from "vitest";
import { attemptCounts, oneTimeTokens, users } from "#db/schema/people.ts";
import { GET as readAccount } from "#src/pages/api/account.ts";
import { POST as confirm } from "#src/pages/api/confirm.ts";
import { POST as makeFirstOwner } from "#src/pages/api/first-owner.ts";
import { POST as forgotten } from "#src/pages/api/forgotten.ts";
import { POST as reset } from "#src/pages/api/reset.ts";
import { POST as useLink } from "#src/pages/api/sign-in/link.ts";
import { POST as sendLink } from "#src/pages/api/sign-in/send-link.ts";
import { POST as signIn } from "#src/pages/api/sign-in.ts";
import { hashPassword, isPassword } from "#src/server/password.ts";
import { userById } from "#src/server/store/user.ts";
import { call, cookieOf, testApp, tokenIn } from "#tests/support/app.ts";

const app = testApp();
const MINUTE = 60_000;
const NEW_PASSWORD = "seven green kettles on a shelf";
let passwordHash: string;
beforeAll(async () => {
  passwordHash = await hashPassword("nine brown parcels by noon");
});

const ines = (over = {}) =>
  app.person(undefined, undefined, { email: "ines@example.org", name: "Ines", passwordHash, ...over });

describe.each([
  ["a link to sign in", sendLink],
  ["a link for a new password", forgotten],
])("asking for %s", (_, route) => {
  it("gives the same answer whether the address is known, and a letter only if it is", async () => {
    ines();
    const known = await call(route, { body: { email: "Ines@example.org" } });
    const unknown = await call(route, { body: { email: "nobody@example.org" } });
    expect(known.status).toBe(202);
    expect([unknown.status, unknown.body]).toEqual([known.status, known.body]);
    expect([...unknown.headers]).toEqual([...known.headers]);
    expect((await app.letters()).map(({ to }) => to)).toEqual(["ines@example.org"]);
  });

  it("does the same work before the reply for both: nothing but counting", async () => {
    ines();
    await call(route, { body: { email: "ines@example.org" } });
    expect(app.db.select().from(oneTimeTokens).all()).toEqual([]);
    expect(app.db.select().from(attemptCounts).all()).toHaveLength(2);
  });

  it("stops after four letters to one address in an hour, known or not", async () => {
    ines();
    for (const email of ["ines@example.org", "nobody@example.org"]) {
      const statuses = [];
      for (let i = 0; i < 5; i++) statuses.push((await call(route, { body: { email } })).status);
      expect(statuses).toEqual([202, 202, 202, 202, 429]);
    }
    app.pass(60 * MINUTE);
    expect((await call(route, { body: { email: "ines@example.org" } })).status).toBe(202);
  });

  it("is refused from another site", async () => {
    const asking = { body: { email: "ines@example.org" }, origin: "https://elsewhere.example" };
    expect((await call(route, asking)).status).toBe(403);
  });
});

describe("a link to sign in", () => {
  async function link(back?: string) {
    await call(sendLink, { body: { email: "ines@example.org", back } });
    return (await app.letters()).at(-1);
  }

  it("signs in once, and shows that the address is theirs", async () => {
    const person = ines({ emailConfirmedAt: null });
    const token = tokenIn(await link());
    const answer = await call(useLink, { body: { token } });
    expect(answer.body).toEqual({ next: "done" });
    const cookie = cookieOf(answer.headers.get("set-cookie"));
    expect((await call(readAccount, { cookie })).body).toMatchObject({ id: person.id, emailConfirmed: true });
    expect((await call(useLink, { body: { token } })).problem?.code).toBe("link-not-valid");
  });

  it("works for a quarter of an hour, and only the newest", async () => {
    ines();
    const older = tokenIn(await link());
    const newer = tokenIn(await link());
    expect((await call(useLink, { body: { token: older } })).status).toBe(410);
    app.pass(15 * MINUTE);
    expect((await call(useLink, { body: { token: newer } })).status).toBe(410);
  });

  it("still asks for the second factor", async () => {
    ines({ totpSecret: "sealed", totpConfirmedAt: app.now });
    const token = tokenIn(await link());
    expect((await call(useLink, { body: { token } })).body).toEqual({ next: "second-factor" });
  });

  it("is not stored, and does not work for another purpose", async () => {
    ines();
    const token = tokenIn(await link());
    expect(JSON.stringify(app.db.select().from(oneTimeTokens).all())).not.toContain(token);
    expect((await call(reset, { body: { token, password: NEW_PASSWORD } })).status).toBe(410);
    expect((await call(confirm, { body: { token } })).status).toBe(410);
    expect((await call(useLink, { body: { token } })).status).toBe(200);
  });

  it.each([
    ["/workshops/one?x=1", "&back=%2Fworkshops%2Fone%3Fx%3D1"],
    ["https://elsewhere.example/", ""],
    ["//elsewhere.example", ""],
    ["/\\elsewhere.example", ""],
    ["/api/sign-out", ""],
  ])("goes on to %s only if that is a page of ours", async (back, end) => {
    ines();
    const letter = await link(back);
    expect(letter?.text).toContain(`?token=${tokenIn(letter)}${end}\n`);
  });

  it("stops guesses after thirty from one address", async () => {
    const body = { token: "a".repeat(40) };
    const statuses = [];
    for (let i = 0; i < 31; i++) statuses.push((await call(useLink, { body })).status);
    expect(statuses.slice(29)).toEqual([410, 429]);
  });
});

describe("a link for a new password", () => {
  async function link() {
    await call(forgotten, { body: { email: "ines@example.org" } });
    return tokenIn((await app.letters()).at(-1));
  }

  it("sets it once, ends every other sign-in, and tells the person", async () => {
    const person = ines();
    const token = await link();
    const answer = await call(reset, { body: { token, password: NEW_PASSWORD } });
    expect(answer.body).toEqual({ next: "done" });
    expect((await call(readAccount, { as: person })).status).toBe(401);
    expect((await app.letters()).at(-1)?.subject).toBe("Your password was changed");
    expect((await call(reset, { body: { token, password: NEW_PASSWORD } })).status).toBe(410);
    const body = { email: "ines@example.org", password: NEW_PASSWORD };
    expect((await call(signIn, { body })).status).toBe(200);
  });

  it("does not go round the second factor", async () => {
    const person = ines({ totpSecret: "sealed", totpConfirmedAt: app.now });
    const answer = await call(reset, { body: { token: await link(), password: NEW_PASSWORD } });
    expect(answer.body).toEqual({ next: "second-factor" });
    expect(userById(app.db, person.id)?.totpConfirmedAt).not.toBeNull();
  });

  it.each(["elevensigns", "aaaaaaaaaaaaaaaa", "x".repeat(257)])(
    "refuses the password %s",
    async (password) => {
      ines();
      const token = await link();
      const answer = await call(reset, { body: { token, password } });
      expect(answer.problem?.errors?.[0]?.at).toBe("password");
      expect((await call(reset, { body: { token, password: NEW_PASSWORD } })).status).toBe(200);
    },
  );

  it("works for an hour", async () => {
    ines();
    const token = await link();
    app.pass(60 * MINUTE);
    expect((await call(reset, { body: { token, password: NEW_PASSWORD } })).status).toBe(410);
  });
});

describe("the first owner", () => {
  const body = {
    name: "Ines",
    email: "Ines@Example.org",
    password: NEW_PASSWORD,
    workshop: "Ferry Yard",
    currency: "EUR",
  };

  it("is made with a workshop, signed in, and asked to confirm the address", async () => {
    const answer = await call(makeFirstOwner, { body });
    expect(answer.body).toEqual({ next: "done" });
    const cookie = cookieOf(answer.headers.get("set-cookie"));
    expect((await call(readAccount, { cookie })).body).toMatchObject({
      email: "ines@example.org",
      emailConfirmed: false,
    });
    const [letter] = await app.letters();
    expect(letter?.to).toBe("ines@example.org");
    expect((await call(confirm, { body: { token: tokenIn(letter) } })).body).toEqual({
      email: "ines@example.org",
    });
    expect((await call(readAccount, { cookie })).body.emailConfirmed).toBe(true);
    const stored = app.db.select().from(users).get()?.passwordHash;
    expect(stored).toMatch(/^\$argon2id\$/);
    expect(await isPassword(stored, NEW_PASSWORD)).toBe(true);
  });

  it("is made only while there is nobody", async () => {
    app.person();
    const answer = await call(makeFirstOwner, { body });
    expect(answer.problem?.code).toBe("already-set-up");
    expect(app.db.select().from(users).all()).toHaveLength(1);
  });

  it("is made once, even when two ask at the same time", async () => {
    const answers = await Promise.all([
      call(makeFirstOwner, { body }),
      call(makeFirstOwner, { body: { ...body, email: "tom@example.org" } }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(app.db.select().from(users).all()).toHaveLength(1);
  });

  it("learns which fields are wrong", async () => {
    const answer = await call(makeFirstOwner, {
      body: { ...body, name: " ", currency: "EUX", password: "short" },
    });
    expect(answer.problem?.errors?.map(({ at }) => at).sort()).toEqual(["currency", "name", "password"]);
  });

  it("is refused from another site", async () => {
    expect((await call(makeFirstOwner, { body, origin: null })).status).toBe(403);
  });
});
