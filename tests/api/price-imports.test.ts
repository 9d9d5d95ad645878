import { describe, expect, it } from "vitest";
import { POST as TAKE } from "#src/pages/api/workshops/[workshop]/imports/[import]/take.ts";
import { POST as TAKE_BACK } from "#src/pages/api/workshops/[workshop]/imports/[import]/take-back.ts";
import { PATCH as EDIT, GET as LOOK } from "#src/pages/api/workshops/[workshop]/imports/[import].ts";
import { GET as LIST, POST as UPLOAD } from "#src/pages/api/workshops/[workshop]/imports.ts";
import type { DraftEdit } from "#src/shapes/import.ts";
import { call, testApp } from "#tests/support/app.ts";
import { importKit } from "#tests/support/import-kit.ts";

const app = testApp();

/** A workshop whose kit has three parts, and its calls for price lists. */
async function priceDesk(
  list = "Ref,Qty,Value,Footprint,MPN\nR1,1,10k,0805,RC-10K\nC1,1,100nF,0805,CC-100N\nU1,1,NE555,DIP-8,NE555P\n",
) {
  const kit = importKit(app);
  await kit.bringIn(list);
  const params = { workshop: kit.workshop.id };
  const { as } = kit;
  const at = (id: string) => ({ ...params, import: id });
  const upload = async (content: string) => {
    const bytes = { content, type: "application/octet-stream" };
    return (await call(UPLOAD, { as, params, bytes, headers: { "x-file-name": "prices.csv" } })).body.id;
  };
  const look = async (id: string) => (await call(LOOK, { as, params: at(id), method: "GET" })).body;
  const edit = async (id: string, body: DraftEdit) =>
    (await call(EDIT, { as, params: at(id), body, method: "PATCH" })).body;
  const take = async (id: string) => {
    const view = await look(id);
    app.pass(1000);
    return call(TAKE, { as, params: at(id), body: { version: view.file.version, seen: view.seen } });
  };
  const takeBack = (id: string, version: number) =>
    call(TAKE_BACK, { as, params: at(id), body: { version } });
  const lists = () => call(LIST, { as, params, method: "GET" });
  return { kit, params, upload, look, edit, take, takeBack, lists };
}

const BREAKS_IN_COLUMNS = `Supplier,Order code,MPN,Currency,1,100,1000,MOQ,Multiple,Stock,Lead time (days)
Ebbing,EB-1,RC-10K,EUR,0.02,0.011,0.008,1,1,24000,3
Ebbing,EB-2,CC-100N,EUR,0.05,0.03,0.02,10,10,900,3
`;
const ROW_PER_BREAK = `Supplier,Order code,MPN,From,Price
Ebbing,EB-1,RC-10K,1,0.02
Ebbing,EB-1,RC-10K,100,0.011
Ebbing,EB-1,RC-10K,1000,0.008
`;

