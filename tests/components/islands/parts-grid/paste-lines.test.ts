import { describe, expect, it } from "vitest";
import { columnKeys } from "#src/components/islands/parts-grid/cell-text.ts";
import { pasteBlock } from "#src/components/islands/parts-grid/paste-lines.ts";
import { applySteps } from "#src/components/islands/parts-grid/steps.ts";
import { line, listOf } from "./list.ts";

const list = listOf(line("r1"), line("r2"), line("r3"));
const columns = columnKeys(list.editions, true, []);
const lines = list.lines.map(({ id }) => id);

function paste(block: string[][], at: { row: number; column: string; rows?: number; across?: number }) {
  let made = 0;
  const column = columns.indexOf(at.column as never);
  const target = { lines, columns, row: at.row, column, rows: at.rows ?? 1, across: at.across ?? 1 };
  return pasteBlock(
    list,
    block,
    target,
    () => "",
    () => `new-${++made}`,
  );
}

describe("a pasted block", () => {
  it("goes into the cells to the right and below, each row changed once", () => {
    const pasted = paste([["B1"], ["B2"]], { row: 1, column: "drawer" });
    expect(pasted.misfits).toEqual([]);
    const after = applySteps(list, pasted.steps);
    expect(after.lines.map(({ part }) => part.drawer)).toEqual(["A1", "B1", "B2"]);
  });

  it("of one cell fills what is selected", () => {
    const pasted = paste([["Z1"]], { row: 0, column: "drawer", rows: 3 });
    const after = applySteps(list, pasted.steps);
    expect(after.lines.map(({ part }) => part.drawer)).toEqual(["Z1", "Z1", "Z1"]);
  });

  it("names every cell that does not fit, by its row and column", () => {
    const pasted = paste(
      [
        ["2", "3"],
        ["two", "1"],
        ["1", "-"],
      ],
      { row: 0, column: "quantity:full" },
    );
    expect(pasted.misfits.map(({ row, column, text }) => [row, column, text])).toEqual([
      [2, 1, "two"],
      [3, 2, "-"],
    ]);
  });

  it("does not write into columns that are worked out, or past the last one", () => {
    expect(paste([["€0.01"]], { row: 0, column: "each" }).misfits).toHaveLength(1);
    expect(paste([["x", "y"]], { row: 0, column: "state" }).misfits.map(({ column }) => column)).toEqual([
      1, 2,
    ]);
  });

  it("makes new lines of rows past the last, where it says what their parts are", () => {
    const whole = paste(
      [
        ["R7", "1", "1", "47k"],
        ["R8", "1", "1", ""],
      ],
      { row: 3, column: "designators" },
    );
    expect(whole.steps).toMatchObject([
      { do: "add-line", designators: "R7", quantities: { full: 1, bare: 1 }, part: { name: "47\u00a0kΩ" } },
    ]);
    expect(whole.misfits).toMatchObject([
      { row: 2, message: "A new line needs its part, such as 10 kΩ, 5 %." },
    ]);
  });
});
