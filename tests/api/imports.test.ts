import { utils, write } from "@e965/xlsx";
import { describe, expect, it } from "vitest";
import { openDb } from "#db/client.ts";
import { activity } from "#db/schema/activity.ts";
import { imports } from "#db/schema/imports.ts";
import { parts } from "#db/schema/parts.ts";
import { POST as PASTE } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/pasted.ts";
import { setDb } from "#src/server/db.ts";
import { kitOf } from "#src/server/store/kit.ts";
import { changeLine, lineQuantitiesOf, linesOf } from "#src/server/store/line.ts";
import { revisionsOf } from "#src/server/store/revision.ts";
import { supplierNamed } from "#src/server/store/supplier.ts";
import { UPLOAD_BYTES } from "#src/shapes/limits.ts";
import { call, testApp } from "#tests/support/app.ts";
import { importCalls, importKit } from "#tests/support/import-kit.ts";

const app = testApp();

const LIST = `Reference,Qty,Value,Footprint,Supplier,Order code,Price
"R1, R2",2,10k,axial 10 mm,Ebbing,EB-1003,0.011
C1,1,100nF,2.5 mm,Tamsin,T-E107,0.062
U1,1,NE555,DIP-8,,,
`;
/** R3 joins R1 and R2, C1 has another value, U1 leaves, D1 comes. */
const NEXT = `Reference,Qty,Value,Footprint
"R1, R2, R3",3,10k,axial 10 mm
C1,1,220nF,2.5 mm
D1,1,1N4148,DO-35
`;

function counted() {
  return {
    imports: app.db.select().from(imports).all().length,
    parts: app.db.select().from(parts).all().length,
    log: app.db.select().from(activity).all().length,
  };
}

describe("an upload", () => {
  const zip = new Uint8Array([0x50, 0x4b, 0x03, 0x04, 20, 0, 0, 0]);
  const png = new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  const pdf = new TextEncoder().encode("%PDF-1.7\n");
  const noise = Uint8Array.from({ length: 4000 }, (_, place) => (place * 73) % 256);

  it.each([
    ["nothing at all", "", 422, "upload-empty", "parts.csv holds no rows."],
    ["blank rows", "\n \n,,\n", 422, "upload-empty", "parts.csv holds no rows."],
    [
      "an archive that is no workbook",
      zip,
      415,
      "upload-no-workbook",
      "parts.csv is no workbook that can be read.",
    ],
    ["a picture", png, 415, "upload-not-text", "parts.csv is not plain text."],
    ["a document", pdf, 415, "upload-not-text", "parts.csv is not plain text."],
    ["bytes that are no text", noise, 415, "upload-not-text", "parts.csv is not plain text."],
    [
      "more columns than can be read",
      `${Array.from({ length: 201 }, (_, place) => `c${place}`).join(",")}\n`.repeat(2),
      413,
      "upload-too-long",
      "parts.csv has 201 columns; at most 200 can be read.",
    ],
    [
      "more rows than can be read",
      "R1,1\n".repeat(20_001),
      413,
      "upload-too-long",
      "parts.csv has 20001 rows; at most 20000 can be read.",
    ],
  ])("of %s is refused, and nothing is kept", async (_, content, status, code, title) => {
    const kit = importKit(app);
    const before = counted();
    const answer = await kit.upload(content, "parts.csv");
    expect(answer.status).toBe(status);
    expect(answer.problem?.code).toBe(code);
    expect(answer.problem?.title).toBe(title);
    expect(counted()).toEqual(before);
  });

  it("of more than 5 MB is refused while it comes, whatever it says of its length", async () => {
    const kit = importKit(app);
    const answer = await kit.upload(new Uint8Array(UPLOAD_BYTES + 1).fill(65));
    expect(answer.status).toBe(413);
    expect(answer.problem?.title).toBe("This is larger than 5 MB.");
    expect(counted().imports).toBe(0);
  });

  it("can be a workbook; its page says which sheet was read, and rows keep the numbers they have there", async () => {
    const kit = importKit(app);
    const book = utils.book_new();
    const cells = [["Gate Bell"], [], ["Ref", "Qty", "Value"], ["R1, R2", 2, "10k"], ["C1", 3, "100nF"]];
    utils.book_append_sheet(book, utils.aoa_to_sheet(cells), "List");
    utils.book_append_sheet(book, utils.aoa_to_sheet([["to do"]]), "Notes");
    const bytes = new Uint8Array(write(book, { type: "array", bookType: "xlsx" }) as ArrayBuffer);
    const { id } = (await kit.upload(bytes, "list.xlsx")).body;
    const { file, counts, questions } = (await kit.look(id)).body;
    expect(file).toMatchObject({ encoding: "XLSX", sheets: { taken: "List", others: ["Notes"] } });
    expect(counts.lines).toBe(1);
    // C1 alone is one piece; the sheet says 3 in its fifth row.
    expect(questions.open.map(({ row }) => row)).toEqual([5]);
  });

  it("keeps the name of the file, without its folders", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload(LIST, "C:\\lists\\Stückliste é.csv")).body;
    expect((await kit.look(id)).body.file.name).toBe("Stückliste é.csv");
  });

  it("reads what its letters mean in the encoding they came in", async () => {
    const kit = importKit(app);
    const text = "Bezeichner;Menge;Wert;Größe\nC1;1;4,7 µF;5 mm\n";
    const latin = Uint8Array.from(text, (letter) => letter.charCodeAt(0));
    const view = (await kit.look((await kit.upload(latin)).body.id)).body;
    expect(view.file.encoding).toBe("Windows-1252");
    expect(view.file.dialect).toEqual({ delimiter: "semicolon", decimalMark: "comma", repaired: false });
    expect(view.difference.added[0]?.subject).toBe("C1");
  });

  it("can be cells pasted from a spreadsheet", async () => {
    const kit = importKit(app);
    const params = { workshop: kit.workshop.id, kit: kit.kit.id };
    const pasted = await call(PASTE, {
      as: kit.as,
      params,
      body: { text: "R1\t1\t10k\nR2\t1\t22k\nR3\t1\t47k\n" },
    });
    expect(pasted.status).toBe(201);
    const view = (await kit.look(pasted.body.id)).body;
    expect(view.file.name).toBe("Pasted cells");
    expect(view.counts).toMatchObject({ rows: 3, lines: 3 });
    const empty = await call(PASTE, { as: kit.as, params, body: { text: "  \n" } });
    expect(empty.problem?.errors).toEqual([{ at: "text", message: "Paste at least one row." }]);
  });
});

