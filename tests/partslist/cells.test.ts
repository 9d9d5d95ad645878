import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { dialectWords } from "#src/partslist/dialect-words.ts";

const cells = (text: string) => readCells(text).records.map((record) => record.cells);

describe("cells of a text", () => {
  it.each([
    ["comma", "a,b,c\n1,2,3\n4,5,6"],
    ["semicolon", "a;b;c\n1;2;3\n4;5;6"],
    ["tab", "a\tb\tc\n1\t2\t3\n4\t5\t6"],
    ["pipe", "a|b|c\n1|2|3\n4|5|6"],
  ])("finds %s", (delimiter, text) => {
    expect(readCells(text).dialect.delimiter).toBe(delimiter);
    expect(cells(text)[2]).toEqual(["4", "5", "6"]);
  });

  it("keeps the line on which a record begins, with line breaks in cells", () => {
    const { records } = readCells('a,b\n"one\ntwo",2\n\n3,4');
    expect(records.map((record) => record.row)).toEqual([1, 2, 4, 5]);
    expect(records[1]?.cells).toEqual(["one\ntwo", "2"]);
  });

  it("takes an unclosed quote as a character of its line", () => {
    const read = cells('Ref,Qty,What\nJ1,1,"2x3 0.1 header\nJ2,1,"ok, so"\nR1,2,10k');
    expect(read).toEqual([
      ["Ref", "Qty", "What"],
      ["J1", "1", '"2x3 0.1 header'],
      ["J2", "1", "ok, so"],
      ["R1", "2", "10k"],
    ]);
  });

  it("sees a quote behind a blank", () =>
    expect(cells('Ref, Qty\n"R1, R2", 2\n "C1, C2", 2\n "D1, D2", 2')[2]).toEqual(["C1, C2", " 2"]));

  it("puts a decimal comma together again that a comma file tore apart", () => {
    const rows = ["Ref,Qty,Price", "R1,1,0.5", "R2,1,0.6", "R3,1,0.7", "R4,1,0,8"];
    const sheet = readCells(rows.join("\n"));
    expect(sheet.records[4]?.cells).toEqual(["R4", "1", "0,8"]);
    expect(sheet.dialect.repaired).toBe(true);
  });

  it("leaves a row alone that could be joined in two ways", () =>
    expect(cells("a,b\nx,y\nu,v\np,q,r")[3]).toEqual(["p", "q", "r"]));

  it("finds columns by runs of tabs", () => {
    const sheet = readCells("Part\t\tValue\t\tQty\nR1\t\t10k\t\t1\nCONNECTOR1\tscrew\t\t2\nC1\t\t100nF\t\t1");
    expect(sheet.dialect.delimiter).toBe("tab-runs");
    expect(sheet.records[2]?.cells).toEqual(["CONNECTOR1", "screw", "2"]);
  });

  it("says how it read", () => {
    expect(dialectWords(readCells("Wert;Preis\nR1;0,5\nR2;1,25").dialect)).toBe(
      "Semicolons between cells, decimal commas, read as such.",
    );
    expect(dialectWords(readCells("a,b\nR1,2\nR2,3").dialect)).toBe("Commas between cells, read as such.");
  });

  it("gives nothing for nothing", () => expect(readCells("").records).toEqual([]));
});
