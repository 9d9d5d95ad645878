import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { activity } from "#db/schema/activity.ts";
import { PATCH as setHourRate } from "#src/pages/api/workshops/[workshop]/hour-rate.ts";
import { POST as addCharge } from "#src/pages/api/workshops/[workshop]/kits/[kit]/charges.ts";
import { PATCH as setPrice } from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/[edition]/price.ts";
import { PATCH as setWeight } from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/[edition]/weight.ts";
import { POST as addPacking } from "#src/pages/api/workshops/[workshop]/kits/[kit]/packing.ts";
import { GET as getPlan } from "#src/pages/api/workshops/[workshop]/kits/[kit]/plan.ts";
import { PATCH as setRun } from "#src/pages/api/workshops/[workshop]/kits/[kit]/run.ts";
import {
  PATCH as changeTask,
  DELETE as removeTask,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/tasks/[task].ts";
import { POST as addTask } from "#src/pages/api/workshops/[workshop]/kits/[kit]/tasks.ts";
import { Plan } from "#src/shapes/plan.ts";
import { call, testApp } from "#tests/support/app.ts";
import { runKit, TELLTALE_PRICE } from "#tests/support/run-kit.ts";

const app = testApp();

function place() {
  const workshop = app.workshop();
  const kit = runKit(app, workshop);
  const params = { workshop: workshop.id, kit: kit.id, edition: kit.edition, task: kit.task };
  const seller = app.person("seller", workshop);
  const designer = app.person("designer", workshop);
  const plan = async () => (await call(getPlan, { as: seller, params, method: "GET" })).body;
  return { workshop, kit, params, seller, designer, plan };
}

describe("the plan of a kit", () => {
  it("holds what the reckoning needs, in the shape that costing takes, with the versions to name", async () => {
    const { plan, kit } = place();
    const { plan: found, versions } = await plan();
    expect(Plan.parse(found)).toEqual(found);
    expect(found.asOf).toBe("2026-03-09");
    expect(found.parts[0]?.offers[0]?.breaks).toEqual([{ quantity: 1, price: TELLTALE_PRICE }]);
    expect(versions).toMatchObject({ run: 1, workshop: 1, rows: { [kit.edition]: 1, [kit.task]: 1 } });
  });

  it("comes as a file that is the plan and nothing else", async () => {
    const { params, seller } = place();
    const answer = await call(getPlan, { as: seller, params, method: "GET", query: { download: "1" } });
    expect(answer.headers.get("content-disposition")).toContain("Gate-Bell-plan.json");
    expect(Plan.parse(answer.body)).toEqual(answer.body);
  });

  it("never shows a price to a co-builder", async () => {
    const { workshop, kit, params } = place();
    const coBuilder = app.person("co-builder", workshop);
    app.guest(coBuilder, kit);
    const answer = await call(getPlan, { as: coBuilder, params, method: "GET" });
    expect(answer.status).toBe(403);
    expect(JSON.stringify(answer.body)).not.toContain(TELLTALE_PRICE);
  });
});

describe("changing a run", () => {
  it("keeps what is left out, counts the version up and writes down who", async () => {
    const { params, designer, plan, kit } = place();
    const answer = await call(setRun, { as: designer, params, body: { version: 1, kits: 55 } });
    expect(answer.body).toEqual({ version: 2 });
    const { plan: after, versions } = await plan();
    expect(after.run).toEqual({ kits: 55, sweepTo: 200 });
    expect(versions.run).toBe(2);
    const entry = app.db.select().from(activity).where(eq(activity.kitId, kit.id)).get();
    expect(entry).toMatchObject({ userId: designer.id, action: "run.change", detail: { kits: [40, 55] } });
  });

  it("shows both values to the second of two people who change it at once", async () => {
    const { params, seller, designer, plan } = place();
    await call(setRun, { as: designer, params, body: { version: 1, kits: 55 } });
    const late = await call(setRun, { as: seller, params, body: { version: 1, kits: 80 } });
    expect(late.status).toBe(409);
    expect(late.problem?.current).toMatchObject({
      kits: 55,
      version: 2,
      changedBy: designer.name,
      changedAt: app.now,
    });
    expect((await plan()).plan.run.kits).toBe(55);
  });

  it.each([
    ["kits", 0],
    ["kits", 1001],
    ["sweepTo", 2.5],
    ["learningSlope", "1.2"],
    ["replacementCost", "-1"],
    ["spareRate", ".1"],
  ])("refuses %s of %s and names the field", async (field, value) => {
    const { params, designer } = place();
    const answer = await call(setRun, { as: designer, params, body: { version: 1, [field]: value } });
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map(({ at }) => at)).toEqual([field]);
  });
});

