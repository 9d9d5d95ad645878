import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { activity } from "#db/schema/activity.ts";
import { lines } from "#db/schema/parts.ts";
import { GET as ofKit } from "#src/pages/api/workshops/[workshop]/kits/[kit]/offers.ts";
import { DELETE, PATCH } from "#src/pages/api/workshops/[workshop]/offers/[offer].ts";
import { POST as batch } from "#src/pages/api/workshops/[workshop]/offers.ts";
import { POST as add, GET as ofPart } from "#src/pages/api/workshops/[workshop]/parts/[part]/offers.ts";
import { POST as addSupplier } from "#src/pages/api/workshops/[workshop]/suppliers.ts";
import { newId } from "#src/server/new-id.ts";
import type { KitRow } from "#src/server/store/kit.ts";
import type { PartRow } from "#src/server/store/part.ts";
import { type LineMark, OFFERS_PER_PART_MOST, ROLES } from "#src/shapes/limits.ts";
import { call, testApp } from "#tests/support/app.ts";
import { anOffer, aPart, SUPPLIER } from "#tests/support/supply.ts";

const app = testApp();

async function ground() {
  const workshop = app.workshop();
  const as = app.person("designer", workshop);
  const params = { workshop: workshop.id };
  const supplier = (await call(addSupplier, { as, params, body: SUPPLIER })).body.id;
  const part = aPart(app, workshop);
  const added = (over = {}) =>
    call(add, { as, params: { ...params, part: part.id }, body: { ...anOffer(supplier), ...over } });
  const listed = async () =>
    (await call(ofPart, { as, params: { ...params, part: part.id }, method: "GET" })).body;
  return { workshop, as, params, supplier, part, added, listed };
}

function onLine(kit: KitRow, part: PartRow, mark: LineMark = "in-kit", position = 1) {
  const row = { id: newId(), workshopId: kit.workshopId, kitId: kit.id, partId: part.id };
  app.db
    .insert(lines)
    .values({ ...row, position, designators: "LED1", mark, note: "" })
    .run();
}

const LADDER = [
  { quantity: 10, price: "0.12" },
  { quantity: 100, price: "0.08" },
];

