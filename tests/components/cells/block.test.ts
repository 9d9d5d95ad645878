import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { layBlock, readBlock, writeBlock } from "#src/components/islands/cells/block.ts";

describe("a block of cells", () => {
  it.each([
    ["one cell", "4.90", [["4.90"]]],
    [
      "rows with any line end, and one at the end",
      "a\tb\r\nc\td\n",
      [
        ["a", "b"],
        ["c", "d"],
      ],
    ],
    [
      "empty cells",
      "a\t\tb\n\t\t",
      [
        ["a", "", "b"],
        ["", "", ""],
      ],
    ],
    ["quotes round tabs, lines and quotes", '"a\tb"\t"c\nd"\t"say ""so"""', [["a\tb", "c d", 'say "so"']]],
    ["a quote inside a cell", '5" disc\t1', [['5" disc', "1"]]],
  ])("is read: %s", (_, text, cells) => {
    expect(readBlock(text)).toEqual(cells);
  });

  it("comes back as it was written", () => {
    const cell = fc.string({ maxLength: 8 }).map((text) => text.replace(/[\r\n]/g, "").trim());
    const rows = fc.array(fc.array(cell, { minLength: 2, maxLength: 4 }), { minLength: 1, maxLength: 4 });
    fc.assert(
      fc.property(rows, (cells) => {
        const awkward = cells.flat().some((text) => text.startsWith('"') && !text.includes("\t"));
        fc.pre(!awkward || cells.flat().every((text) => !text.startsWith('"') || /["\t]/.test(text)));
        expect(readBlock(writeBlock(cells))).toEqual(cells);
      }),
    );
  });

  it("lies where it is put; what reaches past the end is counted", () => {
    const block = [
      ["1", "2"],
      ["3", "4"],
    ];
    expect(layBlock(block, ["r1", "r2"], ["a", "b"], { row: "r2", column: "b" })).toEqual({
      edits: [{ row: "r2", column: "b", entry: "1" }],
      past: 3,
    });
  });
});
