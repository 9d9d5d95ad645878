import { describe, expect, it } from "vitest";
import { activity } from "#db/schema/activity.ts";
import { invitations } from "#db/schema/guests.ts";
import { workshops } from "#db/schema/workshops.ts";
import { GET as readAccount } from "#src/pages/api/account.ts";
import { POST as accept, GET as see } from "#src/pages/api/invitation.ts";
import { DELETE as dropToken } from "#src/pages/api/workshops/[workshop]/access-tokens/[token].ts";
import { POST as makeToken, GET as tokens } from "#src/pages/api/workshops/[workshop]/access-tokens.ts";
import {
  PATCH as changeWorkshop,
  DELETE as removeWorkshop,
  GET as settings,
} from "#src/pages/api/workshops/[workshop]/index.ts";
import {
  POST as inviteAgain,
  DELETE as withdraw,
} from "#src/pages/api/workshops/[workshop]/invitations/[invitation].ts";
import { POST as invite, GET as listInvitations } from "#src/pages/api/workshops/[workshop]/invitations.ts";
import { DELETE as leave } from "#src/pages/api/workshops/[workshop]/membership.ts";
import { PUT as askToKits } from "#src/pages/api/workshops/[workshop]/people/[person]/kits.ts";
import { PATCH as giveRole, DELETE as remove } from "#src/pages/api/workshops/[workshop]/people/[person].ts";
import { GET as people } from "#src/pages/api/workshops/[workshop]/people.ts";
import { POST as beginWorkshop } from "#src/pages/api/workshops/index.ts";
import { setMailer } from "#src/server/mail.ts";
import { isGuestOf, membershipOf } from "#src/server/store/membership.ts";
import { call, cookieOf, testApp, tokenIn } from "#tests/support/app.ts";

const app = testApp();
const DAY = 24 * 60 * 60 * 1000;
const PASSWORD = "seven green kettles on a shelf";

function ferryYard() {
  const workshop = app.workshop();
  const owner = app.person("owner", workshop, { name: "Ines", email: "ines@example.org" });
  return { workshop, owner, params: { workshop: workshop.id } };
}
const actions = () =>
  app.db
    .select()
    .from(activity)
    .all()
    .map(({ action, subjectName, detail }) => [action, subjectName, detail]);

