import { describe, expect, it } from "vitest";
import { POST as costing } from "#src/pages/api/costing.ts";
import { PATCH as setHourRate } from "#src/pages/api/workshops/[workshop]/hour-rate.ts";
import { GET as getPlan } from "#src/pages/api/workshops/[workshop]/kits/[kit]/plan.ts";
import { newId } from "#src/server/new-id.ts";
import { tokenHash } from "#src/server/secret-token.ts";
import { addAccessToken } from "#src/server/store/access-token.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { ReckoningReply } from "#src/shapes/reckoning.ts";
import { call, testApp } from "#tests/support/app.ts";
import { runKit } from "#tests/support/run-kit.ts";

const app = testApp();

/** The kit of `runKit` with an hour's work at 18.00, downloaded as a file. */
async function downloaded() {
  const workshop = app.workshop();
  const kit = runKit(app, workshop);
  const as = app.person("seller", workshop);
  const params = { workshop: workshop.id, kit: kit.id };
  await call(setHourRate, { as, params, body: { version: 1, ratePerHour: "18" } });
  const file = await call(getPlan, { as, params, method: "GET", query: { download: "1" } });
  return { workshop, as, plan: file.body as unknown as Plan };
}

/*
 * By hand, for 40 kits: parts 80 × 0.773911 = 61.91288, charged 61.91; freight 5.00; bags 40 × 0.25 = 10.00;
 * photographs 60.00; work 40 × 6 + 30 = 270 minutes at 18.00 an hour = 81.00. Together 217.91, a kit 5.44775.
 * A kit brings 12.00 (no tax, fees or postage), so 40 bring 480.00 and leave 262.09; 19 sold (228.00) pay for
 * the run, 18 (216.00) do not. Hours 4.5: (480.00 − 136.91) ÷ 4.5 = 76.2422…
 */
describe("costing a plan that is sent", () => {
  it("gives the figures worked by hand", async () => {
    const { as, plan } = await downloaded();
    const { body } = await call(costing, { as, body: plan });
    const { run } = body;
    expect(run.spent).toEqual({ known: true, value: "217.91" });
    expect(run.perKit.used).toEqual({ known: true, value: "5.44775" });
    expect(run.kept).toEqual({ known: true, value: "480" });
    expect(run.profit).toEqual({ known: true, value: "262.09" });
    expect(run.evenAfter).toEqual({ known: true, value: "19" });
    expect(run.earnedPerHour).toMatchObject({ known: true, value: expect.stringMatching(/^76\.2422/) });
    expect(body.sweep).toBeNull();
  });

  it("says how each figure comes about, ending in the figure itself", async () => {
    const { as, plan } = await downloaded();
    const { body } = await call(costing, { as, body: plan, query: { working: "per-kit-used,head:work" } });
    expect(body.workings.map(({ figure }) => figure)).toEqual(["per-kit-used", "head:work"]);
    const last = body.workings[0]?.lines.findLast(({ result }) => result);
    expect(last?.amount).toMatchObject({ kind: "money", value: "5.44775", currency: "EUR" });
    const strange = await call(costing, { as, body: plan, query: { working: "happiness" } });
    expect(strange.problem?.errors).toEqual([
      { at: "working", message: 'This run has no figure "happiness".' },
    ]);
  });

  it("is answered as the description of the API says, known or not", async () => {
    const { as, plan } = await downloaded();
    const withoutPrices = { ...plan, parts: plan.parts.map((part) => ({ ...part, offers: [] })) };
    for (const body of [plan, withoutPrices]) {
      const query = { sweep: "1", working: "all" };
      const reply: ReckoningReply = (await call(costing, { as, body, query })).body;
      expect(ReckoningReply.safeParse(reply).error).toBeUndefined();
    }
  });

  it("reckons another run size and every run size on request", async () => {
    const { as, plan } = await downloaded();
    const { body } = await call(costing, { as, body: plan, query: { kits: "10", sweep: "1", working: "" } });
    expect(body.run.kits).toBe(10);
    expect(body.workings).toEqual([]);
    expect(body.sweep?.to).toBe(200);
    expect(body.sweep?.columns.spent[39]).toBe("217.91");
    expect(body.sweep?.columns.soldToPay[39]).toBe(19);
  });

  it("is open to scripts with a personal access token, and to nobody else", async () => {
    const { workshop, as, plan } = await downloaded();
    const row = { id: newId(), workshopId: workshop.id, userId: as.id, name: "Script", lastUsedAt: null };
    addAccessToken(app.db, {
      ...row,
      tokenHash: tokenHash("tp7script"),
      createdAt: app.now,
      expiresAt: app.now + 60_000,
    });
    expect((await call(costing, { token: "tp7script", body: plan })).status).toBe(200);
    expect((await call(costing, { token: "another", body: plan })).status).toBe(401);
    expect((await call(costing, { body: plan })).status).toBe(401);
  });
});

