import { describe, expect, it, vi } from "vitest";
import { DELETE, PUT } from "#src/pages/api/workshops/[workshop]/currency-rates/[currency].ts";
import { POST as fetchRates } from "#src/pages/api/workshops/[workshop]/currency-rates/fetch.ts";
import { POST as takeFile } from "#src/pages/api/workshops/[workshop]/currency-rates/file.ts";
import { GET } from "#src/pages/api/workshops/[workshop]/currency-rates.ts";
import { config, setConfig } from "#src/server/config.ts";
import { makeKit } from "#src/server/kit-changes.ts";
import { planOf } from "#src/server/plan.ts";
import { RATES_FILE_BYTES, ROLES } from "#src/shapes/limits.ts";
import { FakeReferenceRates, INVENTED_RATES } from "#tests/fakes/reference-rates.ts";
import { call, type TestPerson, testApp } from "#tests/support/app.ts";

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
  it("are set by hand with their day, corrected, and removed", async () => {
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
    const second = await set("USD", { perForeignUnit: "0.93", version: 1 });
    expect(second.body).toMatchObject({ perForeignUnit: "0.93", setAt: app.now, version: 2 });
    expect(await all()).toEqual([second.body]);
    const gone = await call(DELETE, { ...at("USD"), query: { dated: "2026-03-06", version: "2" } });
    expect(gone.status).toBe(204);
    expect(await all()).toEqual([]);
  });

  it("keep their days apart, the newest first, and each is removed by itself", async () => {
    const { at, set, all } = ground();
    await set("USD", { perForeignUnit: "0.92", dated: "2026-03-06" });
    await set("USD", { perForeignUnit: "0.95", dated: "2026-03-09" });
    await set("USD", { perForeignUnit: "0.90", dated: "2026-02-02" });
    expect((await all()).map(({ dated }) => dated)).toEqual(["2026-03-09", "2026-03-06", "2026-02-02"]);
    await call(DELETE, { ...at("USD"), query: { dated: "2026-03-09", version: "1" } });
    expect((await all()).map(({ perForeignUnit }) => perForeignUnit)).toEqual(["0.92", "0.90"]);
  });

  it("hold in a plan from their day on", async () => {
    const { workshop, at, set } = ground();
    const entry = { name: "Fen Beacon", summary: "", boardNeeded: true, boardShape: "rectangle" } as const;
    const kit = makeKit({ db: app.db, now: app.now, user: at("USD").as, workshop }, entry);
    await set("USD", { perForeignUnit: "0.90", dated: "2026-02-02" });
    await set("USD", { perForeignUnit: "0.95", dated: "2026-03-09" });
    const holding = (day: string) => planOf(app.db, workshop, kit, day).rates;
    expect(holding("2026-02-01")).toEqual([]);
    expect(holding("2026-03-08")).toEqual([{ currency: "USD", perForeignUnit: "0.90", dated: "2026-02-02" }]);
    expect(holding("2026-03-09")).toEqual([{ currency: "USD", perForeignUnit: "0.95", dated: "2026-03-09" }]);
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
    expect((await call(DELETE, { ...at("USD"), query: { dated: "2026-03-06", version: "5" } })).status).toBe(
      409,
    );
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

describe("a file of reference rates", () => {
  const take = (as: TestPerson, workshop: string, content: string) =>
    call(takeFile, { as, params: { workshop }, bytes: { content, type: "text/xml" } });

  it("sets the rates of its day through the euro, keeps other days, and is the same the second time", async () => {
    const { workshop, at, set, all } = ground();
    await set("USD", { perForeignUnit: "0.92", dated: "2026-03-05" });
    await set("GBP", { perForeignUnit: "1.30", dated: "2026-03-06" });
    const first = await take(at("USD").as, workshop.id, INVENTED_RATES);
    expect(first.body).toEqual({ day: "2026-03-06", set: ["USD", "GBP", "JPY"], same: [], left: [] });
    // 1 ÷ 1.25, 1 ÷ 0.8 and 1 ÷ 160.
    expect(
      (await all()).map(({ currency, dated, perForeignUnit }) => [currency, dated, perForeignUnit]),
    ).toEqual([
      ["GBP", "2026-03-06", "1.25"],
      ["JPY", "2026-03-06", "0.00625"],
      ["USD", "2026-03-06", "0.8"],
      ["USD", "2026-03-05", "0.92"],
    ]);
    const again = await take(at("USD").as, workshop.id, INVENTED_RATES);
    expect(again.body).toEqual({ day: "2026-03-06", set: [], same: ["USD", "GBP", "JPY"], left: [] });
  });

  it("serves a workshop that reckons in another currency, the euro among the rates", async () => {
    const workshop = app.workshop({ currency: "GBP" });
    const as = app.person("owner", workshop);
    const taken = await take(as, workshop.id, INVENTED_RATES);
    expect(taken.body.set).toEqual(["EUR", "USD", "JPY"]);
    const rates = (await call(GET, { as, params: { workshop: workshop.id }, method: "GET" })).body;
    // 0.8 for one euro, 0.8 ÷ 1.25 for one dollar, 0.8 ÷ 160 for one yen.
    expect(rates.map(({ currency, perForeignUnit }) => [currency, perForeignUnit])).toEqual([
      ["EUR", "0.8"],
      ["JPY", "0.005"],
      ["USD", "0.64"],
    ]);
  });

  it("changes nothing where it cannot be read, or lacks the workshop's own currency", async () => {
    const { workshop, at, all } = ground();
    const bad = await take(at("USD").as, workshop.id, "Ref,Qty\nR1,1\n");
    expect([bad.status, bad.problem?.code]).toEqual([422, "rates-file-unreadable"]);
    expect(await all()).toEqual([]);
    const other = app.workshop({ currency: "NGN" });
    const lacking = await take(app.person("owner", other), other.id, INVENTED_RATES);
    expect(lacking.problem?.code).toBe("rates-lack-own-currency");
  });

  it("is fetched from the address in the settings", async () => {
    const { workshop, at, all } = ground();
    const ask = () =>
      call(fetchRates, { as: at("USD").as, params: { workshop: workshop.id }, method: "POST" });
    expect((await ask()).problem?.code).toBe("rates-not-configured");
    const bank = await new FakeReferenceRates().start();
    const unheard = vi.spyOn(console, "error").mockImplementation(() => undefined);
    try {
      setConfig({ ...config(), ratesUrl: bank.address });
      expect((await ask()).body).toMatchObject({ day: "2026-03-06", set: ["USD", "GBP", "JPY"] });
      bank.answer = { status: 500, body: "" };
      expect([(await ask()).status, (await ask()).problem?.code]).toEqual([502, "rates-unreachable"]);
      bank.answer = { status: 200, body: "x".repeat(RATES_FILE_BYTES + 1) };
      expect((await ask()).problem?.code).toBe("rates-unreachable");
      expect(await all()).toHaveLength(3);
    } finally {
      unheard.mockRestore();
      await bank.stop();
    }
  });
});
