import { describe, expect, it } from "vitest";
import { DELETE, PUT } from "#src/pages/api/workshops/[workshop]/currency-rates/[currency].ts";
import { GET } from "#src/pages/api/workshops/[workshop]/currency-rates.ts";
import { ROLES } from "#src/shapes/limits.ts";
import { call, testApp } from "#tests/support/app.ts";

const app = testApp();

function ground() {
  const workshop = app.workshop({ currency: "EUR" });
  const as = app.person("designer", workshop);
  const at = (currency: string) => ({ as, params: { workshop: workshop.id, currency } });
  const set = (currency: string, over = {}) =>
    call(PUT, {
      ...at(currency),
      body: { perForeignUnit: "0.92", dated: "2026-03-06", version: null, ...over },
    });
  const all = async () => (await call(GET, { ...at("USD"), method: "GET" })).body;
  return { workshop, at, set, all };
}

describe("currency rates", () => {
  it("are set by hand with their day, set anew, and removed", async () => {
    const { at, set, all } = ground();
    const first = await set("USD");
    expect(first.body).toEqual({
      currency: "USD",
      perForeignUnit: "0.92",
      dated: "2026-03-06",
      setAt: app.now,
      version: 1,
    });
    app.pass(1000);
    const second = await set("USD", { perForeignUnit: "0.93", dated: "2026-03-09", version: 1 });
    expect(second.body).toMatchObject({ perForeignUnit: "0.93", setAt: app.now, version: 2 });
    expect(await all()).toEqual([second.body]);
    expect((await call(DELETE, { ...at("USD"), query: { version: "2" } })).status).toBe(204);
    expect(await all()).toEqual([]);
  });

  it.each([
    ["a rate of nothing", "USD", { perForeignUnit: "0.000" }, "perForeignUnit"],
    ["a negative rate", "USD", { perForeignUnit: "-0.9" }, "perForeignUnit"],
    ["a rate as a number", "USD", { perForeignUnit: 0.9 }, "perForeignUnit"],
    ["no day", "USD", { dated: "" }, "dated"],
    ["a currency nobody can pay in", "XXX", {}, "currency"],
    ["small letters", "usd", {}, "currency"],
    ["the workshop's own currency", "EUR", {}, "currency"],
  ])("are refused with %s, and the field is named", async (_, currency, over, at) => {
    const { set, all } = ground();
    const answer = await set(currency, over);
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([at]);
    expect(await all()).toEqual([]);
  });

  it("show both values to somebody who sets what another set meanwhile", async () => {
    const { at, set } = ground();
    await set("USD");
    expect((await set("USD", { perForeignUnit: "0.9" })).status).toBe(409);
    const late = await set("USD", { perForeignUnit: "0.9", version: 5 });
    expect(late.problem?.current).toMatchObject({ perForeignUnit: "0.92", version: 1 });
    expect((await call(DELETE, { ...at("USD"), query: { version: "5" } })).status).toBe(409);
    expect((await set("CHF", { version: 1 })).status).toBe(404);
  });

  it("of one workshop are not another's", async () => {
    const { set } = ground();
    await set("USD");
    expect(await ground().all()).toEqual([]);
  });

  it.each(ROLES)("are seen and set by a %s as the table says", async (role) => {
    const { workshop } = ground();
    const asked = { as: app.person(role, workshop), params: { workshop: workshop.id, currency: "USD" } };
    expect((await call(GET, { ...asked, method: "GET" })).status).toBe(role === "co-builder" ? 403 : 200);
    const body = { perForeignUnit: "0.92", dated: "2026-03-06", version: null };
    const may = role === "owner" || role === "designer";
    expect((await call(PUT, { ...asked, body })).status).toBe(may ? 200 : 403);
  });
});
