import { describe, expect, it } from "vitest";
import { offers, suppliers } from "#db/schema/supply.ts";
import { PATCH as choose } from "#src/pages/api/workshops/[workshop]/kits/[kit]/choices/[part].ts";
import { GET, PATCH } from "#src/pages/api/workshops/[workshop]/kits/[kit]/lines/index.ts";
import { POST as newKit } from "#src/pages/api/workshops/[workshop]/kits/index.ts";
import { PATCH as changePart } from "#src/pages/api/workshops/[workshop]/parts/[part].ts";
import type { PartsChange } from "#src/shapes/parts-change.ts";
import { call, type TestPerson, testApp } from "#tests/support/app.ts";

const app = testApp();

interface Place {
  as: TestPerson;
  workshop: string;
  params: { workshop: string; kit: string };
  edition: string;
}

const read = async ({ as, params }: Pick<Place, "as" | "params">) =>
  (await call(GET, { as, params, method: "GET" })).body;

async function kitIn(workshop: { id: string }, as: TestPerson, name: string): Promise<Place> {
  const kit = (await call(newKit, { as, params: { workshop: workshop.id }, body: { name } })).body;
  const params = { workshop: workshop.id, kit: kit.id };
  const edition = (await read({ as, params })).editions[0]?.id ?? "";
  return { as, workshop: workshop.id, params, edition };
}

async function place(): Promise<Place> {
  const workshop = app.workshop();
  return kitIn(workshop, app.person("designer", workshop), "Fen Beacon");
}

const change = ({ as, params }: Place, ...changes: object[]) =>
  call(PATCH, { as, params, body: { changes } });

function line(at: Place, designators: string, name: string, over: object = {}): PartsChange {
  const part = { class: "resistor" as const, name };
  const own = { designators, mark: "in-kit" as const, note: "", quantities: { [at.edition]: 1 }, part };
  return { do: "add-line", ...own, ...over };
}

describe("adding lines", () => {
  it("keeps designators expanded and in reading order, and reuses a part that reads the same", async () => {
    const at = await place();
    const { body } = await change(at, line(at, "R10, R2-R4", "10 kΩ"), line(at, "R7", "10 kΩ"));
    expect(body.lines.map(({ designators }) => designators)).toEqual(["R2, R3, R4, R10", "R7"]);
    expect(body.lines[0]?.part.id).toBe(body.lines[1]?.part.id);
    expect(body.order).toEqual(body.lines.map(({ id }) => id));
  });

  it("puts a line where it is asked to and keeps the order of the rest", async () => {
    const at = await place();
    await change(at, line(at, "R1", "1 kΩ"), line(at, "R2", "2 kΩ"));
    await change(at, line(at, "R3", "3 kΩ", { at: 1 }));
    const list = await read(at);
    expect(list.lines.map(({ designators }) => designators)).toEqual(["R1", "R3", "R2"]);
    await change(at, { do: "move-line", line: list.lines[2]?.id, to: 0 });
    expect((await read(at)).lines.map(({ designators }) => designators)).toEqual(["R2", "R1", "R3"]);
  });

  it("brings a removed line back as the same line", async () => {
    const at = await place();
    const added = (await change(at, line(at, "R1", "1 kΩ"))).body.lines[0];
    await change(at, { do: "remove-line", line: added?.id, version: 1 });
    expect((await read(at)).lines).toEqual([]);
    const back = await change(at, line(at, "R1", "", { line: added?.id, part: added?.part.id }));
    expect(back.body.lines[0]).toMatchObject({ id: added?.id, part: { id: added?.part.id } });
  });
});

describe("a batch", () => {
  it("is taken whole or not at all, and names every step that cannot be taken", async () => {
    const at = await place();
    const added = (await change(at, line(at, "R1", "1 kΩ"))).body.lines[0];
    const answer = await change(
      at,
      { do: "change-line", line: added?.id, version: 1, set: { note: "first" } },
      { do: "change-line", line: added?.id, version: 2, set: { quantities: { elsewhere: 2 } } },
      line(at, "all of them please", "1 kΩ"),
    );
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.map((error) => error.at)).toEqual([
      "changes.1.set.quantities.elsewhere",
      "changes.2.designators",
    ]);
    expect((await read(at)).lines).toMatchObject([{ note: "", version: 1 }]);
  });

  it("comes back with what stands there now where a step saw an older version", async () => {
    const at = await place();
    const added = (await change(at, line(at, "R1", "1 kΩ"))).body.lines[0];
    await change(at, { do: "change-line", line: added?.id, version: 1, set: { note: "his" } });
    const late = await change(at, line(at, "R2", "2 kΩ"), {
      do: "change-line",
      line: added?.id,
      version: 1,
      set: { note: "hers" },
    });
    expect(late.status).toBe(409);
    expect(late.problem?.current).toMatchObject({
      clashes: [{ change: 1, current: { note: "his", version: 2, changedBy: at.as.name } }],
    });
    expect((await read(at)).lines).toHaveLength(1);
  });

  it("refuses a value without a unit before anything is read from the database", async () => {
    const at = await place();
    const answer = await change(
      at,
      line(at, "R1", "", { part: { class: "resistor", name: "1k", value: "1000" } }),
    );
    expect(answer.status).toBe(422);
    expect(answer.problem?.errors?.[0]?.at).toMatch(/^changes\.0\.part/);
  });
});