describe("the price of an edition", () => {
  it("is the seller's to change, and the designer's only to see", async () => {
    const { params, seller, designer, plan } = place();
    const price = { version: 1, price: "13.50" };
    expect((await call(setPrice, { as: designer, params, body: price })).status).toBe(403);
    expect((await call(setPrice, { as: seller, params, body: price })).body).toEqual({ version: 2 });
    const { plan: after } = await plan();
    expect(after.editions[0]?.price).toBe("13.50");
  });

  it("leaves an edition of another kit alone", async () => {
    const { workshop, params, seller, designer } = place();
    const other = runKit(app, workshop, "Rain Post");
    const strange = { ...params, edition: other.edition };
    const asked = await call(setPrice, { as: seller, params: strange, body: { version: 1, price: "1" } });
    expect(asked.status).toBe(404);
    const mix = await call(setWeight, { as: designer, params: strange, body: { version: 1, weight: 3 } });
    expect(mix.status).toBe(404);
  });
});

describe("the mix and the hour's rate", () => {
  it("belong to the run plan", async () => {
    const { params, designer, plan } = place();
    await call(setWeight, { as: designer, params, body: { version: 1, weight: 3 } });
    const body = { version: 1, ratePerHour: "18.00" };
    expect((await call(setHourRate, { as: designer, params, body })).body).toEqual({ version: 2 });
    expect((await call(setHourRate, { as: designer, params, body })).status).toBe(409);
    const { plan: after, versions } = await plan();
    expect(after.editions[0]?.weight).toBe(3);
    expect(after.work.ratePerHour).toBe("18.00");
    expect(versions.workshop).toBe(2);
  });
});

describe("work, packing and once-only charges", () => {
  it("are added at the end, changed, removed and put back where they were", async () => {
    const { params, designer, plan } = place();
    const as = designer;
    const body = { name: "Testing", editions: null, minutesPerKit: "3.5", setUpMinutes: "0" };
    const added = await call(addTask, { as, params, body });
    expect(added.status).toBe(201);
    const names = async () => (await plan()).plan.work.tasks.map(({ name }) => name);
    expect(await names()).toEqual(["Bagging", "Testing"]);
    const change = { version: 1, minutesPerKit: "7" };
    expect((await call(changeTask, { as, params, body: change })).body).toEqual({ version: 2 });

    const asked = { as, params, method: "DELETE" };
    expect((await call(removeTask, { ...asked, query: { version: "1" } })).status).toBe(409);
    const gone = await call(removeTask, { ...asked, query: { version: "2" } });
    expect(gone.body).toMatchObject({ name: "Bagging", minutesPerKit: "7", position: 1 });
    expect(await names()).toEqual(["Testing"]);
    const back = { name: "Bagging", editions: null, minutesPerKit: "7", setUpMinutes: "30", position: 1 };
    expect((await call(addTask, { as, params, body: back })).status).toBe(201);
    expect(await names()).toEqual(["Bagging", "Testing"]);
  });

  it("name editions of this kit only", async () => {
    const { workshop, params, designer } = place();
    const other = runKit(app, workshop, "Rain Post");
    const body = { name: "Box", editions: [params.edition, other.edition], costPerKit: null };
    const answer = await call(addPacking, { as: designer, params, body });
    expect(answer.problem?.errors).toEqual([{ at: "editions.1", message: "Name an edition of this kit." }]);
  });

  it("do not fill a list beyond what a plan may hold", async () => {
    const { params, designer, plan } = place();
    const body = { name: "Test of safety", amount: "285", spreadOver: 500 };
    for (let row = 1; row < 100; row++)
      expect((await call(addCharge, { as: designer, params, body })).status).toBe(201);
    expect((await call(addCharge, { as: designer, params, body })).status).toBe(422);
    expect((await plan()).plan.charges).toHaveLength(100);
  });
});
