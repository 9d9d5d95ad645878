import { base32 } from "oslo/encoding";
import { generateHOTP } from "oslo/otp";
import { beforeAll, describe, expect, it } from "vitest";
import { recoveryCodes, users } from "#db/schema/people.ts";
import { POST as confirmAgain } from "#src/pages/api/account/confirmation.ts";
import { POST as changeEmail } from "#src/pages/api/account/email.ts";
import { PUT as changePassword } from "#src/pages/api/account/password.ts";
import { POST as renewCodes } from "#src/pages/api/account/recovery-codes.ts";
import { POST as turnOff } from "#src/pages/api/account/second-factor/off.ts";
import { POST as begin, PUT as confirmFactor } from "#src/pages/api/account/second-factor.ts";
import { DELETE as endOne } from "#src/pages/api/account/sessions/[session].ts";
import { DELETE as endOthers, GET as sessions } from "#src/pages/api/account/sessions.ts";
import { PATCH as change, GET as read } from "#src/pages/api/account.ts";
import { POST as confirm } from "#src/pages/api/confirm.ts";
import { POST as finish } from "#src/pages/api/sign-in/second-factor.ts";
import { POST as signIn } from "#src/pages/api/sign-in.ts";
import { hashPassword } from "#src/server/password.ts";
import { call, cookieOf, type TestPerson, testApp, tokenIn } from "#tests/support/app.ts";

const app = testApp();
const MINUTE = 60_000;
const PASSWORD = "nine brown parcels by noon";
const NEW_PASSWORD = "seven green kettles on a shelf";
let passwordHash: string;
beforeAll(async () => {
  passwordHash = await hashPassword(PASSWORD);
});
const ines = (over = {}) =>
  app.person(undefined, undefined, { email: "ines@example.org", name: "Ines", passwordHash, ...over });

describe("reading and changing one's account", () => {
  it("shows what is one's own, and neither hash nor secret", async () => {
    const person = ines({ totpSecret: "sealed-secret" });
    const { body } = await call(read, { as: person });
    expect(body).toEqual({
      ...{ id: person.id, name: "Ines", email: "ines@example.org", emailConfirmed: true, hasPassword: true },
      ...{ secondFactor: false, recoveryCodesLeft: 0, singleKeys: true, identity: null, version: 1 },
    });
  });

  it("changes name and keys, and shows both values on a clash", async () => {
    const person = ines();
    const first = await call(change, {
      as: person,
      body: { name: "Ines M.", singleKeys: false, version: 1 },
    });
    expect(first.body).toMatchObject({ name: "Ines M.", singleKeys: false, version: 2 });
    const second = await call(change, { as: person, body: { name: "I.", version: 1 } });
    expect(second.status).toBe(409);
    expect(second.problem?.current).toMatchObject({ name: "Ines M.", version: 2 });
  });

  it("is not for strangers, other sites, unfinished sign-ins or scripts", async () => {
    const person = ines();
    const body = { name: "X", version: 1 };
    expect((await call(change, { body })).status).toBe(401);
    expect((await call(change, { as: person, body, origin: "https://elsewhere.example" })).status).toBe(403);
    expect((await call(change, { cookie: app.signIn(person, false), body })).status).toBe(401);
    expect((await call(change, { token: "abc", body })).problem?.code).toBe("not-for-scripts");
  });
});