describe("an invitation", () => {
  const seller = { email: "Tom@example.org", role: "seller", kit: null };

  async function invited(body: object = seller) {
    const place = ferryYard();
    const answer = await call(invite, { as: place.owner, params: place.params, body });
    const letter = (await app.letters()).at(-1);
    return { ...place, answer, letter, token: tokenIn(letter) };
  }

  it("goes out by letter; the owner does not learn the link", async () => {
    const { answer, letter, token, owner, params } = await invited();
    expect(answer.status).toBe(201);
    expect(answer.body).toMatchObject({
      email: "tom@example.org",
      role: "seller",
      kit: null,
      by: "Ines",
      ended: false,
    });
    expect(letter?.to).toBe("tom@example.org");
    expect(letter?.text).toContain("Ines asks you to Ferry Yard on Tinpenny, as seller.");
    expect(JSON.stringify(answer.body)).not.toContain(token);
    expect(JSON.stringify(app.db.select().from(invitations).all())).not.toContain(token);
    const listed = await call(listInvitations, { as: owner, params });
    expect(listed.body).toEqual([answer.body]);
  });

  it("shows its holder what it is, and is taken with a new account whose address is confirmed", async () => {
    const { token, workshop } = await invited();
    const seen = await call(see, { query: { token }, method: "GET" });
    expect(seen.body).toEqual({
      ...{ workshop: "Ferry Yard", by: "Ines", email: "tom@example.org", role: "seller", kit: null },
      hasAccount: false,
    });
    const missing = await call(accept, { body: { token } });
    expect(missing.problem?.errors?.map(({ at }) => at)).toEqual(["name", "password"]);
    const answer = await call(accept, { body: { token, name: "Tom", password: PASSWORD } });
    expect(answer.body).toEqual({ workshop: workshop.id });
    const cookie = cookieOf(answer.headers.get("set-cookie"));
    const account = (await call(readAccount, { cookie })).body;
    expect(account).toMatchObject({ name: "Tom", email: "tom@example.org", emailConfirmed: true });
    expect(membershipOf(app.db, workshop.id, account.id)?.membership.role).toBe("seller");
    expect((await call(accept, { body: { token, name: "Tim", password: PASSWORD } })).status).toBe(410);
    expect(actions()).toEqual([
      ["invitation.send", "seller", {}],
      ["person.join", "Tom", { role: [null, "seller"] }],
    ]);
  });

  it("is taken by the person who is signed in, and asks others with an account to sign in first", async () => {
    const { token, workshop } = await invited();
    const tom = app.person(undefined, undefined, { email: "tom@example.org" });
    expect((await call(see, { query: { token }, method: "GET" })).body.hasAccount).toBe(true);
    const stranger = await call(accept, { body: { token, name: "Tom", password: PASSWORD } });
    expect(stranger.problem?.code).toBe("account-exists");
    expect((await call(accept, { as: tom, body: { token } })).body).toEqual({ workshop: workshop.id });
    expect(membershipOf(app.db, workshop.id, tom.id)?.membership.role).toBe("seller");
  });

  it("is not taken by a sign-in that waits for the second factor", async () => {
    const { token } = await invited();
    const tom = app.person(undefined, undefined, { email: "tom@example.org" });
    const cookie = app.signIn(tom, false);
    expect((await call(accept, { cookie, body: { token } })).problem?.code).toBe("account-exists");
  });

  it("asks a co-builder to one kit, which then is all they see", async () => {
    const { workshop, owner, params } = ferryYard();
    const [asked, other] = [app.kit(workshop, { name: "Dew Lantern" }), app.kit(workshop)];
    await call(invite, {
      as: owner,
      params,
      body: { email: "mara@example.org", role: "co-builder", kit: asked.id },
    });
    const letter = (await app.letters()).at(-1);
    expect(letter?.text).toContain(
      "Ines asks you to the kit Dew Lantern of Ferry Yard on Tinpenny, as co-builder.",
    );
    const mara = app.person(undefined, undefined, { email: "mara@example.org" });
    await call(accept, { as: mara, body: { token: tokenIn(letter) } });
    expect(isGuestOf(app.db, asked.id, mara.id)).toBe(true);
    expect(isGuestOf(app.db, other.id, mara.id)).toBe(false);
  });

  it("needs a kit for a co-builder, of this workshop, and none for others", async () => {
    const { owner, params, workshop } = ferryYard();
    const elsewhere = app.kit(app.workshop());
    const kits = [null, elsewhere.id, "nothing"];
    for (const kit of kits) {
      const body = { email: "mara@example.org", role: "co-builder", kit };
      const answer = await call(invite, { as: owner, params, body });
      expect(answer.problem?.errors?.[0]?.at).toBe("kit");
    }
    const body = { email: "mara@example.org", role: "seller", kit: app.kit(workshop).id };
    expect((await call(invite, { as: owner, params, body })).status).toBe(422);
    expect(await app.letters()).toEqual([]);
  });

  it("does not change the role of somebody who is here already", async () => {
    const { owner, params, workshop } = ferryYard();
    app.person("designer", workshop, { name: "Tom", email: "tom@example.org" });
    const answer = await call(invite, { as: owner, params, body: seller });
    expect(answer.problem?.title).toBe("Tom is in this workshop already.");
  });

  it("runs out after a week, can be sent again with a new link, and can be taken back", async () => {
    const { token, owner, params, answer } = await invited();
    app.pass(7 * DAY);
    expect((await call(accept, { body: { token, name: "Tom", password: PASSWORD } })).status).toBe(410);
    const cookie = app.signIn(owner);
    expect((await call(listInvitations, { cookie, params })).body[0]?.ended).toBe(true);
    const at = { ...params, invitation: answer.body.id };
    expect((await call(inviteAgain, { cookie, params: at })).body.ended).toBe(false);
    const second = tokenIn((await app.letters()).at(-1));
    expect(second).not.toBe(token);
    expect((await call(see, { query: { token }, method: "GET" })).status).toBe(410);
    expect((await call(see, { query: { token: second }, method: "GET" })).status).toBe(200);
    expect((await call(withdraw, { cookie, params: at })).status).toBe(204);
    expect((await call(see, { query: { token: second }, method: "GET" })).status).toBe(410);
    expect((await call(withdraw, { cookie, params: at })).status).toBe(404);
  });

  it("replaces an open one to the same address", async () => {
    const { token, owner, params } = await invited();
    await call(invite, { as: owner, params, body: { ...seller, role: "designer" } });
    expect((await call(see, { query: { token }, method: "GET" })).status).toBe(410);
    expect((await call(listInvitations, { as: owner, params })).body.map(({ role }) => role)).toEqual([
      "designer",
    ]);
  });

  it("goes to one address at most five times a day", async () => {
    const { owner, params } = ferryYard();
    const statuses = [];
    for (let i = 0; i < 6; i++)
      statuses.push((await call(invite, { as: owner, params, body: seller })).status);
    expect(statuses).toEqual([201, 201, 201, 201, 201, 429]);
  });

  it("says when its letter could not be sent, and stays to be sent again", async () => {
    const { owner, params } = ferryYard();
    app.settings({ host: "0.0.0.0" });
    setMailer();
    const answer = await call(invite, { as: owner, params, body: seller });
    expect(answer.problem?.code).toBe("mail-not-set-up");
    expect((await call(listInvitations, { as: owner, params })).body).toHaveLength(1);
  });

  it("of another workshop is not found", async () => {
    const { answer } = await invited();
    const other = app.workshop();
    const owner = app.person("owner", other);
    const params = { workshop: other.id, invitation: answer.body.id };
    expect((await call(withdraw, { as: owner, params })).status).toBe(404);
    expect((await call(inviteAgain, { as: owner, params })).status).toBe(404);
  });
});

