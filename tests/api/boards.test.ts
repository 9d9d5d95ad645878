import { describe, expect, it } from "vitest";
import { runPlans } from "#db/schema/runs.ts";
import { DELETE, PATCH } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/quotes/[quote].ts";
import { POST as add } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/quotes.ts";
import { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards.ts";
import { PATCH as choose } from "#src/pages/api/workshops/[workshop]/kits/[kit]/run.ts";
import type { WorkshopRow } from "#src/server/store/membership.ts";
import { ROLES } from "#src/shapes/limits.ts";
import { call, testApp } from "#tests/support/app.ts";
import { QUOTE } from "#tests/support/supply.ts";

const app = testApp();

const RUN = {
  kits: 120,
  sweepTo: 300,
  spareRate: "0.02",
  boardYield: "1",
  boardConfidence: "0.95",
  learningSlope: "1",
  kitsMadeBefore: 0,
  replacementShare: "0",
};

/** A panel of 12 boards of 58 × 42 mm: 4 × 58 + 3 × 2 by 3 × 42 + 4 × 2 + 2 × 5. */
const TWELVE = { boardsPerPanel: 12, panelWidth: "238", panelHeight: "144", depanelling: "0.08" };

const FORMULA = {
  priceModel: "formula",
  breaks: [],
  setUp: "40",
  areaRate: "1.335",
  areaUnit: "dm2",
  perBoard: "0.03",
} as const;

function ground(workshop: WorkshopRow = app.workshop()) {
  const as = app.person("designer", workshop);
  const kit = app.kit(workshop);
  app.db
    .insert(runPlans)
    .values({ kitId: kit.id, workshopId: workshop.id, ...RUN })
    .run();
  const params = { workshop: workshop.id, kit: kit.id };
  const added = (over = {}) => call(add, { as, params, body: { ...QUOTE, ...over } });
  const seen = async () => (await call(GET, { as, params, method: "GET" })).body;
  return { workshop, as, params, added, seen };
}

describe("board quotes", () => {
  it("are added and seen with the way the kit orders its boards", async () => {
    const { added, seen } = ground();
    const { status, body } = await added();
    expect(status).toBe(201);
    expect(body).toMatchObject({ ...QUOTE, version: 1 });
    expect(await seen()).toEqual({
      choice: { chosenQuoteId: null, boardYield: "1", boardConfidence: "0.95", version: 1 },
      quotes: [body],
      panelTerms: [],
    });
  });

  it.each([
    ["no board house", { boardHouse: "" }, "boardHouse"],
    ["a lot that stands twice", { breaks: [...QUOTE.breaks, QUOTE.breaks[0]] }, "breaks.2.quantity"],
    ["a lot of nothing", { breaks: [{ quantity: 0, price: "9" }] }, "breaks.0.quantity"],
    ["a way of pricing boards do not have", { priceModel: "by-slice" }, "priceModel"],
    ["a third decimal of a cent", { engineeringCharge: "25.005" }, "engineeringCharge"],
    ["a negative freight", { freight: "-1" }, "freight"],
    ["a board of no width", { width: "0.0" }, "width"],
    ["no layer", { layers: 0 }, "layers"],
    ["an end before its beginning", { validUntil: "2026-02-01" }, "validUntil"],
    ["a currency nobody can pay in", { currency: "XAG" }, "currency"],
    ["a panel of one board", { boardsPerPanel: 1 }, "boardsPerPanel"],
    ["a panel's size for single boards", { panelWidth: "100" }, "panelWidth"],
    ["depanelling of single boards", { depanelling: "0.10" }, "depanelling"],
    ["half a panel's size", { boardsPerPanel: 12, panelWidth: "238" }, "panelHeight"],
    ["boards that do not fit on their panel", { ...TWELVE, panelWidth: "200" }, "panelWidth"],
    ["a board larger than its panel", { ...TWELVE, boardsPerPanel: 2, panelHeight: "41" }, "panelWidth"],
    ["a measure finer than a micrometre", { width: "58.0001" }, "width"],
    ["a formula without its rate", { ...FORMULA, areaRate: null }, "areaRate"],
    ["a formula with breaks", { ...FORMULA, breaks: QUOTE.breaks }, "breaks"],
    ["a formula's rate where lots are sold", { areaRate: "1.20" }, "areaRate"],
  ])("are refused with %s, and the field is named", async (_, over, at) => {
    const { added, seen } = ground();
    const answer = await added(over);
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([at]);
    expect((await seen()).quotes).toEqual([]);
  });

  it("are taken for panels, and by formula", async () => {
    const { added } = ground();
    expect((await added(TWELVE)).body).toMatchObject(TWELVE);
    expect((await added({ ...TWELVE, ...FORMULA })).body).toMatchObject({ ...TWELVE, ...FORMULA });
  });

  it("keep freight that nobody knows apart from freight of nothing", async () => {
    const { added } = ground();
    expect((await added({ freight: null })).body.freight).toBeNull();
    expect((await added({ freight: "0" })).body.freight).toBe("0");
  });

  it("are changed with their lots, and clash", async () => {
    const { as, params, added, seen } = ground();
    const { body } = await added();
    const at = { as, params: { ...params, quote: body.id } };
    const breaks = [{ quantity: 120, price: "1.90" }];
    const changed = await call(PATCH, { ...at, body: { version: 1, priceModel: "whole-order", breaks } });
    expect(changed.body).toEqual({ ...body, priceModel: "whole-order", breaks, version: 2 });
    expect((await seen()).quotes).toEqual([changed.body]);
    const late = await call(PATCH, { ...at, body: { version: 1, freight: "1" } });
    expect(late.status).toBe(409);
    expect(late.problem?.current).toMatchObject({ freight: "12.50", version: 2 });
    expect((await call(DELETE, { ...at, query: { version: "1" } })).status).toBe(409);
  });

  it("are chosen, and a chosen quote that goes leaves the cheapest", async () => {
    const { as, params, added, seen } = ground();
    const { body } = await added();
    const chosen = await call(choose, { as, params, body: { version: 1, chosenQuoteId: body.id } });
    expect(chosen.body).toEqual({ version: 2 });
    expect((await seen()).choice).toMatchObject({ chosenQuoteId: body.id, version: 2 });
    const late = await call(choose, { as, params, body: { version: 1, chosenQuoteId: null } });
    expect(late.status).toBe(409);
    expect(late.problem?.current).toMatchObject({ chosenQuoteId: body.id, version: 2 });
    const at = { as, params: { ...params, quote: body.id }, query: { version: "1" } };
    expect((await call(DELETE, at)).status).toBe(204);
    expect((await seen()).choice).toMatchObject({ chosenQuoteId: null, version: 3 });
  });

  it.each([
    ["a yield over 100 %", { boardYield: "1.1" }, "boardYield"],
    ["certainty, which no number of boards gives", { boardConfidence: "1" }, "boardConfidence"],
  ])("are not ordered with %s", async (_, over, at) => {
    const { as, params } = ground();
    const answer = await call(choose, { as, params, body: { version: 1, ...over } });
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([at]);
  });

  it("take yield and confidence", async () => {
    const { as, params, seen } = ground();
    const body = { version: 1, boardYield: "0.97", boardConfidence: "0.99" };
    expect((await call(choose, { as, params, body })).status).toBe(200);
    expect((await seen()).choice).toMatchObject({ boardYield: "0.97", boardConfidence: "0.99", version: 2 });
  });

  it("of another kit or workshop are not there, and cannot be chosen", async () => {
    const { workshop, as, params } = ground();
    for (const other of [ground(workshop), ground()]) {
      const { body } = await other.added();
      const at = { as, params: { ...params, quote: body.id } };
      expect((await call(PATCH, { ...at, body: { version: 1, freight: "1" } })).status).toBe(404);
      expect((await call(DELETE, { ...at, query: { version: "1" } })).status).toBe(404);
      const answer = await call(choose, { as, params, body: { version: 1, chosenQuoteId: body.id } });
      expect(answer.problem?.errors?.map((error) => error.at)).toEqual(["chosenQuoteId"]);
    }
  });

  it.each(ROLES)("are seen and changed by a %s as the table says", async (role) => {
    const { workshop, params } = ground();
    const as = app.person(role, workshop);
    if (role === "co-builder") app.guest(as, { ...app.kit(workshop), id: params.kit });
    expect((await call(GET, { as, params, method: "GET" })).status).toBe(role === "co-builder" ? 403 : 200);
    const may = role === "owner" || role === "designer";
    expect((await call(add, { as, params, body: QUOTE })).status).toBe(may ? 201 : 403);
  });
});