describe("changing the address", () => {
  const body = { email: "new@example.org", password: PASSWORD };

  it("takes the password and a letter to the new address, and tells the old one", async () => {
    const person = ines();
    expect((await call(changeEmail, { as: person, body })).status).toBe(202);
    const [letter] = await app.letters();
    expect(letter?.to).toBe("new@example.org");
    expect((await call(read, { as: person })).body.email).toBe("ines@example.org");
    await call(confirm, { body: { token: tokenIn(letter) } });
    expect((await call(read, { as: person })).body.email).toBe("new@example.org");
    const told = (await app.letters()).at(-1);
    expect([told?.to, told?.subject]).toEqual(["ines@example.org", "Your email address was changed"]);
  });

  it("does not happen without the right password", async () => {
    const person = ines();
    const wrong = await call(changeEmail, { as: person, body: { ...body, password: "not it at all" } });
    expect(wrong.problem?.errors?.[0]?.at).toBe("password");
    expect((await call(changeEmail, { as: person, body: { email: body.email } })).status).toBe(422);
    expect(await app.letters()).toEqual([]);
  });

  it("answers the same when somebody has the address, and sends nothing", async () => {
    const person = ines();
    app.person(undefined, undefined, { email: "taken@example.org" });
    const answer = await call(changeEmail, { as: person, body: { ...body, email: "taken@example.org" } });
    expect([answer.status, answer.body]).toEqual([202, {}]);
    expect(await app.letters()).toEqual([]);
  });

  it("fails if somebody took the address before it was confirmed", async () => {
    const person = ines();
    await call(changeEmail, { as: person, body });
    const [letter] = await app.letters();
    app.person(undefined, undefined, { email: "new@example.org" });
    expect((await call(confirm, { body: { token: tokenIn(letter) } })).status).toBe(410);
  });

  it("sends the confirmation again, but not for an address that is confirmed", async () => {
    const person = ines({ emailConfirmedAt: null });
    await call(confirmAgain, { as: person });
    const [letter] = await app.letters();
    await call(confirm, { body: { token: tokenIn(letter) } });
    await call(confirmAgain, { as: person });
    expect(await app.letters()).toHaveLength(1);
  });
});

describe("changing the password", () => {
  it("takes the old one, ends other sign-ins and tells the person", async () => {
    const person = ines();
    const elsewhere = app.signIn(person);
    const body = { password: PASSWORD, newPassword: NEW_PASSWORD };
    expect((await call(changePassword, { as: person, body })).status).toBe(204);
    expect((await call(read, { as: person })).status).toBe(200);
    expect((await call(read, { cookie: elsewhere })).status).toBe(401);
    expect((await app.letters())[0]?.subject).toBe("Your password was changed");
  });

  it("counts wrong passwords like attempts at signing in", async () => {
    const person = ines();
    const wrong = { as: person, body: { password: "not it at all", newPassword: NEW_PASSWORD } };
    const statuses = [];
    for (let i = 0; i < 6; i++) statuses.push((await call(changePassword, wrong)).status);
    expect(statuses).toEqual([422, 422, 422, 422, 422, 429]);
  });

  it("lets a person without one set it within a quarter of an hour of signing in", async () => {
    const person = ines({ passwordHash: null });
    app.pass(15 * MINUTE + 1);
    const late = await call(changePassword, { as: person, body: { newPassword: NEW_PASSWORD } });
    expect(late.problem?.code).toBe("sign-in-again");
    const cookie = app.signIn(person);
    expect((await call(changePassword, { cookie, body: { newPassword: NEW_PASSWORD } })).status).toBe(204);
    expect((await call(read, { cookie })).body.hasPassword).toBe(true);
  });
});

describe("one's own sign-ins", () => {
  it("are listed without their hashes, and ended one by one or all others at once", async () => {
    const person = ines();
    app.pass(MINUTE);
    const other = app.signIn(person);
    app.signIn(person, false);
    const { body } = await call(sessions, { as: person });
    expect(body.map(({ current, browser }) => [current, browser])).toEqual([
      [false, "A browser for tests"],
      [true, "A browser for tests"],
    ]);
    expect(body[0]?.id).toMatch(/^[0-9a-f]{16}$/);
    expect((await call(endOne, { as: person, params: { session: body[0]?.id ?? "" } })).status).toBe(204);
    expect((await call(read, { cookie: other })).status).toBe(401);
    const third = app.signIn(person);
    expect((await call(endOthers, { as: person })).status).toBe(204);
    expect((await call(read, { cookie: third })).status).toBe(401);
    expect((await call(read, { as: person })).status).toBe(200);
  });

  it("are nobody else's to end", async () => {
    const [person, other] = [ines(), app.person()];
    const { body } = await call(sessions, { as: other });
    const params = { session: body[0]?.id ?? "" };
    expect((await call(endOne, { as: person, params })).status).toBe(404);
    expect((await call(read, { as: other })).status).toBe(200);
  });
});

