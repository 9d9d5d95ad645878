import { describe, expect, it } from "vitest";
import { runPlans } from "#db/schema/runs.ts";
import { DELETE, PATCH } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/panel-terms/[terms].ts";
import { POST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/panel-terms.ts";
import { PATCH as changeQuote } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/quotes/[quote].ts";
import { POST as addQuote } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/quotes.ts";
import { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards.ts";
import { POST as copyKit } from "#src/pages/api/workshops/[workshop]/kits/[kit]/copies.ts";
import { GET as planOf } from "#src/pages/api/workshops/[workshop]/kits/[kit]/plan.ts";
import type { KitRow } from "#src/server/store/kit.ts";
import type { WorkshopRow } from "#src/server/store/membership.ts";
import { ROLES } from "#src/shapes/limits.ts";
import { call, testApp } from "#tests/support/app.ts";
import { PANEL_TERMS, QUOTE } from "#tests/support/supply.ts";

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

const BOARD = { boardShape: "rectangle", boardWidth: "58", boardHeight: "42" } as const;

function ground(workshop: WorkshopRow = app.workshop(), board: Partial<KitRow> = BOARD) {
  const as = app.person("designer", workshop);
  const kit = app.kit(workshop, board);
  app.db
    .insert(runPlans)
    .values({ kitId: kit.id, workshopId: workshop.id, ...RUN })
    .run();
  const params = { workshop: workshop.id, kit: kit.id };
  const added = (over = {}) => call(POST, { as, params, body: { ...PANEL_TERMS, ...over } });
  const seen = async () => (await call(GET, { as, params, method: "GET" })).body.panelTerms;
  return { workshop, as, params, added, seen };
}

describe("panel terms", () => {
  it("are added, seen with the quotes, and part of the plan", async () => {
    const { as, params, added, seen } = ground();
    const { status, body } = await added();
    expect(status).toBe(201);
    expect(body).toMatchObject({ ...PANEL_TERMS, version: 1 });
    expect(await seen()).toEqual([body]);
    const { boards } = (await call(planOf, { as, params, method: "GET" })).body.plan;
    expect(boards.size).toEqual({ shape: "rectangle", width: "58", height: "42" });
    expect(boards.panelTerms).toEqual([
      {
        boardHouse: "Kilnside",
        largest: { width: "250", height: "200" },
        least: null,
        separation: "routed",
        gap: "2",
        rails: { sides: "long", width: "5" },
      },
    ]);
  });

  it.each([
    ["no board house", { boardHouse: "" }, "boardHouse"],
    ["a panel of no width", { largestWidth: "0" }, "largestWidth"],
    ["a panel of 3 m", { largestWidth: "3000" }, "largestWidth"],
    ["half a least size", { leastHeight: "50" }, "leastWidth"],
    ["a least panel above the largest", { leastWidth: "300", leastHeight: "50" }, "leastWidth"],
    ["a gap between scored boards", { separation: "v-score" }, "gap"],
    ["routing without a gap", { gap: "0" }, "gap"],
    ["rails of no width", { railWidth: "0" }, "railWidth"],
    ["a negative gap", { gap: "-1" }, "gap"],
    ["a gap finer than a micrometre", { gap: "0.0005" }, "gap"],
    ["another way to part boards", { separation: "sawn" }, "separation"],
    ["the kit's board larger than the panel", { largestWidth: "50", largestHeight: "57" }, "largestWidth"],
    ["rails that leave no room for it", { railSides: "all", railWidth: "90" }, "largestWidth"],
  ])("are refused with %s, and the field is named", async (_, over, at) => {
    const { added, seen } = ground();
    const answer = await added(over);
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([at]);
    expect(await seen()).toEqual([]);
  });

  it("are taken while the board's size is not known, and still refused where they contradict themselves", async () => {
    const { added } = ground(app.workshop(), { boardWidth: null, boardHeight: null });
    expect((await added({ gap: "0" })).status).toBe(422);
    expect((await added()).status).toBe(201);
  });

  it("are refused for a round board that would have to be scored", async () => {
    const round = { boardShape: "round", boardWidth: "50", boardHeight: null } as const;
    const { added } = ground(app.workshop(), round);
    const answer = await added({ separation: "v-score", gap: "0" });
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual(["separation"]);
    expect((await added()).status).toBe(201);
  });

  it("are written down once for each house of a kit", async () => {
    const { added } = ground();
    await added();
    expect((await added()).problem?.errors?.map((error) => error.at)).toEqual(["boardHouse"]);
    expect((await added({ boardHouse: "Saltmarsh" })).status).toBe(201);
  });

  it("are changed and removed, and clash", async () => {
    const { as, params, added, seen } = ground();
    const { body } = await added();
    const at = { as, params: { ...params, terms: body.id } };
    const changed = await call(PATCH, { ...at, body: { version: 1, gap: "2.4" } });
    expect(changed.body).toEqual({ ...body, gap: "2.4", version: 2 });
    const late = await call(PATCH, { ...at, body: { version: 1, gap: "3" } });
    expect(late.status).toBe(409);
    expect(late.problem?.current).toMatchObject({ gap: "2.4", version: 2 });
    expect((await call(PATCH, { ...at, body: { version: 2, gap: "0" } })).status).toBe(422);
    expect((await call(DELETE, { ...at, query: { version: "1" } })).status).toBe(409);
    expect((await call(DELETE, { ...at, query: { version: "2" } })).status).toBe(204);
    expect(await seen()).toEqual([]);
  });

  it("follow the house when its last quote gets another name", async () => {
    const { as, params, added, seen } = ground();
    await added();
    const quotes = [
      await call(addQuote, { as, params, body: QUOTE }),
      await call(addQuote, { as, params, body: QUOTE }),
    ];
    const rename = (quote: string) =>
      call(changeQuote, {
        as,
        params: { ...params, quote },
        body: { version: 1, boardHouse: "Kilnside North" },
      });
    await rename(quotes[0]?.body.id ?? "");
    expect((await seen()).map(({ boardHouse }) => boardHouse)).toEqual(["Kilnside"]);
    await rename(quotes[1]?.body.id ?? "");
    expect((await seen()).map(({ boardHouse }) => boardHouse)).toEqual(["Kilnside North"]);
  });

  it("are copied with the kit", async () => {
    const { as, params, added } = ground();
    await added();
    const copy = await call(copyKit, { as, params, body: { name: "Gate Bell, the second" } });
    const there = { as, params: { ...params, kit: copy.body.id }, method: "GET" } as const;
    expect((await call(GET, there)).body.panelTerms).toMatchObject([{ ...PANEL_TERMS, version: 1 }]);
  });

  it("of another kit or workshop are not there", async () => {
    const { workshop, as, params } = ground();
    for (const other of [ground(workshop), ground()]) {
      const { body } = await other.added();
      const at = { as, params: { ...params, terms: body.id } };
      expect((await call(PATCH, { ...at, body: { version: 1, gap: "3" } })).status).toBe(404);
      expect((await call(DELETE, { ...at, query: { version: "1" } })).status).toBe(404);
    }
  });

  it.each(ROLES)("are changed by a %s as the table says", async (role) => {
    const { workshop, params } = ground();
    const as = app.person(role, workshop);
    if (role === "co-builder") app.guest(as, { ...app.kit(workshop), id: params.kit });
    const may = role === "owner" || role === "designer";
    expect((await call(POST, { as, params, body: PANEL_TERMS })).status).toBe(may ? 201 : 403);
  });
});
