import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { activity } from "#db/schema/activity.ts";
import { shutOutSuppliers } from "#db/schema/supply.ts";
import * as shutOut from "#src/pages/api/workshops/[workshop]/kits/[kit]/suppliers/[supplier]/shut-out.ts";
import { POST as addOffer } from "#src/pages/api/workshops/[workshop]/parts/[part]/offers.ts";
import { GET as offersOf } from "#src/pages/api/workshops/[workshop]/suppliers/[supplier]/offers.ts";
import { DELETE, GET, PATCH } from "#src/pages/api/workshops/[workshop]/suppliers/[supplier].ts";
import { POST as add, GET as list } from "#src/pages/api/workshops/[workshop]/suppliers.ts";
import { ROLES } from "#src/shapes/limits.ts";
import { call, testApp } from "#tests/support/app.ts";
import { anOffer, aPart, SUPPLIER } from "#tests/support/supply.ts";

const app = testApp();

function ground() {
  const workshop = app.workshop();
  const as = app.person("designer", workshop);
  const params = { workshop: workshop.id };
  const added = (over = {}) => call(add, { as, params, body: { ...SUPPLIER, ...over } });
  return { workshop, as, params, added };
}

describe("suppliers", () => {
  it("are added, listed by name with the number of their offers, and read", async () => {
    const { workshop, as, params, added } = ground();
    const { body: lumenhof, status } = await added();
    expect(status).toBe(201);
    expect(lumenhof).toMatchObject({ ...SUPPLIER, version: 1, offers: 0 });
    await added({ name: "Ebbing" });
    const part = aPart(app, workshop);
    await call(addOffer, { as, params: { ...params, part: part.id }, body: anOffer(lumenhof.id) });
    const { body } = await call(list, { as, params, method: "GET" });
    expect(body.map(({ name, offers }) => [name, offers])).toEqual([
      ["Ebbing", 0],
      ["Lumenhof", 1],
    ]);
    const one = await call(GET, { as, params: { ...params, supplier: lumenhof.id }, method: "GET" });
    expect(one.body).toEqual({ ...lumenhof, offers: 1 });
    expect(JSON.stringify(one.body)).not.toContain(workshop.id);
  });

  it.each([
    ["no name", { name: "  " }, "name"],
    ["a currency that does not exist", { currency: "EUX" }, "currency"],
    ["a metal for a currency", { currency: "XAU" }, "currency"],
    ["flat freight without its amount", { freightAmount: null }, "freightAmount"],
    ["a small-order fee without its amount", { smallOrderTerm: "fee" }, "smallOrderFee"],
    ["a third decimal of a cent", { freeFreightFrom: "49.995" }, "freeFreightFrom"],
    ["decimals of the yen", { currency: "JPY", freightAmount: "4.90" }, "freightAmount"],
    ["a negative amount", { handlingFee: "-1" }, "handlingFee"],
    ["an amount as a number", { handlingFee: 1 }, "handlingFee"],
    ["half a day", { leadTimeDays: 0.5 }, "leadTimeDays"],
    ["a term nobody knows", { freightTerm: "free" }, "freightTerm"],
    ["a field nobody knows", { colour: "red" }, ""],
  ])("are refused with %s, and the field is named", async (_, over, at) => {
    const { as, params, added } = ground();
    const answer = await added(over);
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([at]);
    expect((await call(list, { as, params, method: "GET" })).body).toEqual([]);
  });

  it("take three decimals in a currency that has them", async () => {
    const { added } = ground();
    expect((await added({ currency: "KWD", freightAmount: "1.255" })).status).toBe(201);
  });

  it("do not need to know their freight, and never count it as nothing", async () => {
    const { added } = ground();
    const { body } = await added({ freightTerm: "not-known", freightAmount: null });
    expect(body.freightTerm).toBe("not-known");
    expect(body.freightAmount).toBeNull();
  });

  it("have names of their own", async () => {
    const { as, params, added } = ground();
    await added();
    const second = await added();
    expect(second.problem?.errors).toEqual([
      { at: "name", message: "There is a supplier called Lumenhof already." },
    ]);
    const { body: ebbing } = await added({ name: "Ebbing" });
    const renamed = await call(PATCH, {
      as,
      params: { ...params, supplier: ebbing.id },
      body: { version: 1, name: "Lumenhof" },
    });
    expect(renamed.problem?.errors?.[0]?.at).toBe("name");
  });

  it("are changed field by field, held against the fields that stay", async () => {
    const { as, params, added } = ground();
    const { body } = await added();
    const at = { ...params, supplier: body.id };
    const changed = await call(PATCH, { as, params: at, body: { version: 1, freeFreightFrom: "50" } });
    expect(changed.body).toEqual({ ...body, freeFreightFrom: "50", version: 2 });
    const refused = await call(PATCH, { as, params: at, body: { version: 2, freightAmount: null } });
    expect(refused.problem?.errors?.[0]?.at).toBe("freightAmount");
    const log = app.db.select().from(activity).where(eq(activity.subjectId, body.id)).all();
    expect(log.map(({ action, detail }) => [action, detail])).toEqual([
      ["supplier.add", {}],
      ["supplier.change", { freeFreightFrom: [null, "50"] }],
    ]);
  });

  it("show both values to somebody who changes what another changed meanwhile", async () => {
    const { workshop, as, params, added } = ground();
    const { body } = await added();
    const other = app.person("owner", workshop, { name: "Tom" });
    const at = { ...params, supplier: body.id };
    await call(PATCH, { as: other, params: at, body: { version: 1, freightAmount: "5.50" } });
    const answer = await call(PATCH, { as, params: at, body: { version: 1, freightAmount: "6.00" } });
    expect(answer.status).toBe(409);
    expect(answer.problem?.current).toMatchObject({ freightAmount: "5.50", version: 2, changedBy: "Tom" });
    expect((await call(DELETE, { as, params: at, query: { version: "1" } })).status).toBe(409);
  });

  it("go with their offers, and say how many", async () => {
    const { workshop, as, params, added } = ground();
    const { body } = await added();
    for (const name of ["LED", "Lamp"]) {
      const part = aPart(app, workshop, name);
      await call(addOffer, { as, params: { ...params, part: part.id }, body: anOffer(body.id) });
    }
    const at = { ...params, supplier: body.id };
    expect((await call(offersOf, { as, params: at, method: "GET" })).body).toHaveLength(2);
    expect((await call(DELETE, { as, params: at, query: { version: "1" } })).body).toEqual({ offers: 2 });
    expect((await call(GET, { as, params: at, method: "GET" })).status).toBe(404);
  });

  it("can be shut out of a kit and let in again", async () => {
    const { workshop, as, params, added } = ground();
    const { body } = await added();
    const at = { ...params, kit: app.kit(workshop).id, supplier: body.id };
    expect((await call(shutOut.PUT, { as, params: at })).status).toBe(204);
    expect((await call(shutOut.PUT, { as, params: at })).status).toBe(204);
    expect(app.db.select().from(shutOutSuppliers).all()).toHaveLength(1);
    expect((await call(shutOut.DELETE, { as, params: at })).status).toBe(204);
    expect(app.db.select().from(shutOutSuppliers).all()).toEqual([]);
  });

  it("of another workshop are not there", async () => {
    const { workshop, as, params } = ground();
    const elsewhere = ground();
    const { body } = await elsewhere.added();
    const at = { ...params, supplier: body.id, kit: app.kit(workshop).id };
    const asked = { as, params: at };
    expect((await call(GET, { ...asked, method: "GET" })).status).toBe(404);
    expect((await call(offersOf, { ...asked, method: "GET" })).status).toBe(404);
    expect((await call(PATCH, { ...asked, body: { version: 1, name: "Mine" } })).status).toBe(404);
    expect((await call(DELETE, { ...asked, query: { version: "1" } })).status).toBe(404);
    expect((await call(shutOut.PUT, asked)).status).toBe(404);
    expect(
      (await call(GET, { ...elsewhere, params: { ...elsewhere.params, supplier: body.id } })).status,
    ).toBe(200);
  });

  it.each(ROLES)("are seen and changed by a %s as the table says", async (role) => {
    const { workshop, params, added } = ground();
    const { body } = await added();
    const as = app.person(role, workshop);
    const sees = await call(list, { as, params, method: "GET" });
    expect(sees.status).toBe(role === "co-builder" ? 403 : 200);
    if (role === "co-builder") expect(JSON.stringify(sees.problem)).not.toContain("4.90");
    const may = role === "owner" || role === "designer";
    const change = { as, params: { ...params, supplier: body.id }, body: { version: 1, note: "Ring first" } };
    expect((await call(PATCH, change)).status).toBe(may ? 200 : 403);
  });
});
