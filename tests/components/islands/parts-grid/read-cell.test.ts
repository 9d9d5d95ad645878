import { describe, expect, it } from "vitest";
import { lineFromCells, readCell } from "#src/components/islands/parts-grid/read-cell.ts";
import { line, listOf } from "./list.ts";

const list = listOf(
  line("r1", { designators: "R1, R2", quantities: { full: 2 } }),
  line("r3", { part: { id: "shared" } }),
  line("r4", { part: { id: "shared" } }),
  line("u1", { part: { class: "integrated-circuit", name: "Quad NAND", alsoIn: ["Reed Chime"] } }),
);
const [first, shared, , chip] = list.lines as [
  (typeof list.lines)[0],
  (typeof list.lines)[0],
  unknown,
  (typeof list.lines)[0],
];

describe("a cell", () => {
  it("expands designators, and a quantity that was their number follows", () => {
    expect(readCell(list, first, "designators", "R1–R3")).toEqual({
      ok: true,
      steps: [{ do: "change-line", line: "r1", set: { designators: "R1, R2, R3", quantities: { full: 3 } } }],
    });
    const refused = readCell(list, first, "designators", "resistors");
    expect(refused).toEqual({
      ok: false,
      message: "“resistors” is not a designator. Write them as R1, R2 or R4-R9.",
    });
  });

  it.each([
    ["6", 6],
    ["", 0],
    ["1 000", 1000],
  ])("takes %j for a quantity of %i", (text, perKit) => {
    expect(readCell(list, first, "quantity:bare", text)).toMatchObject(
      perKit === 0
        ? { ok: true, steps: [] }
        : { ok: true, steps: [{ set: { quantities: { bare: perKit } } }] },
    );
  });

  it.each(["12o", "-3", "2.5", "10001"])("refuses %j as a quantity and says what is right", (text) => {
    expect(readCell(list, first, "quantity:full", text).ok).toBe(false);
  });

  it("names a value as the trade writes it and keeps it in ohms", () => {
    expect(readCell(list, first, "part", "4k7, 1 %, 0.25 W")).toEqual({
      ok: true,
      steps: [
        {
          do: "change-part",
          part: "part-r1",
          set: { name: "4.7\u00a0kΩ", spec: "1 %, 0.25 W", value: "4700", unit: "ohm" },
        },
      ],
    });
  });

  it("gives a line a part of its own where others use the part, here or in another kit", () => {
    expect(readCell(list, shared, "part", "22k")).toMatchObject({ steps: [{ do: "own-part", line: "r3" }] });
    expect(readCell(list, chip, "package", "DIP-14")).toMatchObject({
      steps: [{ do: "own-part", line: "u1" }],
    });
    expect(readCell(list, shared, "drawer", "B4")).toMatchObject({
      steps: [{ do: "change-part", part: "shared", set: { drawer: "B4" } }],
    });
  });

  it("reads marks and kinds by their words, and lists the marks there are", () => {
    expect(readCell(list, first, "mark", "builder's own")).toMatchObject({
      steps: [{ set: { mark: "builders-own" } }],
    });
    expect(readCell(list, first, "class", "Potentiometers")).toMatchObject({
      steps: [{ set: { class: "potentiometer" } }],
    });
    expect(readCell(list, first, "mark", "maybe")).toEqual({
      ok: false,
      message: "“maybe” is none of: In the kit, Option, Builder’s own, Do not place.",
    });
  });

  it("does nothing where it says what stands there", () => {
    expect(readCell(list, first, "part", "10\u00a0kΩ, 5 %")).toEqual({ ok: true, steps: [] });
    expect(readCell(list, first, "drawer", " A1 ")).toEqual({ ok: true, steps: [] });
  });
});

describe("a new line", () => {
  it("takes kind and value from what was written, and goes into the editions that have most of the list", () => {
    const read = lineFromCells(list, "new", { designators: "C3-C5", part: "100n, ceramic", drawer: "B1" });
    expect(read).toMatchObject({
      ok: true,
      steps: [
        {
          do: "add-line",
          designators: "C3, C4, C5",
          quantities: { full: 3, bare: 0 },
          part: { class: "capacitor", name: "100\u00a0nF", spec: "ceramic", value: "0.0000001", unit: "F" },
        },
      ],
    });
  });

  it("needs its part", () => {
    expect(lineFromCells(list, "new", { designators: "R9" })).toEqual({
      ok: false,
      message: "A new line needs its part, such as 10 kΩ, 5 %.",
    });
  });
});
