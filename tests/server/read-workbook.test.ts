import { type BookType, utils, type WorkSheet, write } from "@e965/xlsx";
import { strToU8, zipSync } from "fflate";
import { describe, expect, it } from "vitest";
import { readWorkbook } from "#src/server/bring-in/read-workbook.ts";
import { readWorkbookAside } from "#src/server/bring-in/workbook-aside.ts";
import { WORKBOOK_BYTES } from "#src/shapes/limits.ts";

const KINDS = [
  ["XLSX", "xlsx"],
  ["ODS", "ods"],
] as const;

function workbook(type: BookType, ...sheets: [string, WorkSheet][]): Uint8Array {
  const book = utils.book_new();
  for (const [name, sheet] of sheets) utils.book_append_sheet(book, sheet, name);
  return new Uint8Array(write(book, { type: "array", bookType: type, compression: true }) as ArrayBuffer);
}

const rows = (...cells: unknown[][]) => utils.aoa_to_sheet(cells);

describe.each(KINDS)("an %s workbook", (kind, type) => {
  it("is read as text: a line to a row, blank rows and cells kept in their places", () => {
    const sheet = rows(
      ["Dew Lantern"],
      [],
      ["Ref", "Qty", "Value"],
      ["R1, R2", 2, "10k"],
      ["C1", undefined, 'say "100n"'],
    );
    expect(readWorkbook(workbook(type, ["List", sheet]))).toEqual({
      ok: true,
      kind,
      taken: "List",
      others: [],
      text: 'Dew Lantern\n\nRef\tQty\tValue\nR1, R2\t2\t10k\nC1\t\t"say ""100n"""',
    });
  });

  it("is read from its first sheet that holds something; the others are named", () => {
    const bytes = workbook(type, ["Blank", rows([])], ["List", rows(["R1"])], ["Old", rows(["R2"])]);
    expect(readWorkbook(bytes)).toMatchObject({ taken: "List", others: ["Old"], text: "R1" });
  });

  it("gives formulas by the value that was stored, days in one order", () => {
    const sheet = rows(["Price", "From"], [0.5, 46_090]);
    Object.assign(sheet.A2 as object, { f: "1/2" });
    // 1 January 2026 is day 46 023 of a sheet: 46 021 days after 1 January 1900, which is day 1, and the 29 February 1900 that never was.
    Object.assign(sheet.B2 as object, { z: "m/d/yy" });
    expect(readWorkbook(workbook(type, ["List", sheet]))).toMatchObject({
      text: "Price\tFrom\n0.5\t2026-03-09",
    });
  });

  it("without a letter or figure is empty", () => {
    expect(readWorkbook(workbook(type, ["List", rows(["", " "], ["-"])]))).toEqual({
      ok: false,
      code: "upload-empty",
    });
  });
});

describe("numbers of a workbook", () => {
  it.each([
    [0.0085, "0.00", "0.0085"],
    [0.0085, '0.00 "€"', "0.0085 €"],
    [1234.5, '#,##0.00 "€"', "1234.5 €"],
    [0.05, "0%", "5%"],
    [0.1 + 0.2, "General", "0.3"],
    [42, "00000", "00042"],
    [1_000_000, "0.00E+00", "1000000"],
    [-2.5, "0.00", "-2.5"],
    [0.5, "# ?/?", "0.5"],
  ])("%f shown as %s reads %s", (value, format, text) => {
    const sheet = rows([value]);
    Object.assign(sheet.A1 as object, { z: format });
    expect(readWorkbook(workbook("xlsx", ["List", sheet]))).toMatchObject({ text });
  });
});

describe("what is no workbook, or too much of one", () => {
  it("is told from one", () => {
    const archive = zipSync({ "notes.xml": strToU8("<a/>") });
    expect(readWorkbook(archive)).toEqual({ ok: false, code: "upload-no-workbook" });
    const torn = workbook("xlsx", ["List", rows(["R1"])]).slice(0, 400);
    expect(readWorkbook(torn)).toEqual({ ok: false, code: "upload-no-workbook" });
  });

  it("is refused before it is unpacked, where it says how large it is", () => {
    const bomb = zipSync({ "xl/workbook.xml": new Uint8Array(WORKBOOK_BYTES + 1) });
    expect(bomb.length).toBeLessThan(100_000);
    expect(readWorkbook(bomb)).toEqual({ ok: false, code: "upload-too-packed" });
  });

  it("is cut off at the size it claims, where it lies", () => {
    const bomb = Buffer.from(zipSync({ "xl/workbook.xml": new Uint8Array(20_000_000) }));
    const entry = bomb.indexOf(Buffer.from([0x50, 0x4b, 1, 2]));
    // The unpacked size in the central directory: APPNOTE 6.3, section 4.3.12, 24 bytes in.
    bomb.writeUInt32LE(10, entry + 24);
    expect(readWorkbook(bomb)).toMatchObject({ ok: false });
  });

  it("has more columns or rows than can be read: one more of each is handed on, for the count to be refused", () => {
    const reading = readWorkbook(
      workbook("xlsx", ["List", rows(Array.from({ length: 300 }, (_, at) => `c${at}`))]),
    );
    expect(reading.ok && reading.text.split("\t")).toHaveLength(201);
    const long = readWorkbook(
      workbook("xlsx", ["List", rows(...Array.from({ length: 20_005 }, () => ["R1"]))]),
    );
    expect(long.ok && long.text.split("\n")).toHaveLength(20_001);
  });
});

it("is read the same in a thread of its own", async () => {
  const bytes = workbook("ods", ["List", rows(["R1", 1])]);
  expect(await readWorkbookAside(bytes)).toEqual(readWorkbook(bytes));
});
