import { describe, expect, it } from "vitest";
import { pasteBlock } from "#src/partslist/paste-block.ts";
import { safeCell, unsafeCell, writeList } from "#src/partslist/write-list.ts";

describe("CSV that opens in a spreadsheet without harm", () => {
  // OWASP, "CSV Injection", as read in 2023: cells that begin with these are taken for formulas.
  it.each(["=1+1", "+SUM(A1)", "-2+3", "@now", "\t=1", "\r=1", "＝1+1"])(
    "%j is led by an apostrophe",
    (text) => {
      expect(safeCell(text)).toBe(`'${text}`);
      expect(unsafeCell(safeCell(text))).toBe(text);
    },
  );

  it.each(["-5", "+0.5", "10k", "R1-R4", "a=b"])("%s stays", (text) => expect(safeCell(text)).toBe(text));

  it("writes semicolons, tabs and a byte-order mark where asked", () => {
    expect(writeList([["R1;R2", "1,5"]], { delimiter: ";" })).toBe('"R1;R2";1,5\r\n');
    expect(writeList([["a", "b\tc"]], { delimiter: "\t" })).toBe('a\t"b\tc"\r\n');
    expect(writeList([["a"]], { byteOrderMark: true })).toBe("\uFEFFa\r\n");
  });

  it("keeps blanks at the ends and an empty record", () =>
    expect(writeList([[" 4093 "], [""]])).toBe('" 4093 "\r\n""\r\n'));
});

describe("a block pasted from a spreadsheet", () => {
  it("becomes rows of one width", () =>
    expect(pasteBlock("R1\t10k\t0207\r\nC1\t100n\r\n")).toEqual([
      ["R1", "10k", "0207"],
      ["C1", "100n", ""],
    ]));

  it("keeps line breaks and quotes within cells", () =>
    expect(pasteBlock('"two\nlines"\t"say ""hi"""\nx\ty')).toEqual([
      ["two\nlines", 'say "hi"'],
      ["x", "y"],
    ]));

  it("parts nothing at commas", () => expect(pasteBlock("R1, R2")).toEqual([["R1, R2"]]));

  it("keeps empty cells at the edges", () =>
    expect(pasteBlock("\ta\n\t\n")).toEqual([
      ["", "a"],
      ["", ""],
    ]));
});