describe("setting up the second factor", () => {
  const codeNow = (secret: string) =>
    generateHOTP(base32.decode(secret, { strict: false }), Math.floor(app.now / 30_000));

  async function setUp(person: TestPerson) {
    const { secret } = (await call(begin, { as: person, body: { password: PASSWORD } })).body;
    const answer = await call(confirmFactor, { as: person, body: { code: await codeNow(secret) } });
    return { secret, codes: answer.body.recoveryCodes };
  }

  it("asks for it at sign-in only once a code was right; then ends other sign-ins and tells the person", async () => {
    const person = ines();
    const elsewhere = app.signIn(person);
    const { secret, picture } = (await call(begin, { as: person, body: { password: PASSWORD } })).body;
    expect(picture).toContain("<svg");
    const body = { email: "ines@example.org", password: PASSWORD };
    expect((await call(signIn, { body })).body).toEqual({ next: "done" });
    expect((await call(confirmFactor, { as: person, body: { code: "000000" } })).status).toBe(422);
    const code = await codeNow(secret);
    const confirmed = await call(confirmFactor, { as: person, body: { code } });
    expect(confirmed.body.recoveryCodes).toHaveLength(10);
    expect((await call(read, { cookie: elsewhere })).status).toBe(401);
    expect((await call(read, { as: person })).body).toMatchObject({
      secondFactor: true,
      recoveryCodesLeft: 10,
    });
    expect((await app.letters()).at(-1)?.subject).toBe("The second factor is on");

    const half = await call(signIn, { body });
    expect(half.body).toEqual({ next: "second-factor" });
    const cookie = cookieOf(half.headers.get("set-cookie"));
    expect((await call(finish, { cookie, body: { code } })).status).toBe(422);
    app.pass(30_000);
    expect((await call(finish, { cookie, body: { code: await codeNow(secret) } })).status).toBe(200);
  });

  it("stores neither the secret nor the codes as they are", async () => {
    const { secret, codes } = await setUp(ines());
    const stored = JSON.stringify([
      app.db.select().from(users).all(),
      app.db.select().from(recoveryCodes).all(),
    ]);
    expect(stored).not.toContain(secret);
    for (const code of codes) expect(stored).not.toContain(code);
  });

  it("needs the password to begin, to turn off and for new codes", async () => {
    const person = ines();
    const wrong = { as: person, body: { password: "not it at all" } };
    expect((await call(begin, wrong)).status).toBe(422);
    await setUp(person);
    expect((await call(turnOff, wrong)).status).toBe(422);
    expect((await call(renewCodes, wrong)).status).toBe(422);
    expect((await call(read, { as: person })).body.secondFactor).toBe(true);
  });

  it("cannot be begun twice, nor confirmed without a beginning", async () => {
    const person = ines();
    const none = await call(confirmFactor, { as: person, body: { code: "000000" } });
    expect(none.problem?.code).toBe("second-factor-off");
    expect((await call(renewCodes, { as: person, body: { password: PASSWORD } })).status).toBe(409);
    await setUp(person);
    const again = await call(begin, { as: person, body: { password: PASSWORD } });
    expect(again.problem?.code).toBe("second-factor-on");
    const confirmed = await call(confirmFactor, { as: person, body: { code: "000000" } });
    expect(confirmed.problem?.code).toBe("second-factor-on");
  });

  it("can be turned off, which tells the person and forgets the codes", async () => {
    const person = ines();
    await setUp(person);
    expect((await call(turnOff, { as: person, body: { password: PASSWORD } })).status).toBe(204);
    expect((await call(read, { as: person })).body).toMatchObject({
      secondFactor: false,
      recoveryCodesLeft: 0,
    });
    expect((await app.letters()).at(-1)?.subject).toBe("The second factor is off");
    const body = { email: "ines@example.org", password: PASSWORD };
    expect((await call(signIn, { body })).body).toEqual({ next: "done" });
  });

  it("gives new recovery codes, and the old ones stop working", async () => {
    const person = ines();
    const { codes } = await setUp(person);
    const fresh = (await call(renewCodes, { as: person, body: { password: PASSWORD } })).body.recoveryCodes;
    const half = await call(signIn, { body: { email: "ines@example.org", password: PASSWORD } });
    const cookie = cookieOf(half.headers.get("set-cookie"));
    expect((await call(finish, { cookie, body: { code: codes[0] } })).status).toBe(422);
    expect((await call(finish, { cookie, body: { code: fresh[0] } })).status).toBe(200);
  });
});
