import { expect, it } from "vitest";
import { lineFaults } from "#src/partslist/line-faults.ts";

const line = (id: string, designators: string, perKit: number, mark = "in-kit") => ({
  id,
  designators,
  mark,
  quantities: (perKit > 0 ? { full: perKit, bare: 0 } : {}) as Record<string, number>,
});

it("finds lines without a quantity, at odds with their designators, and named twice", () => {
  const faults = lineFaults([
    line("a", "R1, R2", 2),
    line("b", "R3", 2),
    line("c", "C1", 0),
    line("d", "", 4),
    line("e", "Q1", 1),
    line("f", "Q1", 1, "do-not-place"),
    line("g", "R9", 0, "do-not-place"),
  ]);
  expect(Object.fromEntries(faults)).toEqual({
    b: { kind: "at-odds", quantity: 2, named: 1 },
    c: { kind: "no-quantity" },
    e: { kind: "twice", designator: "Q1" },
    f: { kind: "twice", designator: "Q1" },
  });
});
