import { describe, expect, it } from "vitest";
import {
  PATCH as change,
  DELETE as remove,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/channels/[channel].ts";
import {
  POST as add,
  GET as list,
  PUT as order,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/channels/index.ts";
import { DELETE as removeEdition } from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/[edition]/index.ts";
import { POST as addEdition } from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/index.ts";
import { GET as getPlan } from "#src/pages/api/workshops/[workshop]/kits/[kit]/plan.ts";
import type { ChannelEntry } from "#src/shapes/channel.ts";
import { channel } from "#tests/costing/price/channels.ts";
import { call, testApp } from "#tests/support/app.ts";
import { runKit } from "#tests/support/run-kit.ts";

const app = testApp();

function place() {
  const workshop = app.workshop();
  const kit = runKit(app, workshop);
  const params = { workshop: workshop.id, kit: kit.id, channel: kit.site, edition: kit.edition };
  const person = (role: "owner" | "designer" | "seller" | "co-builder") => app.person(role, workshop);
  const seller = person("seller");
  const plan = async () => (await call(getPlan, { as: seller, params, method: "GET" })).body;
  const make = async (over: Partial<ChannelEntry>) => {
    const { id: _, ...entry } = channel({ name: "Club stall", ...over });
    return call(add, { as: seller, params, body: entry });
  };
  return { workshop, kit, params, person, seller, plan, make };
}

describe("the channels of a kit", () => {
  it("are changed by owner and seller, seen by the designer, and hidden from a co-builder", async () => {
    const { kit, params, person } = place();
    const coBuilder = person("co-builder");
    app.guest(coBuilder, kit);
    const tries = [person("owner"), person("seller"), person("designer"), coBuilder].map(
      async (as, place) => {
        const patched = await call(change, {
          as,
          params,
          body: { version: place + 1, minutesPerOrder: "12" },
        });
        const listed = await call(list, { as, params, method: "GET" });
        return [patched.status, listed.status];
      },
    );
    expect(await Promise.all(tries)).toEqual([
      [200, 200],
      [200, 200],
      [403, 200],
      [403, 403],
    ]);
  });

  it("of another kit or workshop are not found", async () => {
    const { params, workshop, seller } = place();
    const other = runKit(app, workshop, "Rain Post");
    const elsewhere = place();
    const body = { version: 1, weight: 3 };
    const near = await call(change, { as: seller, params: { ...params, channel: other.site }, body });
    const far = await call(change, { as: elsewhere.seller, params, body });
    expect([near.status, far.status]).toEqual([404, 404]);
  });

  it("are added with their own prices, and stand in the plan with the version to name", async () => {
    const { make, plan, kit } = place();
    const prices = [{ edition: kit.edition, price: "20.50" }];
    const { status, body } = await make({
      weight: 2,
      ownPrices: prices,
      taxStated: "on-top",
      discount: "-0.06",
    });
    expect([status, body.version]).toEqual([201, 1]);
    const { plan: after, versions } = await plan();
    expect(after.channels.map(({ name, weight }) => [name, weight])).toEqual([
      ["Own site", 1],
      ["Club stall", 2],
    ]);
    expect(after.channels[1]).toMatchObject({ ownPrices: prices, taxStated: "on-top", discount: "-0.06" });
    expect(versions.rows[body.id]).toBe(1);
  });

  it("keep what is left out of a change; own prices and the other cost change as a whole", async () => {
    const { params, seller, plan, kit } = place();
    const other = { name: "Stall hire", amount: "45.00", sharedOver: 25 };
    const ownPrices = [{ edition: kit.edition, price: "11" }];
    const first = { version: 1, other, ownPrices };
    expect((await call(change, { as: seller, params, body: first })).body).toEqual({ version: 2 });
    const second = { version: 2, ownPrices: [] };
    expect((await call(change, { as: seller, params, body: second })).body).toEqual({ version: 3 });
    expect((await plan()).plan.channels[0]).toMatchObject({ other, ownPrices: [], feeRate: "0" });
  });

  it("show both values to the second of two people who change one at once", async () => {
    const { params, seller, person } = place();
    const owner = person("owner");
    await call(change, { as: seller, params, body: { version: 1, feeRate: "0.05" } });
    const late = await call(change, { as: owner, params, body: { version: 1, feeRate: "0.07" } });
    expect(late.status).toBe(409);
    expect(late.problem?.current).toMatchObject({
      feeRate: "0.05",
      other: { name: "", amount: "0", sharedOver: 1 },
      version: 2,
      changedBy: seller.name,
    });
    const gone = await call(remove, { as: owner, params, method: "DELETE", query: { version: "1" } });
    expect(gone.status).toBe(409);
  });

  it("come in another order without a new version", async () => {
    const { params, seller, make, plan, kit } = place();
    const { body } = await make({});
    const channels = [body.id, kit.site];
    expect((await call(order, { as: seller, params, method: "PUT", body: { channels } })).body).toEqual({
      channels,
    });
    const { plan: after, versions } = await plan();
    expect(after.channels.map(({ id }) => id)).toEqual(channels);
    expect(versions.rows[kit.site]).toBe(1);
    const short = await call(order, { as: seller, params, method: "PUT", body: { channels: [body.id] } });
    expect(short.problem?.errors?.map(({ at }) => at)).toEqual(["channels"]);
  });

  it("are removed and handed back; the last one stays", async () => {
    const { params, seller, make, plan, kit } = place();
    const { body } = await make({ weight: 4 });
    const asked = { as: seller, params: { ...params, channel: body.id }, method: "DELETE" };
    const gone = await call(remove, { ...asked, query: { version: "1" } });
    expect(gone.body).toMatchObject({ name: "Club stall", weight: 4, position: 1 });
    const last = await call(remove, { as: seller, params, method: "DELETE", query: { version: "1" } });
    expect(last.problem?.errors?.map(({ at }) => at)).toEqual(["channel"]);
    expect((await plan()).plan.channels.map(({ id }) => id)).toEqual([kit.site]);
  });

  it("forget an edition that is gone", async () => {
    const { workshop, params, make, plan } = place();
    const designer = app.person("designer", workshop);
    const bare = { name: "Bare board", weight: 1, boardsPerKit: 1, like: null };
    const { body } = await call(addEdition, { as: designer, params, body: bare });
    const edition = (body as { id: string }).id;
    await make({ editions: [edition], ownPrices: [{ edition, price: "9.00" }] });
    const at = { ...params, edition };
    const lost = await call(removeEdition, {
      as: designer,
      params: at,
      method: "DELETE",
      query: { version: "1" },
    });
    expect(lost.body.forNothing).toEqual(["Club stall"]);
    expect((await plan()).plan.channels[1]).toMatchObject({ editions: [], ownPrices: [] });
  });
});

describe("what is refused, with its field named", () => {
  it.each([
    ["a fee of 100 %", { feeRate: "1" }, "feeRate"],
    ["fee and tax that leave nothing", { feeRate: "0.85", taxRate: "0.21" }, "feeRate"],
    ["a discount of all of the price", { discount: "1" }, "discount"],
    ["an order of half a kit", { kitsPerOrder: "0.5" }, "kitsPerOrder"],
    ["a cost shared over no order", { other: { name: "", amount: "1", sharedOver: 0 } }, "other.sharedOver"],
    ["an edition of no kit", { editions: ["nowhere"] }, "editions.0"],
    [
      "a price for an edition of no kit",
      { ownPrices: [{ edition: "no", price: "1" }] },
      "ownPrices.0.edition",
    ],
    ["a name without a letter", { name: " " }, "name"],
  ])("%s", async (_, fields, at) => {
    const { params, seller } = place();
    const answer = await call(change, { as: seller, params, body: { version: 1, ...fields } });
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([at]);
  });

  it("a name that stands there already, and a thirteenth channel", async () => {
    const { make } = place();
    expect((await make({ name: "Own site" })).problem?.errors?.[0]?.at).toBe("name");
    for (let count = 2; count <= 12; count += 1)
      expect((await make({ name: `Stall ${count}` })).status).toBe(201);
    expect((await make({ name: "Stall 13" })).problem?.errors?.[0]?.at).toBe("name");
  });

  it("a high fee on sums without tax is not: it always leaves something", async () => {
    const { params, seller } = place();
    const body = { version: 1, feeRate: "0.85", taxRate: "0.21", feeOnTax: false };
    expect((await call(change, { as: seller, params, body })).status).toBe(200);
  });
});