describe("the people of a workshop", () => {
  it("are listed for owners with the kits co-builders were asked to", async () => {
    const { workshop, owner, params } = ferryYard();
    const kit = app.kit(workshop, { name: "Dew Lantern" });
    const mara = app.person("co-builder", workshop, { name: "Mara" });
    app.guest(mara, kit);
    const { body } = await call(people, { as: owner, params });
    expect(body).toEqual([
      {
        id: owner.id,
        name: "Ines",
        email: "ines@example.org",
        role: "owner",
        version: 1,
        kits: [],
        you: true,
      },
      {
        ...{ id: mara.id, name: "Mara", email: mara.email, role: "co-builder", version: 1 },
        ...{ kits: [{ id: kit.id, name: "Dew Lantern" }], you: false },
      },
    ]);
  });

  it("get another role, which is written down; two changes at once are a clash", async () => {
    const { workshop, owner, params } = ferryYard();
    const tom = app.person("seller", workshop, { name: "Tom" });
    const at = { ...params, person: tom.id };
    const change = (role: string, version: number) =>
      call(giveRole, { as: owner, params: at, body: { role, version } });
    expect((await change("designer", 1)).status).toBe(200);
    const clash = await change("co-builder", 1);
    expect(clash.status).toBe(409);
    expect(clash.problem?.current).toMatchObject({ role: "designer", version: 2 });
    expect(actions()).toEqual([["person.role", "Tom", { role: ["seller", "designer"] }]]);
  });

  it("keep at least one owner", async () => {
    const { workshop, owner, params } = ferryYard();
    const at = { ...params, person: owner.id };
    const demoted = { as: owner, params: at, body: { role: "designer", version: 1 } };
    expect((await call(giveRole, demoted)).problem?.title).toBe("Ines is the only owner of this workshop.");
    expect((await call(remove, { as: owner, params: at })).problem?.code).toBe("last-owner");
    expect((await call(leave, { as: owner, params })).problem?.code).toBe("last-owner");
    app.person("owner", workshop);
    expect((await call(leave, { as: owner, params })).status).toBe(204);
    expect((await call(people, { as: owner, params })).status).toBe(404);
    expect(actions()).toEqual([["person.leave", "Ines", { role: ["owner", null] }]]);
  });

  it("lose everything when they are taken out", async () => {
    const { workshop, owner, params } = ferryYard();
    const kit = app.kit(workshop);
    const mara = app.person("co-builder", workshop);
    app.guest(mara, kit);
    const made = await call(makeToken, { as: mara, params, body: { name: "script", days: 30 } });
    expect((await call(remove, { as: owner, params: { ...params, person: mara.id } })).status).toBe(204);
    expect(isGuestOf(app.db, kit.id, mara.id)).toBe(false);
    expect((await call(tokens, { token: made.body.token, params })).status).toBe(401);
    expect((await call(tokens, { as: mara, params })).status).toBe(404);
    app.join(mara, workshop, "co-builder");
    expect(isGuestOf(app.db, kit.id, mara.id)).toBe(false);
  });

  it("who are co-builders are asked to kits of this workshop", async () => {
    const { workshop, owner, params } = ferryYard();
    const [one, two] = [app.kit(workshop), app.kit(workshop)];
    const mara = app.person("co-builder", workshop);
    app.guest(mara, one);
    const ask = (person: string, kits: string[]) =>
      call(askToKits, { as: owner, params: { ...params, person }, body: { kits } });
    expect((await ask(mara.id, [two.id, two.id])).status).toBe(200);
    expect([isGuestOf(app.db, one.id, mara.id), isGuestOf(app.db, two.id, mara.id)]).toEqual([false, true]);
    const elsewhere = app.kit(app.workshop());
    expect((await ask(mara.id, [one.id, elsewhere.id])).problem?.errors?.[0]?.at).toBe("kits.1");
    expect(isGuestOf(app.db, two.id, mara.id)).toBe(true);
    expect((await ask(owner.id, [one.id])).status).toBe(422);
    expect((await ask(app.person().id, [one.id])).status).toBe(404);
  });

  it("who stop being co-builders see every kit; who become one again see none", async () => {
    const { workshop, owner, params } = ferryYard();
    const kit = app.kit(workshop);
    const mara = app.person("co-builder", workshop);
    app.guest(mara, kit);
    const at = { ...params, person: mara.id };
    await call(giveRole, { as: owner, params: at, body: { role: "seller", version: 1 } });
    await call(giveRole, { as: owner, params: at, body: { role: "co-builder", version: 2 } });
    expect(isGuestOf(app.db, kit.id, mara.id)).toBe(false);
  });

  it("are managed at a browser, not by a script", async () => {
    const { owner, params, workshop } = ferryYard();
    const tom = app.person("seller", workshop);
    const { token } = (await call(makeToken, { as: owner, params, body: { name: "script", days: 1 } })).body;
    const at = { ...params, person: tom.id };
    expect((await call(people, { token, params })).status).toBe(200);
    expect((await call(remove, { token, params: at })).problem?.code).toBe("not-for-scripts");
    const body = { role: "owner", version: 1 };
    expect((await call(giveRole, { token, params: at, body })).problem?.code).toBe("not-for-scripts");
    expect((await call(makeToken, { token, params, body: { name: "x", days: 1 } })).status).toBe(403);
  });
});

