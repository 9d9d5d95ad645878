import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  compareDecimals,
  divideDecimal,
  scientific,
  shiftDecimal,
  tidyDecimal,
} from "#src/partslist/exact-decimal.ts";
import { decimalMarkOf, readNumber } from "#src/partslist/numbers.ts";
import { readQuantity } from "#src/partslist/quantities.ts";

const digits = fc.integer({ min: 0, max: 999_999_999 }).map(String);

describe("decimal text", () => {
  it("shifts there and back", () => {
    fc.assert(
      fc.property(digits, fc.integer({ min: -15, max: 15 }), (text, places) => {
        expect(shiftDecimal(shiftDecimal(text, places), -places)).toBe(tidyDecimal(text));
      }),
    );
  });

  it("has one tidy spelling", () =>
    expect(["004.70", ".5", "0.0", "10."].map(tidyDecimal)).toEqual(["4.7", "0.5", "0", "10"]));

  it("gives digits and power of ten", () => {
    expect(scientific("0.0047")).toEqual({ digits: "47", exponent: -4 });
    expect(scientific("4700")).toEqual({ digits: "47", exponent: 2 });
    expect(scientific("0.000")).toEqual({ digits: "0", exponent: 0 });
  });

  it("divides half up", () => {
    expect(divideDecimal("0.66", 100n, 6)).toBe("0.0066");
    expect(divideDecimal("1", 3n, 4)).toBe("0.3333");
    expect(divideDecimal("2", 3n, 4)).toBe("0.6667");
    expect(divideDecimal("1", 8n, 2)).toBe("0.13");
  });

  it("compares without rounding", () => {
    expect(Math.sign(compareDecimals("0.30000000000000004", "0.3"))).toBe(1);
    expect(compareDecimals("1.50", "1.5")).toBe(0);
    expect(Math.sign(compareDecimals("9", "10"))).toBe(-1);
  });
});

describe("numbers as people write them", () => {
  it.each([
    ["1.234,56", null, "1234.56"],
    ["1,234.56", null, "1234.56"],
    ["1 234,5", null, "1234.5"],
    ["1,234", null, "1234"],
    ["1,234", "comma", "1.234"],
    ["1.234", "comma", "1234"],
    ["1.234", null, "1.234"],
    ["0,022", null, "0.022"],
    [",5", null, "0.5"],
    ["12'000", null, "12000"],
    ["1,2,3", null, null],
    ["abc", null, null],
  ] as const)("%s with decimal %s", (text, mark, expected) => expect(readNumber(text, mark)).toBe(expected));

  it("tells the decimal mark of a column by its sure cells", () => {
    expect(decimalMarkOf(["1,36 €", "0,17 €", "12"])).toBe("comma");
    expect(decimalMarkOf(["1.5", "2", "3.25"])).toBe("point");
    expect(decimalMarkOf(["1", "2", "1,000"])).toBeNull();
  });
});

describe("quantities of a cell", () => {
  it.each([
    ["4", { kind: "number", quantity: 4 }],
    ["4.0", { kind: "number", quantity: 4 }],
    ["x4", { kind: "number", quantity: 4 }],
    ["4 pcs", { kind: "number", quantity: 4 }],
    ["6 Stk.", { kind: "number", quantity: 6 }],
    ["2 of 100", { kind: "of-pack", quantity: 2, pack: 100 }],
    ["7 meters", { kind: "measure", quantity: 7, text: "7 meters" }],
    ["0.5", { kind: "measure", quantity: 1, text: "0.5" }],
    ["Lots", { kind: "word", text: "Lots" }],
    ["", { kind: "empty" }],
  ])("%j", (text, expected) => expect(readQuantity(text)).toEqual(expected));
});
