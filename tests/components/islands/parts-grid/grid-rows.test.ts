import { describe, expect, it } from "vitest";
import { grownRange, isInRange, rectangleOf } from "#src/components/islands/parts-grid/cell-range.ts";
import { cellText, columnKeys } from "#src/components/islands/parts-grid/cell-text.ts";
import { columnDefs } from "#src/components/islands/parts-grid/column-defs.ts";
import { gridLayout } from "#src/components/islands/parts-grid/grid-layout.ts";
import {
  filteredRows,
  groupedRows,
  lineRows,
  piecesIn,
} from "#src/components/islands/parts-grid/grid-rows.ts";
import { equalLines, joinLines } from "#src/components/islands/parts-grid/join-lines.ts";
import { applySteps } from "#src/components/islands/parts-grid/steps.ts";
import { line, listOf } from "./list.ts";

const NONE: ReadonlySet<string> = new Set();

describe("columns", () => {
  it("have one quantity for each edition, and no money for a role that may not see it", () => {
    const { editions } = listOf();
    expect(columnKeys(editions, true, ["mark"])).toEqual([
      "place",
      "designators",
      "quantity:full",
      "quantity:bare",
      "part",
      "bands",
      "package",
      "drawer",
      "supplier",
      "buy",
      "each",
      "perKit",
      "state",
      "mark",
    ]);
    const plain = columnKeys(editions, false, []);
    expect(plain.filter((key) => ["supplier", "buy", "each", "perKit"].includes(key))).toEqual([]);
  });

  it("are named by their edition where there are several", () => {
    const heads = (editions: { id: string; name: string }[]) =>
      columnDefs({
        ...gridLayout(columnKeys(editions, false, []), 1344),
        editions,
        phone: false,
        sortable: true,
      }).map(({ headerName }) => headerName);
    expect(heads([{ id: "a", name: "Full kit" }])).toContain("Qty");
    expect(heads(listOf().editions)).toEqual(expect.arrayContaining(["Full kit", "Bare board"]));
  });
});

describe("rows", () => {
  const list = listOf(
    line("r1", { designators: "R1, R2, R3", quantities: { full: 3 } }),
    line("c1", { part: { class: "capacitor", name: "100\u00a0nF", value: null, unit: null } }),
    line("x1", { designators: "", mark: "do-not-place", part: { class: "mechanical", name: "Foot" } }),
    line("q1", { quantities: {} }),
  );
  const rows = lineRows(list, null);

  it("say designators in short, the colour code, and how the line stands", () => {
    expect(rows.map(({ designators }) => designators)).toEqual(["R1–R3", "C1", "", "Q1"]);
    expect(rows[0]?.bands?.colours).toEqual(["brown", "black", "orange", "gold"]);
    expect(rows.map(({ state }) => state.word)).toEqual([
      "Settled",
      "Settled",
      "Do not place",
      "No quantity",
    ]);
    expect(piecesIn(list, "full")).toBe(4);
  });

  it("are found by any words, and filtered by what is to settle or has changed", () => {
    expect(filteredRows(rows, "all", "100 nf", NONE).map(({ id }) => id)).toEqual(["c1"]);
    expect(filteredRows(rows, "all", "r2 axial", NONE).map(({ id }) => id)).toEqual(["r1"]);
    expect(filteredRows(rows, "to-settle", "", NONE).map(({ id }) => id)).toEqual(["q1"]);
    expect(filteredRows(rows, "changed", "", new Set(["x1"])).map(({ id }) => id)).toEqual(["x1"]);
  });

  it("stand under their kind when they are grouped, and none is lost", () => {
    const grouped = groupedRows(rows);
    expect(grouped.filter(({ kind }) => kind === "group")).toMatchObject([
      { name: "Resistors", count: 2 },
      { name: "Capacitors", count: 1 },
      { name: "Mechanical parts", count: 1 },
    ]);
    expect(grouped.filter(({ kind }) => kind === "line")).toHaveLength(rows.length);
  });

  it("copy with their units", () => {
    expect(rows[0] && cellText(rows[0], "part")).toBe("10\u00a0kΩ, 5 %");
  });
});

describe("equal lines", () => {
  it("are those of one part and one mark, and join into one with all their designators and pieces", () => {
    const list = listOf(
      line("r1", { part: { id: "same" } }),
      line("r9", { part: { id: "same" }, quantities: { full: 2, bare: 1 } }),
      line("r3", { part: { id: "same" }, mark: "option" }),
    );
    const [group] = equalLines(list);
    expect(group?.map(({ id }) => id)).toEqual(["r1", "r9"]);
    const after = applySteps(list, joinLines(group ?? []));
    expect(after.lines).toMatchObject([
      { id: "r1", designators: "R1, R9", quantities: { full: 3, bare: 1 } },
      { id: "r3" },
    ]);
  });
});

describe("a range of cells", () => {
  it("grows from the cell in focus, stays inside the grid, and is a rectangle", () => {
    const size = { rows: 3, columns: 4 };
    const from = { row: 1, column: 1 };
    const once = grownRange(null, from, "ArrowDown", size);
    const twice = grownRange(once, from, "ArrowDown", size);
    const wide = grownRange(twice, from, "ArrowLeft", size);
    expect(wide && rectangleOf(wide)).toEqual({ top: 1, bottom: 2, left: 0, right: 1 });
    expect(isInRange(wide, { row: 2, column: 0 })).toBe(true);
    expect(isInRange(wide, { row: 0, column: 0 })).toBe(false);
    expect(grownRange(null, from, "Enter", size)).toBeNull();
  });
});