describe("a draft", () => {
  it("accounts for every row", async () => {
    const kit = importKit(app);
    const list = `My lamp\n\nRef,Qty,Value\n"R1,R2",3,10k\nC1,1,100nF\n,,\nTotal,4,\n`;
    const { counts, skipped } = (await kit.look((await kit.upload(list)).body.id)).body;
    expect(counts.rows).toBe(7);
    expect(counts.lines + counts.skipped + counts.questions + counts.joined).toBe(7);
    expect(counts.must).toBe(1);
    expect(skipped.reduce((sum, { count }) => sum + count, 0)).toBe(counts.skipped);
  });

  it("holds a person's decisions through a restart of the server", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload('Ref,Qty,Value,Extra\n"R1,R2",3,10k,A7\nC1,1,100nF,A9\n')).body;
    const first = (await kit.look(id)).body;
    expect(first.questions.open[0]?.code).toBe("quantity-mismatch");
    const { row, code, suggested } = first.questions.open[0] ?? {
      row: 0,
      code: "quantity-mismatch",
      suggested: { choice: "" },
    };
    await kit.edit(id, { version: 1, answers: [{ row, code, choice: suggested.choice }] });
    await kit.edit(id, { version: 2, columns: [{ column: 3, meaning: "drawer" }] });
    const before = (await kit.look(id)).body;
    expect(before.questions.must).toBe(0);

    setDb(openDb(Buffer.from(app.db.$client.serialize())));
    const after = (await kit.look(id)).body;
    expect(after).toEqual(before);
    expect(after.columns.columns[3]).toMatchObject({ meaning: "drawer", said: true });
  });

  it("takes a meaning from the column that had it", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload("Ref,Count,Pieces\nR1,1,2\nR2,1,2\nR3,1,2\n")).body;
    const view = (await kit.edit(id, { version: 1, columns: [{ column: 2, meaning: "quantity" }] })).body;
    expect(
      view.columns.columns.map(({ meaning }) => meaning).filter((meaning) => meaning === "quantity"),
    ).toHaveLength(1);
    expect(view.columns.columns[2]?.meaning).toBe("quantity");
    const again = (await kit.edit(id, { version: 2, guessAgain: true })).body;
    expect(again.columns.columns.some(({ said }) => said)).toBe(false);
  });

  it("opens a question again", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload('Ref,Qty,Value\n"R1,R2",3,10k\n')).body;
    const settled = (await kit.edit(id, { version: 1, takeSuggestions: true })).body;
    expect(settled.questions).toMatchObject({ must: 0, settledCount: 1 });
    const { row, code } = settled.questions.settled[0] ?? { row: 0, code: "quantity-mismatch" };
    const open = (await kit.edit(id, { version: 2, reopen: [{ row, code }] })).body;
    expect(open.questions).toMatchObject({ must: 1, settledCount: 0 });
  });

  it("refuses an edit of somebody who has not seen the last one", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload(LIST)).body;
    expect((await kit.edit(id, { version: 1, columns: [{ column: 3, meaning: "leave-out" }] })).status).toBe(
      200,
    );
    const late = await kit.edit(id, { version: 1, columns: [{ column: 3, meaning: "note" }] });
    expect(late.status).toBe(409);
    expect(late.problem?.code).toBe("changed-meanwhile");
    expect((await kit.look(id)).body.columns.columns[3]?.meaning).toBe("leave-out");
  });

  it("is gone with its text when it is dropped", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload(LIST)).body;
    expect((await kit.drop(id, 1)).status).toBe(204);
    expect((await kit.look(id)).status).toBe(404);
    expect((await kit.list()).body).toEqual([]);
    expect(app.db.select().from(imports).get()?.content).toBe("");
  });
});