describe("offers", () => {
  it("are added to a part with their ladder, smallest quantity first", async () => {
    const { part, supplier, added, listed } = await ground();
    const breaks = [...anOffer(supplier).breaks].reverse();
    const { status, body } = await added({ breaks });
    expect(status).toBe(201);
    expect(body).toMatchObject({ ...anOffer(supplier), partId: part.id, version: 1 });
    expect(await listed()).toEqual([body]);
  });

  it.each([
    [
      "a quantity that stands twice",
      { breaks: [...LADDER, { quantity: 10, price: "0.1" }] },
      "breaks.2.quantity",
    ],
    ["a break below the minimum order", { breaks: LADDER, minimumOrder: 20 }, "breaks.0.quantity"],
    [
      "slices below the minimum order",
      { priceModel: "by-slice", breaks: LADDER, minimumOrder: 20 },
      "breaks.0.quantity",
    ],
    [
      "a minimum order that is no multiple",
      { breaks: LADDER, minimumOrder: 8, orderMultiple: 5 },
      "minimumOrder",
    ],
    [
      "a lot that is no multiple",
      { priceModel: "lots", breaks: LADDER, minimumOrder: 25, orderMultiple: 25 },
      "breaks.0.quantity",
    ],
    ["a quantity of nothing", { breaks: [{ quantity: 0, price: "1" }] }, "breaks.0.quantity"],
    ["half a piece", { breaks: [{ quantity: 1.5, price: "1" }] }, "breaks.0.quantity"],
    ["a negative quantity", { breaks: [{ quantity: -10, price: "1" }] }, "breaks.0.quantity"],
    ["a negative price", { breaks: [{ quantity: 10, price: "-1" }] }, "breaks.0.price"],
    ["a seventh decimal", { breaks: [{ quantity: 10, price: "0.0000001" }] }, "breaks.0.price"],
    ["a price as a number", { breaks: [{ quantity: 10, price: 0.1 }] }, "breaks.0.price"],
    ["no minimum order", { minimumOrder: 0 }, "minimumOrder"],
    ["a multiple of nothing", { orderMultiple: 0 }, "orderMultiple"],
    ["stock below nothing", { stockShown: -1 }, "stockShown"],
    ["an end before its beginning", { pricedOn: "2026-03-07", validUntil: "2026-03-06" }, "validUntil"],
    ["a day that is not in the calendar", { pricedOn: "2026-02-30" }, "pricedOn"],
    ["a currency nobody can pay in", { currency: "XTS" }, "currency"],
    ["a supplier that is not there", { supplierId: "nobody" }, "supplierId"],
  ])("are refused with %s, and the field is named", async (_, over, at) => {
    const { added, listed } = await ground();
    const free = { breaks: [], minimumOrder: 1, orderMultiple: 1 };
    const answer = await added({ ...free, ...over });
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([at]);
    expect(await listed()).toEqual([]);
  });

  it("say how a ladder would be right", async () => {
    const { added } = await ground();
    const { problem } = await added({
      breaks: [{ quantity: 10, price: "0.1" }],
      minimumOrder: 15,
      orderMultiple: 10,
    });
    expect(problem?.errors).toEqual([
      { at: "minimumOrder", message: "15 is not a multiple of 10. Write 10 or 20." },
      {
        at: "breaks.0.quantity",
        message: "10 is below the minimum order of 15, so nobody can buy at this price.",
      },
    ]);
  });

  it.each([
    [
      "a price that rises with quantity",
      {
        breaks: [
          { quantity: 100, price: "0.05" },
          { quantity: 500, price: "0.06" },
        ],
      },
    ],
    ["no price yet", { breaks: [] }],
    [
      "a lot below the minimum order",
      { priceModel: "lots", breaks: [{ quantity: 100, price: "9" }], minimumOrder: 200 },
    ],
    ["six decimals", { breaks: [{ quantity: 100, price: "0.004321" }] }],
    ["another currency than the supplier's", { currency: "USD" }],
  ])("are taken with %s", async (_, over) => {
    const { added } = await ground();
    expect((await added(over)).status).toBe(201);
  });

  it("have one code at one supplier for one part", async () => {
    const { as, params, added } = await ground();
    await added();
    expect((await added()).problem?.errors?.[0]?.at).toBe("orderCode");
    const { body } = await added({ orderCode: "" });
    const nameless = await added({ orderCode: " " });
    expect(nameless.problem?.errors?.[0]?.message).toContain("without an order code");
    const again = { version: 1, orderCode: "LH-5WW-30" };
    const changed = await call(PATCH, { as, params: { ...params, offer: body.id }, body: again });
    expect(changed.problem?.errors?.[0]?.at).toBe("orderCode");
  });

  it("are changed field by field, held against the fields that stay, and logged", async () => {
    const { as, params, added, listed } = await ground();
    const { body } = await added();
    const at = { ...params, offer: body.id };
    const refused = await call(PATCH, { as, params: at, body: { version: 1, minimumOrder: 200 } });
    expect(refused.problem?.errors?.[0]?.at).toBe("breaks.0.quantity");
    const changed = await call(PATCH, {
      as,
      params: at,
      body: { version: 1, breaks: LADDER, minimumOrder: 10, orderMultiple: 10 },
    });
    expect(changed.body).toEqual({
      ...body,
      breaks: LADDER,
      minimumOrder: 10,
      orderMultiple: 10,
      version: 2,
    });
    expect(await listed()).toEqual([changed.body]);
    const log = app.db.select().from(activity).where(eq(activity.subjectId, body.id)).all();
    expect(log.map((entry) => entry.action)).toEqual(["offer.add", "offer.change"]);
    expect(log[1]?.detail).toMatchObject({ minimumOrder: [100, 10] });
  });

  it("show both values to somebody who changes what another changed meanwhile", async () => {
    const { as, params, added } = await ground();
    const { body } = await added();
    const at = { ...params, offer: body.id };
    await call(PATCH, { as, params: at, body: { version: 1, stockShown: 10 } });
    const late = await call(PATCH, { as, params: at, body: { version: 1, stockShown: 20 } });
    expect(late.status).toBe(409);
    expect(late.problem?.current).toMatchObject({ id: body.id, stockShown: 10, version: 2 });
    expect((await call(DELETE, { as, params: at, query: { version: "1" } })).status).toBe(409);
    expect((await call(DELETE, { as, params: at, query: { version: "2" } })).status).toBe(204);
    expect((await call(PATCH, { as, params: at, body: { version: 2, stockShown: 1 } })).status).toBe(404);
  });

  it("of a kit are those for the parts it buys, with what the list calls them", async () => {
    const { workshop, as, params, part, supplier, added } = await ground();
    const { body } = await added();
    const [kit, without] = [app.kit(workshop), app.kit(workshop)];
    onLine(kit, part);
    const left = aPart(app, workshop, "Fuse");
    onLine(kit, left, "do-not-place", 2);
    await call(add, { as, params: { ...params, part: left.id }, body: anOffer(supplier) });
    const of = async ({ id }: KitRow) =>
      (await call(ofKit, { as, params: { ...params, kit: id }, method: "GET" })).body;
    const seen = await of(kit);
    expect(seen.offers).toEqual([body]);
    expect(seen.parts).toEqual([
      {
        id: part.id,
        name: "LED, warm white",
        spec: "",
        class: "led",
        value: null,
        lines: [1],
        designators: "LED1",
        choiceVersion: 0,
      },
    ]);
    expect(seen.suppliers.map(({ id }) => id)).toEqual([supplier]);
    expect((await of(without)).offers).toEqual([]);
  });

  it("are at most so many for a part", async () => {
    const { added } = await ground();
    for (let number = 0; number < OFFERS_PER_PART_MOST; number += 1)
      expect((await added({ orderCode: `code ${number}` })).status).toBe(201);
    expect((await added({ orderCode: "one more" })).status).toBe(422);
  });

  it("of another workshop are not there, and its ids are refused by field", async () => {
    const { as, params, part, added } = await ground();
    const theirs = await ground();
    const offer = (await theirs.added()).body;
    const at = { as, params: { ...params, offer: offer.id, part: theirs.part.id } };
    expect((await call(PATCH, { ...at, body: { version: 1, stockShown: 1 } })).status).toBe(404);
    expect((await call(DELETE, { ...at, query: { version: "1" } })).status).toBe(404);
    expect((await call(ofPart, { ...at, method: "GET" })).status).toBe(404);
    expect((await call(add, { ...at, body: anOffer(theirs.supplier) })).status).toBe(404);
    expect((await added({ supplierId: theirs.supplier })).problem?.errors?.[0]?.at).toBe("supplierId");
    const own = (await added()).body;
    const moved = { version: 1, supplierId: theirs.supplier };
    const change = await call(PATCH, { as, params: { ...params, offer: own.id }, body: moved });
    expect(change.problem?.errors?.[0]?.at).toBe("supplierId");
    const strange = { add: [{ ...anOffer(own.supplierId), orderCode: "x", partId: theirs.part.id }] };
    const pasted = await call(batch, { as, params, body: strange });
    expect(pasted.problem?.errors?.[0]?.at).toBe("add.0.partId");
    expect(part.id).toBe(own.partId);
  });

  it.each(ROLES)("are seen and changed by a %s as the table says", async (role) => {
    const { workshop, params, part, supplier } = await ground();
    const as = app.person(role, workshop);
    const at = { as, params: { ...params, part: part.id } };
    expect((await call(ofPart, { ...at, method: "GET" })).status).toBe(role === "co-builder" ? 403 : 200);
    const may = role === "owner" || role === "designer";
    expect((await call(add, { ...at, body: anOffer(supplier) })).status).toBe(may ? 201 : 403);
    expect((await call(batch, { ...at, body: {} })).status).toBe(may ? 200 : 403);
  });
});