describe("a plan file of the first format", () => {
  const sale = {
    taxRate: "0.19",
    feeRate: "0.05",
    feeFixed: "0.30",
    postageCharged: "5",
    postagePaid: "4.50",
  };
  const first = ({ channels: _, ...plan }: Plan, over: object = {}) => ({
    ...plan,
    format: "tinpenny-plan/1",
    sale,
    ...over,
  });

  it("is read as one channel: 12.00 and 5.00 postage, 19 % inside, 5 % and 0.30, 4.50 paid", async () => {
    const { as, plan } = await downloaded();
    const { body } = await call(costing, { as, body: first(plan), query: { working: "" } });
    // 17.00 × 0.19 ÷ 1.19 = 2.7142… → 2.71; 17.00 × 0.05 + 0.30 = 1.15; 17.00 − 2.71 − 1.15 − 4.50 = 8.64.
    expect(body.run.bringsPerKit).toEqual({ known: true, value: "8.64" });
  });

  it("is read as one whose board quotes are for single boards", async () => {
    const { as, plan } = await downloaded();
    const { size: _, panelTerms: __, ...boards } = plan.boards;
    const quote = {
      ...{ id: "q", boardHouse: "Kilnside", currency: plan.currency, priceModel: "lots" },
      breaks: [{ quantity: 50, price: "90.00" }],
      ...{ engineeringCharge: "25", stencilCharge: "0", freight: "12.50" },
      ...{ leadTimeDays: null, pricedOn: null, validUntil: null },
    };
    const editions = plan.editions.map((edition) => ({ ...edition, boardsPerKit: 1 }));
    const body = first(plan, { editions, boards: { ...boards, needed: true, quotes: [quote] } });
    const answer = await call(costing, { as, body, query: { working: "" } });
    // 40 kits, a lot of 50: 90.00 + 25.00 + 12.50.
    expect(answer.body.run.boards.quotes).toMatchObject([
      { boardsPerPiece: 1, pieces: 50, landed: { value: "127.5" } },
    ]);
    const now = await call(costing, { as, body: { ...plan, boards: { ...boards, quotes: [quote] } } });
    expect(now.problem?.errors?.map(({ at }) => at)).toContain("boards.panelTerms");
  });

  it("is refused with the field named where its sale is impossible or missing", async () => {
    const { as, plan } = await downloaded();
    const wrong = await call(costing, { as, body: first(plan, { sale: { ...sale, feeRate: "1" } }) });
    expect(wrong.problem?.errors?.map(({ at }) => at)).toEqual(["channels.0.feeRate"]);
    const none = await call(costing, { as, body: first(plan, { sale: undefined }) });
    expect(none.problem?.errors?.map(({ at }) => at)).toEqual(["channels"]);
  });
});

describe("an impossible plan", () => {
  const offers = (plan: Plan) => plan.parts[0]?.offers ?? [];
  const cases: [string, (plan: Plan) => void, string][] = [
    [
      "a negative quantity",
      (plan) => Object.assign(plan.parts[0] ?? {}, { leastSpare: -1 }),
      "parts.0.leastSpare",
    ],
    [
      "a fee of 100 %",
      (plan) => Object.assign(plan.channels[0] ?? {}, { feeRate: "1" }),
      "channels.0.feeRate",
    ],
    [
      "an amount that is no decimal text",
      (plan) => Object.assign(plan.channels[0] ?? {}, { feeFixed: 0.3 }),
      "channels.0.feeFixed",
    ],
    [
      "fee and tax that leave nothing of a price",
      (plan) => Object.assign(plan.channels[0] ?? {}, { feeRate: "0.85", taxRate: "0.21" }),
      "channels.0.feeRate",
    ],
    ["a plan that is sold nowhere", (plan) => plan.channels.splice(0), "channels"],
    [
      "an order of no kit",
      (plan) => Object.assign(plan.channels[0] ?? {}, { kitsPerOrder: "0.5" }),
      "channels.0.kitsPerOrder",
    ],
    [
      "a discount of all of the price",
      (plan) => Object.assign(plan.channels[0] ?? {}, { discount: "1" }),
      "channels.0.discount",
    ],
    [
      "a ladder whose quantities repeat",
      (plan) => offers(plan)[0]?.breaks.push({ quantity: 1, price: "0.5" }),
      "parts.0.offers.0.breaks.1.quantity",
    ],
    [
      "a break below the minimum order",
      (plan) => Object.assign(offers(plan)[0] ?? {}, { minimumOrder: 10 }),
      "parts.0.offers.0.breaks.0.quantity",
    ],
    [
      "an offer of a supplier that the plan does not have",
      (plan) => Object.assign(offers(plan)[0] ?? {}, { supplier: "nobody" }),
      "parts.0.offers.0.supplier",
    ],
    [
      "two editions of one id",
      (plan) => plan.editions.push(structuredClone(plan.editions[0]) as Plan["editions"][number]),
      "editions.1.id",
    ],
    ["a field that no plan has", (plan) => Object.assign(plan, { colour: "red" }), ""],
    ["a run of nothing", (plan) => Object.assign(plan.run, { kits: 0 }), "run.kits"],
  ];

  it.each(cases)("is refused for %s, with the field named", async (_, spoil, at) => {
    const { as, plan } = await downloaded();
    spoil(plan);
    const answer = await call(costing, { as, body: plan });
    expect(answer.status).toBe(422);
    expect(answer.headers.get("content-type")).toBe("application/problem+json");
    expect(answer.problem?.errors?.map((error) => error.at)).toContain(at);
  });
});