describe("taking a list", () => {
  it("makes lines, parts, quantities in every edition, offers, and suppliers whose freight is not known", async () => {
    const kit = importKit(app);
    const taken = await kit.bringIn(LIST);
    expect(taken.status).toBe(200);
    expect(taken.body.outcome.lines).toEqual({ added: 3, changed: 0, removed: 0, same: 0 });
    expect(taken.body.revision).toBe("A");
    const { lines, quantities, offers, suppliers } = kit.standing();
    expect(
      lines.map(({ designators, part }) => [designators, part.class, part.name, part.value, part.package]),
    ).toEqual([
      ["R1, R2", "resistor", "10 kΩ", "10000", "axial 10 mm"],
      ["C1", "capacitor", "100 nF", "0.0000001", "2.5 mm"],
      ["U1", "integrated-circuit", "NE555", null, "DIP-8"],
    ]);
    expect(quantities).toHaveLength(6);
    expect(quantities.filter(({ lineId }) => lineId === lines[0]?.id).map(({ perKit }) => perKit)).toEqual([
      2, 2,
    ]);
    expect(
      suppliers.map(({ name, freightTerm, freightAmount }) => [name, freightTerm, freightAmount]),
    ).toEqual([
      ["Ebbing", "not-known", null],
      ["Tamsin", "not-known", null],
    ]);
    expect(
      offers
        .map(({ orderCode, currency, pricedOn, breaks }) => [orderCode, currency, pricedOn, breaks])
        .sort(),
    ).toEqual([
      ["EB-1003", "EUR", "2026-03-09", [{ quantity: 1, price: "0.011" }]],
      ["T-E107", "EUR", "2026-03-09", [{ quantity: 1, price: "0.062" }]],
    ]);
    expect(
      app.db
        .select()
        .from(activity)
        .all()
        .map(({ action }) => action),
    ).toEqual(["list.take"]);
  });

  it("uses one part for lines that say the same part, and the workshop's own where it has it", async () => {
    const kit = importKit(app);
    await kit.bringIn("Ref,Qty,Value,Footprint\nR1,1,10k,0805\nR7,1,10K0,0805\nR9,1,10k,1206\n");
    const [first, second, third] = kit.standing().lines.map(({ partId }) => partId);
    expect(second).toBe(first);
    expect(third).not.toBe(first);
    const other = importCalls(app, kit.as, kit.workshop, app.kit(kit.workshop));
    await other.bringIn("Part,Qty,Value,Package\nR44,1,10 kOhm,0805\n");
    expect(other.standing().lines[0]?.partId).toBe(first);
  });

  it("waits for what must be settled", async () => {
    const kit = importKit(app);
    const taken = await kit.bringIn('Ref,Qty,Value\n"R1,R2",3,10k\n');
    expect(taken.status).toBe(409);
    expect(taken.problem?.code).toBe("rows-to-settle");
    expect(taken.problem?.detail).toBe("Settle rows 2. Nothing was changed.");
    expect(kit.standing().lines).toEqual([]);
  });

  it("changes nothing the second time", async () => {
    const kit = importKit(app);
    await kit.bringIn(LIST, "lamp.csv");
    const before = kit.standing();
    const again = await kit.bringIn(LIST, "lamp copy.csv");
    expect(again.view.file.sameAs).toEqual({ name: "lamp.csv", takenAt: app.now - 1000 });
    expect(again.view.difference.counts).toEqual({
      added: 0,
      removed: 0,
      changed: 0,
      revalued: 0,
      unchanged: 3,
    });
    expect(again.problem?.code).toBe("nothing-to-bring-in");
    expect(kit.standing()).toEqual(before);
  });

  it("shows and then does the difference to the list that stands, and begins a revision", async () => {
    const kit = importKit(app);
    await kit.bringIn(LIST);
    const [resistor] = kit.standing().lines;
    const next = await kit.bringIn(NEXT);
    const { added, removed, changed, revalued } = next.view.difference;
    expect(added.map(({ subject }) => subject)).toEqual(["D1"]);
    expect(removed.map(({ subject, line }) => [subject, line])).toEqual([["U1", 3]]);
    expect(changed.map(({ changes }) => changes.map(({ field }) => field))).toEqual([
      ["designators", "quantity"],
    ]);
    expect(revalued.map(({ subject, changes }) => [subject, changes[0]?.from, changes[0]?.to])).toEqual([
      ["C1", "100 nF", "220nF"],
    ]);
    expect(next.body.revision).toBe("B");
    const after = kit.standing();
    expect(after.lines.map(({ designators, part }) => [designators, part.name])).toEqual([
      ["R1, R2, R3", "10 kΩ"],
      ["C1", "220 nF"],
      ["D1", "1N4148"],
    ]);
    expect(after.lines[0]?.id).toBe(resistor?.id);
    expect(revisionsOf(app.db, kit.kit.id)).toMatchObject([{ number: 1 }]);
  });

  it("keeps the offers of a part to which a list only adds", async () => {
    const kit = importKit(app);
    await kit.bringIn("Ref,Qty,Value,Supplier,Order code,Price\nR1,1,10k,Ebbing,EB-1,0.02\n");
    const [before] = kit.standing().lines;
    await kit.bringIn("Ref,Qty,Value,Footprint\nR1,1,10k,0805\n");
    const [after] = kit.standing().lines;
    expect(after?.part).toMatchObject({ id: before?.partId, package: "0805" });
    expect(kit.standing().offers[0]?.partId).toBe(before?.partId);
  });

  it("leaves quantities alone in editions that do without a line, and marks made by hand", async () => {
    const kit = importKit(app);
    await kit.bringIn("Ref,Qty,Value\nR1,1,10k\nJ1,1,Socket\n");
    const [resistor, socket] = linesOf(app.db, kit.kit.id).map(({ line }) => line);
    app.db.$client
      .prepare("delete from line_quantities where line_id = ? and edition_id like 'bare%'")
      .run(resistor?.id);
    changeLine(app.db, kit.kit.id, socket?.id ?? "", 1, { mark: "option" });
    await kit.bringIn('Ref,Qty,Value\n"R1, R2",2,10k\nJ1,1,Socket\n');
    const perKit = lineQuantitiesOf(app.db, kit.kit.id).filter(({ lineId }) => lineId === resistor?.id);
    expect(perKit.map(({ editionId, perKit: pieces }) => [editionId.slice(0, 4), pieces])).toEqual([
      ["full", 2],
    ]);
    expect(kit.standing().lines[1]?.mark).toBe("option");
  });

  it("refuses where the list changed since its person looked, and shows the new difference", async () => {
    const kit = importKit(app);
    await kit.bringIn(LIST);
    const { id } = (await kit.upload(NEXT)).body;
    const seen = (await kit.look(id)).body;
    const [resistor] = linesOf(app.db, kit.kit.id);
    changeLine(app.db, kit.kit.id, resistor?.line.id ?? "", 1, { designators: "R1, R2, R9" });
    const before = kit.standing();
    const late = await kit.take(id, seen);
    expect(late.problem?.code).toBe("difference-changed");
    expect(kit.standing()).toEqual(before);
    const now = (await kit.look(id)).body;
    expect(now.seen).not.toBe(seen.seen);
    expect((await kit.take(id, now)).status).toBe(200);
  });

  it("writes all of it or nothing: a failure on the way leaves no trace", async () => {
    const kit = importKit(app);
    await kit.bringIn(LIST);
    const { id } = (await kit.upload(`${NEXT}X1,1,16MHz,HC49\n`)).body;
    const view = (await kit.look(id)).body;
    const [before, log] = [kit.standing(), counted()];
    app.db.$client.exec(
      "create trigger fails before insert on activity when new.action = 'list.take' begin select raise(abort, 'disk full'); end",
    );
    await expect(kit.take(id, view)).rejects.toThrow("disk full");
    app.db.$client.exec("drop trigger fails");
    expect(kit.standing()).toEqual(before);
    expect(counted()).toEqual(log);
    expect(kitOf(app.db, kit.workshop.id, kit.kit.id)?.revision).toBe(1);
    expect(revisionsOf(app.db, kit.kit.id)).toEqual([]);
    expect((await kit.take(id, view)).status).toBe(200);
  });

  it("cannot be done twice", async () => {
    const kit = importKit(app);
    const { id, view } = await kit.bringIn(LIST);
    const again = await kit.take(id, view);
    expect(again.problem?.title).toBe("This list is no draft any more: it was brought in.");
  });

  it("remembers what was said about columns for the next list of the same shape", async () => {
    const kit = importKit(app);
    const list = (value: string) => `Ref,Qty,Value,Lade\nR1,1,${value},A7\nR2,1,22k,A9\n`;
    const { id } = (await kit.upload(list("10k"))).body;
    const said = (await kit.edit(id, { version: 1, columns: [{ column: 3, meaning: "drawer" }] })).body;
    await kit.take(id, said);
    const next = (await kit.look((await kit.upload(list("12k"))).body.id)).body;
    expect(next.columns.columns[3]).toMatchObject({ meaning: "drawer", reason: "remembered" });
  });

  it("asks whose prices are that name no supplier, and leaves them out until it is told", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload("Ref,Qty,Value,Price\nR1,1,10k,0.02\nR2,1,22k,0.03\n")).body;
    const view = (await kit.look(id)).body;
    expect(view.prices).toMatchObject({ offers: 0, unnamed: 2, newSuppliers: [] });
    const told = (await kit.edit(id, { version: 1, pricesFrom: { name: "Weir Parts" } })).body;
    expect(told.prices).toMatchObject({ offers: 2, unnamed: 0, newSuppliers: ["Weir Parts"] });
    expect(supplierNamed(app.db, kit.workshop.id, "Weir Parts")).toBeUndefined();
    await kit.take(id, told);
    expect(supplierNamed(app.db, kit.workshop.id, "Weir Parts")?.freightTerm).toBe("not-known");
    expect(kit.standing().offers).toHaveLength(2);
    const gone = await kit.edit((await kit.upload(LIST)).body.id, {
      version: 1,
      pricesFrom: { id: "nobody" },
    });
    expect(gone.problem?.errors?.[0]?.at).toBe("pricesFrom.id");
  });

  it("names the field of a price that cannot be", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload("Ref,Qty,Value,Supplier,Price\nR1,1,10k,Ebbing,0.12345678\n")).body;
    const view = (await kit.look(id)).body;
    expect(view.prices.faults[0]?.at).toBe("rows.2.breaks.0.price");
    const taken = await kit.take(id, view);
    expect(taken.status).toBe(422);
    expect(taken.problem?.errors?.[0]?.at).toBe("rows.2.breaks.0.price");
    expect(kit.standing().lines).toEqual([]);
  });
});