describe("a batch of offers", () => {
  it("changes, adds and removes at once", async () => {
    const { as, params, part, supplier, added, listed } = await ground();
    const one = (await added({ orderCode: "one" })).body;
    const two = (await added({ orderCode: "two" })).body;
    const body = {
      change: [{ id: one.id, version: 1, stockShown: 5 }],
      add: [{ ...anOffer(supplier), orderCode: "two", partId: part.id }],
      remove: [{ id: two.id, version: 1 }],
    };
    const answer = await call(batch, { as, params, body });
    expect(answer.status).toBe(200);
    expect(answer.body.changed).toEqual([{ ...one, stockShown: 5, version: 2 }]);
    expect(answer.body.added[0]).toMatchObject({ orderCode: "two", version: 1 });
    const byCode = (await listed()).map(({ orderCode, stockShown }) => [orderCode, stockShown]).sort();
    expect(byCode).toEqual([
      ["one", 5],
      ["two", 8400],
    ]);
  });

  it.each([
    ["a ladder that cannot be climbed", { minimumOrder: 200 }, 422, "change.1.breaks.0.quantity"],
    ["a version that has moved on", { version: 7 }, 409, undefined],
    ["an offer that is gone", { id: "nobody" }, 404, undefined],
  ])("takes nothing when one of it has %s", async (_, wrong, status, at) => {
    const { as, params, added, listed } = await ground();
    const one = (await added({ orderCode: "one" })).body;
    const two = (await added({ orderCode: "two" })).body;
    const before = await listed();
    const body = {
      change: [
        { id: one.id, version: 1, stockShown: 5 },
        { id: two.id, version: 1, stockShown: 5, ...wrong },
      ],
      remove: [],
    };
    const answer = await call(batch, { as, params, body });
    expect(answer.status).toBe(status);
    expect(answer.problem?.errors?.[0]?.at).toBe(at);
    expect(await listed()).toEqual(before);
  });

  it("names everything that is wrong with a pasted block, not the first alone", async () => {
    const { as, params, part, supplier, added } = await ground();
    const { body: one } = await added();
    const body = {
      change: [{ id: one.id, version: 1, minimumOrder: 150 }],
      add: [{ ...anOffer(supplier), orderCode: "two", partId: part.id, validUntil: "2026-01-01" }],
    };
    const { problem } = await call(batch, { as, params, body });
    expect(problem?.errors?.map((error) => error.at)).toEqual([
      "change.0.minimumOrder",
      "change.0.breaks.0.quantity",
      "add.0.validUntil",
    ]);
  });
});