describe("a part that two kits use", () => {
  it("changes in both, says so, and can be parted", async () => {
    const one = await place();
    const two = await kitIn({ id: one.workshop }, one.as, "Reed Chime");
    const part = (await change(one, line(one, "R1", "1 kΩ"))).body.lines[0]?.part;
    await change(two, line(two, "R9", "1 kΩ"));
    const shared = (await read(two)).lines[0];
    expect(shared?.part).toMatchObject({ id: part?.id, alsoIn: ["Fen Beacon"] });

    await change(one, { do: "change-part", part: part?.id, version: 1, set: { drawer: "A4" } });
    expect((await read(two)).lines[0]?.part.drawer).toBe("A4");

    await change(two, { do: "own-part", line: shared?.id, version: 1, set: { spec: "1 %" } });
    const [here, there] = [(await read(two)).lines[0], (await read(one)).lines[0]];
    expect(here?.part).toMatchObject({ name: "1 kΩ", spec: "1 %", alsoIn: [] });
    expect(there?.part).toMatchObject({ id: part?.id, spec: "" });
  });

  it("refuses the second of two changes that saw the same part", async () => {
    const at = await place();
    const part = (await change(at, line(at, "R1", "1 kΩ"))).body.lines[0]?.part.id ?? "";
    const asking = { as: at.as, params: { workshop: at.workshop, part } };
    expect(
      (await call(changePart, { ...asking, body: { version: 1, set: { name: "1.1 kΩ" } } })).status,
    ).toBe(200);
    const late = await call(changePart, { ...asking, body: { version: 1, set: { name: "1.2 kΩ" } } });
    expect(late.problem?.current).toMatchObject({ name: "1.1 kΩ" });
  });
});

describe("ids of another workshop or kit inside a change", () => {
  it("are not found there", async () => {
    const [ours, theirs] = [await place(), await place()];
    const foreign = (await change(theirs, line(theirs, "R1", "1 kΩ"))).body.lines[0];
    const id = foreign?.id ?? "";
    const part = foreign?.part.id ?? "";
    for (const step of [
      { do: "change-line", line: id, version: 1, set: { note: "mine" } },
      { do: "remove-line", line: id, version: 1 },
      { do: "move-line", line: id, to: 0 },
      { do: "own-part", line: id, version: 1, set: {} },
      { do: "change-part", part, version: 1, set: { name: "mine" } },
      { do: "choose", part, version: 0, set: { leastSpare: 3 } },
      line(ours, "R1", "", { part }),
      line(ours, "R1", "1 kΩ", { line: id }),
      line(ours, "R1", "1 kΩ", { quantities: { [theirs.edition]: 1 } }),
    ])
      expect((await change(ours, step)).status, JSON.stringify(step)).toBe(422);
    const asking = { as: ours.as, params: { workshop: ours.workshop, part } };
    expect((await call(changePart, { ...asking, body: { version: 1, set: {} } })).status).toBe(404);
    expect((await read(theirs)).lines).toMatchObject([{ id, version: 1, note: "", part: { version: 1 } }]);
    expect((await read(ours)).lines).toEqual([]);
  });
});

describe("how a kit buys a part", () => {
  it("takes an offer for this part only, and refuses an older version", async () => {
    const at = await place();
    const added = await change(at, line(at, "R1", "1 kΩ"), line(at, "R2", "2 kΩ"));
    const [first, second] = added.body.lines.map(({ part }) => part.id);
    const supplier = {
      id: "ebb",
      workshopId: at.workshop,
      name: "Ebb",
      currency: "EUR",
      handlingFee: "0",
      note: "",
    };
    app.db
      .insert(suppliers)
      .values({ ...supplier, freightTerm: "none", smallOrderTerm: "none" })
      .run();
    const offer = {
      id: "offer1",
      workshopId: at.workshop,
      supplierId: "ebb",
      partId: second ?? "",
      note: "",
    };
    app.db
      .insert(offers)
      .values({
        ...offer,
        orderCode: "E-2",
        currency: "EUR",
        priceModel: "whole-order",
        minimumOrder: 1,
        orderMultiple: 1,
      })
      .run();
    const seller = app.person("seller", { id: at.workshop } as never);
    const ask = (part: string | undefined, body: object) =>
      call(choose, { as: seller, params: { ...at.params, part: part ?? "" }, body });
    expect((await ask(first, { version: 0, set: { pinnedOfferId: "offer1" } })).status).toBe(422);
    expect((await ask(second, { version: 0, set: { pinnedOfferId: "offer1" } })).body).toEqual({
      version: 1,
    });
    expect((await ask(second, { version: 0, set: { leastSpare: 2 } })).status).toBe(409);
    const list = await read(at);
    expect(list.money && list.choices).toMatchObject([
      { partId: second, pinnedOfferId: "offer1", version: 1 },
    ]);
  });
});

describe("money", () => {
  it("does not reach a role that may not see it", async () => {
    const SENTINEL = "731.4159";
    const at = await place();
    const part = { class: "resistor", name: "1 kΩ", stockCost: SENTINEL };
    await change(at, line(at, "R1", "", { part }));
    const coBuilder = app.person("co-builder", { id: at.workshop } as never);
    app.guest(coBuilder, { id: at.params.kit, workshopId: at.workshop } as never);
    const plain = await read({ as: coBuilder, params: at.params });
    expect(plain.lines).toHaveLength(1);
    expect(JSON.stringify(plain)).not.toContain(SENTINEL);
    expect(JSON.stringify(plain)).not.toMatch(/price|cost|offer|choice/i);
    expect(JSON.stringify(await read(at))).toContain(SENTINEL);
  });
});