describe("taking a list back", () => {
  it("puts back exactly what stood before", async () => {
    const kit = importKit(app);
    await kit.bringIn(LIST);
    const before = kit.standing();
    const partsBefore = app.db
      .select()
      .from(parts)
      .all()
      .map((row) => ({ ...row, version: 0 }));
    const { id } = await kit.bringIn(`Ref,Qty,Value,Footprint,Supplier,Order code,Price
"R1, R2, R3",3,10k,axial 10 mm,Ebbing,EB-1003,0.009
C1,1,220nF,2.5 mm,Nordhafen,40-1,0.05
D1,1,1N4148,DO-35,,,
`);
    expect(kit.standing()).not.toEqual(before);
    expect((await kit.takeBack(id, 2)).status).toBe(204);
    expect(kit.standing()).toEqual(before);
    expect(
      app.db
        .select()
        .from(parts)
        .all()
        .map((row) => ({ ...row, version: 0 })),
    ).toEqual(partsBefore);
    expect(kitOf(app.db, kit.workshop.id, kit.kit.id)?.revision).toBe(1);
    expect(revisionsOf(app.db, kit.kit.id)).toEqual([]);
    expect((await kit.list()).body[0]).toMatchObject({ state: "taken-back", canTakeBack: false });
  });

  it("empties a kit that had no list before", async () => {
    const kit = importKit(app);
    const { id } = await kit.bringIn(LIST);
    await kit.takeBack(id, 2);
    expect(kit.standing()).toEqual({ lines: [], quantities: [], offers: [], suppliers: [] });
  });

  it("says what was changed since, and does it only when told to even so", async () => {
    const kit = importKit(app);
    await kit.bringIn(LIST);
    const before = kit.standing();
    const { id } = await kit.bringIn(NEXT);
    const diode = linesOf(app.db, kit.kit.id).find(({ line }) => line.designators === "D1")?.line;
    changeLine(app.db, kit.kit.id, diode?.id ?? "", 1, { note: "cathode to the edge" });
    const standing = kit.standing();
    const asked = await kit.takeBack(id, 2);
    expect(asked.status).toBe(409);
    expect(asked.problem?.current).toEqual({ changes: [{ what: "line", name: "D1", happened: "changed" }] });
    expect(kit.standing()).toEqual(standing);
    expect((await kit.takeBack(id, 2, true)).status).toBe(204);
    expect(kit.standing()).toEqual(before);
  });

  it("leaves a supplier alone that was given its terms since", async () => {
    const kit = importKit(app);
    const { id } = await kit.bringIn(LIST);
    app.db.$client.exec("update suppliers set freight_term = 'none', version = 2 where name = 'Ebbing'");
    expect((await kit.takeBack(id, 2)).status).toBe(204);
    expect(kit.standing().suppliers.map(({ name }) => name)).toEqual(["Ebbing"]);
  });

  it("goes in order: the later list first", async () => {
    const kit = importKit(app);
    const first = await kit.bringIn(LIST, "first.csv");
    await kit.bringIn(NEXT, "second.csv");
    const refused = await kit.takeBack(first.id, 2);
    expect(refused.problem?.title).toBe("second.csv was brought in after this list.");
  });

  it("can be followed by taking the same list again", async () => {
    const kit = importKit(app);
    const { id } = await kit.bringIn(LIST);
    await kit.takeBack(id, 2);
    expect((await kit.bringIn(LIST)).status).toBe(200);
    expect(kit.standing().lines).toHaveLength(3);
  });
});

describe("other people", () => {
  it("from another workshop find nothing", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload(LIST)).body;
    const stranger = app.person("owner", app.workshop());
    const theirs = importCalls(app, stranger, kit.workshop, kit.kit);
    expect((await theirs.upload(LIST)).status).toBe(404);
    expect((await theirs.look(id)).status).toBe(404);
    const elsewhere = importCalls(app, kit.as, kit.workshop, app.kit(kit.workshop));
    expect((await elsewhere.look(id)).status).toBe(404);
  });

  it.each(["co-builder", "seller"] as const)("who are %s may not bring in lists", async (role) => {
    const kit = importKit(app);
    const { id, view } = await kit.bringIn(LIST);
    const person = app.person(role, kit.workshop);
    app.guest(person, kit.kit);
    const theirs = importCalls(app, person, kit.workshop, kit.kit);
    expect((await theirs.upload(LIST)).status).toBe(403);
    expect((await theirs.look(id)).status).toBe(403);
    expect((await theirs.take(id, view)).status).toBe(403);
    expect((await theirs.takeBack(id, 2)).status).toBe(403);
  });
});
