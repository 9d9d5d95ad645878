import { describe, expect, it } from "vitest";
import { z } from "zod";
import { route } from "#src/server/route.ts";
import { call, testApp } from "#tests/support/app.ts";

const app = testApp();

const settings = route({
  may: "manage-workshop",
  input: z.strictObject({ name: z.string().min(1, "Give it a name.") }),
  run: ({ workshop, role, input }) => ({ id: workshop.id, role, name: input.name }),
});
const kitPage = route({ may: "see-parts", run: ({ kit }) => ({ kit: kit.id }) });
const mine = route({
  may: "signed-in",
  run: ({ user, session }) => ({ id: user.id, script: session === null }),
});
const open = route({ may: "anyone", run: () => undefined });

describe("a route", () => {
  it("runs for a person whose role may, and says who and where", async () => {
    const workshop = app.workshop();
    const owner = app.person("owner", workshop);
    const answer = await call(settings, {
      as: owner,
      params: { workshop: workshop.id },
      body: { name: "Yard" },
    });
    expect(answer.status).toBe(200);
    expect(answer.body).toEqual({ id: workshop.id, role: "owner", name: "Yard" });
    expect(answer.headers.get("cache-control")).toBe("no-store");
  });

  it("answers 401 without a session and 403 with the roles that may", async () => {
    const workshop = app.workshop();
    const params = { workshop: workshop.id };
    expect((await call(settings, { params, body: {} })).problem?.code).toBe("sign-in-needed");
    const seller = app.person("seller", workshop);
    const refused = await call(settings, { as: seller, params, body: { name: "Yard" } });
    expect(refused.status).toBe(403);
    expect(refused.problem?.title).toBe("Your role as seller may not do this.");
    expect(refused.problem?.detail).toBe("In this workshop it can be done by: owner.");
  });

  it("tells a stranger of another workshop nothing", async () => {
    const workshop = app.workshop();
    const stranger = app.person("owner", app.workshop());
    const answer = await call(settings, { as: stranger, params: { workshop: workshop.id }, body: {} });
    expect(answer.status).toBe(404);
  });

  it("shows a co-builder only the kits they were asked to", async () => {
    const workshop = app.workshop();
    const [asked, other] = [app.kit(workshop), app.kit(workshop)];
    const coBuilder = app.person("co-builder", workshop);
    app.guest(coBuilder, asked);
    const as = coBuilder;
    const at = (kit: string) => call(kitPage, { as, params: { workshop: workshop.id, kit } });
    expect((await at(asked.id)).body).toEqual({ kit: asked.id });
    expect((await at(other.id)).status).toBe(404);
  });

  it.each([null, "https://elsewhere.example"])("refuses a change that comes from %s", async (origin) => {
    const person = app.person();
    expect((await call(mine, { as: person, origin })).problem?.code).toBe("other-origin");
    expect((await call(open, { origin })).problem?.code).toBe("other-origin");
    expect((await call(mine, { as: person, origin, method: "GET" })).status).toBe(200);
  });

  it("does not take a sign-in that waits for the second factor", async () => {
    const cookie = app.signIn(app.person(), false);
    expect((await call(mine, { cookie })).problem?.code).toBe("second-factor-needed");
  });

  it("names each field that is wrong", async () => {
    const workshop = app.workshop();
    const as = app.person("owner", workshop);
    const answer = await call(settings, { as, params: { workshop: workshop.id }, body: { name: "" } });
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors).toEqual([{ at: "name", message: "Give it a name." }]);
  });

  it("takes JSON only, and only readable JSON", async () => {
    const workshop = app.workshop();
    const asking = { as: app.person("owner", workshop), params: { workshop: workshop.id } };
    const form = await call(settings, { ...asking, bytes: { content: "name=Yard", type: "text/plain" } });
    expect(form.status).toBe(415);
    const broken = await call(settings, { ...asking, bytes: { content: "{", type: "application/json" } });
    expect(broken.status).toBe(400);
    const large = await call(settings, { ...asking, body: { name: "x".repeat(300 * 1024) } });
    expect(large.problem?.title).toBe("This is larger than 256 kB.");
  });

  it("ends a session after thirty days without use, and keeps one that is used", async () => {
    const DAY = 24 * 60 * 60 * 1000;
    const [used, left] = [app.person(), app.person()];
    app.pass(20 * DAY);
    expect((await call(mine, { as: used })).status).toBe(200);
    app.pass(20 * DAY);
    expect((await call(mine, { as: used })).status).toBe(200);
    expect((await call(mine, { as: left })).status).toBe(401);
  });
});
