import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  compareDesignators,
  compressDesignators,
  readDesignators,
  repeatedDesignators,
} from "#src/partslist/designators.ts";

const names = (cell: string) => readDesignators(cell).designators.join(" ");

describe("designators of a cell", () => {
  it.each([
    ["R1,R2", "R1 R2"],
    ["R1 R2", "R1 R2"],
    ["R1-R4", "R1 R2 R3 R4"],
    ["R1..R4", "R1 R2 R3 R4"],
    ["C1;C2", "C1 C2"],
    ["C1 - C4", "C1 C2 C3 C4"],
    ["R2-3", "R2 R3"],
    ["C1,3,6", "C1 C3 C6"],
    ["X1-3,5-7", "X1 X2 X3 X5 X6 X7"],
    ["D1–D3", "D1 D2 D3"],
    ["J1 to J3", "J1 J2 J3"],
    ["R1 bis R3", "R1 R2 R3"],
    ["R1, R2, and R3", "R1 R2 R3"],
    ["D1/D2", "D1 D2"],
    ["C  2,C  3,C  1", "C2 C3 C1"],
    ["R1A-R1C", "R1A R1B R1C"],
    ["C01-C03", "C01 C02 C03"],
    ["Q1 (see note)", "Q1"],
    ["R5*", "R5"],
  ])("%s", (cell, expected) => expect(names(cell)).toBe(expected));

  it.each(["IC1_PINS_1_14", "U2-1", "EPROM-SOCKET", "R_FB", "LDO3V3", "Rk"])(
    "%s is a name, not a range",
    (cell) => expect(names(cell)).toBe(cell),
  );

  it("hands words back as unclear, and what hangs on a range", () => {
    expect(readDesignators("Cables")).toEqual({ designators: [], unclear: ["Cables"], numbered: 0 });
    expect(readDesignators("Vite M3")).toEqual({ designators: [], unclear: ["Vite M3"], numbered: 0 });
    expect(readDesignators("P1-P3 +2*").unclear).toEqual(["+2*"]);
    expect(readDesignators("LED1,2,pwr")).toEqual({
      designators: ["LED1", "LED2", "LEDpwr"],
      unclear: ["pwr"],
      numbered: 2,
    });
  });

  it("does not unroll a range without end", () => expect(readDesignators("R1-R99999").numbered).toBe(0));
});

describe("order and display", () => {
  it("sorts numbers as numbers", () =>
    expect(["R10", "R2", "C1", "R1"].sort(compareDesignators)).toEqual(["C1", "R1", "R2", "R10"]));

  it("shows runs of three and more as ranges", () =>
    expect(compressDesignators(["R6", "R4", "R5", "C2", "C1", "R9"])).toBe("C1, C2, R4–R6, R9"));

  it("names what stands twice", () =>
    expect(repeatedDesignators(["R2", "R1", "R2", "R1", "R3"])).toEqual(["R1", "R2"]));

  it("reads back what it shows", () => {
    const numbered = fc.uniqueArray(fc.integer({ min: 1, max: 60 }), { minLength: 1, maxLength: 30 });
    fc.assert(
      fc.property(numbered, (numbers) => {
        const all = numbers.map((number) => `R${number}`).sort(compareDesignators);
        expect(readDesignators(compressDesignators(all)).designators).toEqual(all);
      }),
    );
  });
});