describe("a price list", () => {
  it("makes ladders from breaks in columns, with least order, multiple, stock and lead time", async () => {
    const desk = await priceDesk();
    const id = await desk.upload(BREAKS_IN_COLUMNS);
    const view = await desk.look(id);
    expect(view.difference.counts).toEqual({ added: 2, changed: 0, confirmed: 0, same: 0 });
    expect(view.prices.newSuppliers).toEqual(["Ebbing"]);
    expect((await desk.take(id)).body.outcome.offers).toMatchObject({ added: 2, newSuppliers: ["Ebbing"] });
    const { offers, suppliers } = desk.kit.standing();
    const [first, second] = ["EB-1", "EB-2"].map((code) =>
      offers.find(({ orderCode }) => orderCode === code),
    );
    expect(first).toMatchObject({ minimumOrder: 1, orderMultiple: 1, stockShown: 24000, leadTimeDays: 3 });
    expect(first?.breaks).toEqual([
      { quantity: 1, price: "0.02" },
      { quantity: 100, price: "0.011" },
      { quantity: 1000, price: "0.008" },
    ]);
    // Nobody can buy one of them: what holds at ten is what the price for one says.
    expect(second?.breaks[0]).toEqual({ quantity: 10, price: "0.05" });
    expect(suppliers[0]).toMatchObject({ name: "Ebbing", freightTerm: "not-known" });
  });

  it("makes the same ladder from one row for each break", async () => {
    const desk = await priceDesk();
    const id = await desk.upload(ROW_PER_BREAK);
    expect((await desk.look(id)).counts).toMatchObject({ rows: 4, offers: 1, breaks: 2, skipped: 1 });
    await desk.take(id);
    expect(desk.kit.standing().offers[0]?.breaks.map(({ price }) => price)).toEqual([
      "0.02",
      "0.011",
      "0.008",
    ]);
  });

  it("changes nothing the second time, and only the day when another file says the same", async () => {
    const desk = await priceDesk();
    await desk.take(await desk.upload(ROW_PER_BREAK));
    app.pass(3 * 24 * 60 * 60 * 1000);
    const before = desk.kit.standing();
    const again = await desk.upload(ROW_PER_BREAK);
    expect((await desk.look(again)).difference.counts).toMatchObject({ same: 1, confirmed: 0 });
    expect((await desk.take(again)).problem?.code).toBe("nothing-to-bring-in");
    expect(desk.kit.standing()).toEqual(before);
    const newer = await desk.upload(`${ROW_PER_BREAK}\n`);
    expect((await desk.take(newer)).body.outcome.offers).toMatchObject({ confirmed: 1, changed: 0 });
    expect(desk.kit.standing().offers[0]?.pricedOn).toBe("2026-03-12");
  });

  it("shows old and new ladder, takes the new one, and puts the old one back", async () => {
    const desk = await priceDesk();
    await desk.take(await desk.upload(ROW_PER_BREAK));
    const before = desk.kit.standing();
    const id = await desk.upload(ROW_PER_BREAK.replace("1000,0.008", "1000,0.007"));
    const [changed] = (await desk.look(id)).difference.changed;
    expect(changed?.was?.breaks[2]).toEqual({ quantity: 1000, price: "0.008" });
    expect(changed?.becomes[2]).toEqual({ quantity: 1000, price: "0.007" });
    await desk.take(id);
    expect(desk.kit.standing().offers[0]?.breaks[2]?.price).toBe("0.007");
    expect((await desk.takeBack(id, 2)).status).toBe(204);
    expect(desk.kit.standing()).toEqual(before);
  });

  it("waits until somebody says whose it is", async () => {
    const desk = await priceDesk();
    const id = await desk.upload(
      "Order code,MPN,Price\nW-1,RC-10K,0.02\nW-2,CC-100N,0.04\nW-3,NE555P,0.40\n",
    );
    expect((await desk.look(id)).prices.unnamed).toBe(3);
    const refused = await desk.take(id);
    expect(refused.problem?.code).toBe("supplier-not-said");
    expect(desk.kit.standing().suppliers).toEqual([]);
    const said = await desk.edit(id, { version: 1, pricesFrom: { name: "Weir Parts" } });
    expect(said.prices).toMatchObject({ unnamed: 0, newSuppliers: ["Weir Parts"] });
    expect((await desk.take(id)).status).toBe(200);
    expect(desk.kit.standing().offers).toHaveLength(3);
  });

  it("asks what a row is for that no part answers to, and takes the part it is told", async () => {
    const desk = await priceDesk();
    const id = await desk.upload(
      "Supplier,Order code,MPN,Price\nEbbing,EB-9,QQ-77,0.02\nEbbing,EB-1,RC-10K,0.02\n",
    );
    const view = await desk.look(id);
    expect(view.questions.open.map(({ code, row }) => [code, row])).toEqual([["part-not-found", 2]]);
    expect(view.difference.counts.added).toBe(1);
    const part = view.parts.find(({ name }) => name.startsWith("NE555"));
    const answer = { row: 2, code: "part-not-found" as const, choice: `take-part:${part?.id}` };
    const told = await desk.edit(id, { version: 1, answers: [answer] });
    expect(told.difference.counts.added).toBe(2);
    await desk.take(id);
    expect(desk.kit.standing().offers.find(({ orderCode }) => orderCode === "EB-9")?.partId).toBe(part?.id);
  });

  it("refuses two prices for one quantity until one is chosen", async () => {
    const desk = await priceDesk();
    const id = await desk.upload(
      "Supplier,Order code,MPN,From,Price\nEbbing,EB-1,RC-10K,1,0.02\nEbbing,EB-1,RC-10K,1,0.03\n",
    );
    const view = await desk.look(id);
    expect(view.questions.must).toBe(1);
    expect((await desk.take(id)).problem?.code).toBe("rows-to-settle");
    await desk.edit(id, { version: 1, takeSuggestions: true });
    expect((await desk.take(id)).status).toBe(200);
    expect(desk.kit.standing().offers[0]?.breaks).toHaveLength(1);
  });

  it("names the field of a ladder that cannot be, and takes nothing", async () => {
    const desk = await priceDesk();
    const id = await desk.upload(
      "Supplier,Order code,MPN,Price,MOQ,Multiple\nEbbing,EB-1,RC-10K,0.02,15,10\nEbbing,EB-2,CC-100N,0.05,10,10\n",
    );
    const refused = await desk.take(id);
    expect(refused.status).toBe(422);
    expect(refused.problem?.errors).toEqual([
      { at: "rows.2.minimumOrder", message: "15 is not a multiple of 10. Write 10 or 20." },
    ]);
    expect(desk.kit.standing()).toMatchObject({ offers: [], suppliers: [] });
  });

  it("refuses when an offer changed since its person looked", async () => {
    const desk = await priceDesk();
    await desk.take(await desk.upload(ROW_PER_BREAK));
    const id = await desk.upload(ROW_PER_BREAK.replace("0.02", "0.03"));
    const seen = await desk.look(id);
    app.db.$client.exec("update offer_breaks set price = '0.5' where quantity = 1");
    const late = await call(TAKE, {
      as: desk.kit.as,
      params: { ...desk.params, import: id },
      body: { version: 1, seen: seen.seen },
    });
    expect(late.problem?.code).toBe("difference-changed");
  });

  it("is listed apart from the parts lists of kits, and from other workshops", async () => {
    const desk = await priceDesk();
    const id = await desk.upload(ROW_PER_BREAK);
    expect((await desk.lists()).body.map((list) => list.id)).toEqual([id]);
    expect((await desk.kit.list()).body.map((list) => list.id)).not.toContain(id);
    expect((await desk.kit.look(id)).status).toBe(404);
    const stranger = app.person("owner", app.workshop());
    const answer = await call(LOOK, { as: stranger, params: { ...desk.params, import: id }, method: "GET" });
    expect(answer.status).toBe(404);
  });
});

it("refuses more offers than a part can have, naming the row", async () => {
  const desk = await priceDesk();
  const rows = Array.from({ length: 41 }, (_, at) => `Ebbing,EB-${at},RC-10K,0.02`);
  const id = await desk.upload(`Supplier,Order code,MPN,Price\n${rows.join("\n")}\n`);
  const refused = await desk.take(id);
  expect(refused.problem?.errors).toEqual([
    { at: "rows.42", message: "A part has at most 40 offers. Leave this row out." },
  ]);
  expect(desk.kit.standing()).toMatchObject({ offers: [], suppliers: [] });
});