describe("access tokens", () => {
  it("are shown once, stored as a hash, and speak for one person in one workshop until they run out", async () => {
    const { workshop, owner, params } = ferryYard();
    const other = app.workshop();
    app.join(owner, other, "owner");
    const made = await call(makeToken, { as: owner, params, body: { name: "Price script", days: 30 } });
    expect(made.status).toBe(201);
    const { token, ...listed } = made.body;
    expect(listed).toMatchObject({ name: "Price script", expiresAt: app.now + 30 * DAY, lastUsedAt: null });
    expect((await call(tokens, { as: owner, params })).body).toEqual([listed]);
    expect((await call(people, { token, params: { workshop: workshop.id } })).status).toBe(200);
    expect((await call(people, { token, params: { workshop: other.id } })).status).toBe(404);
    expect((await call(tokens, { as: owner, params })).body[0]?.lastUsedAt).toBe(app.now);
    app.pass(30 * DAY);
    expect((await call(people, { token, params })).status).toBe(401);
  });

  it("are removed by their person only", async () => {
    const { workshop, owner, params } = ferryYard();
    const tom = app.person("seller", workshop);
    const { id, token } = (await call(makeToken, { as: tom, params, body: { name: "x", days: 1 } })).body;
    const at = { ...params, token: id };
    expect((await call(dropToken, { as: owner, params: at })).status).toBe(404);
    expect((await call(dropToken, { as: tom, params: at })).status).toBe(204);
    expect((await call(tokens, { token, params })).status).toBe(401);
  });

  it.each([0, 367, 1.5])("do not last %d days", async (days) => {
    const { owner, params } = ferryYard();
    const answer = await call(makeToken, { as: owner, params, body: { name: "x", days } });
    expect(answer.problem?.errors?.[0]?.at).toBe("days");
  });
});

describe("a workshop's settings", () => {
  it("are changed by an owner; the currency only while there are no kits", async () => {
    const { workshop, owner, params } = ferryYard();
    const first = await call(changeWorkshop, {
      ...{ as: owner, params, body: { name: "Quay Yard", currency: "SEK", version: 1 } },
    });
    expect(first.body).toMatchObject({ name: "Quay Yard", currency: "SEK", version: 2 });
    app.kit(workshop);
    const second = await call(changeWorkshop, { as: owner, params, body: { currency: "EUR", version: 2 } });
    expect(second.problem?.title).toBe("The currency stays SEK while the workshop has kits.");
    const clash = await call(changeWorkshop, { as: owner, params, body: { name: "Old Yard", version: 1 } });
    expect(clash.problem?.current).toMatchObject({ name: "Quay Yard", version: 2, changedBy: "Ines" });
    expect((await call(settings, { as: owner, params })).body.name).toBe("Quay Yard");
  });

  it("end with the workshop, once its name was typed", async () => {
    const { owner, params } = ferryYard();
    const other = app.workshop();
    const wrong = await call(removeWorkshop, { as: owner, params, body: { name: "Ferry" } });
    expect(wrong.problem?.errors?.[0]?.at).toBe("name");
    expect((await call(removeWorkshop, { as: owner, params, body: { name: "Ferry Yard" } })).status).toBe(
      204,
    );
    expect(
      app.db
        .select()
        .from(workshops)
        .all()
        .map(({ id }) => id),
    ).toEqual([other.id]);
  });

  it("begin with a person who becomes its owner", async () => {
    const person = app.person();
    const made = await call(beginWorkshop, { as: person, body: { name: "Quay Yard", currency: "EUR" } });
    expect(made.status).toBe(201);
    expect(membershipOf(app.db, made.body.id, person.id)?.membership.role).toBe("owner");
  });
});
