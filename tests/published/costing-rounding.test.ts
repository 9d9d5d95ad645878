import { describe, expect, test } from "vitest";
import { exact } from "#src/costing/decimal.ts";
import { toMinor } from "#src/costing/money.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import { divideBigHalfAway, divideHalfUp } from "#src/costing/whole.ts";
import { HALF_UP_CASES } from "./rounding-half-up.ts";

describe("rounding, halves away from zero", () => {
  test("General Decimal Arithmetic Testcases (M. Cowlishaw, IBM), mode half_up", () => {
    const wrong = HALF_UP_CASES.filter(([, value, places, expected]) => {
      // The cases keep the sign of a zero; an amount of money has none.
      const zero = exact(expected).isZero();
      return roundedText(value, places) !== (zero ? expected.replace("-", "") : expected);
    });
    expect(HALF_UP_CASES.length).toBeGreaterThan(100);
    expect(wrong).toEqual([]);
  });

  // Java SE API, java.math.RoundingMode summary table, column HALF_UP (Java 8 and 17).
  test.each([
    ["5.5", 6],
    ["2.5", 3],
    ["1.6", 2],
    ["1.1", 1],
    ["1.0", 1],
    ["-1.0", -1],
    ["-1.1", -1],
    ["-1.6", -2],
    ["-2.5", -3],
    ["-5.5", -6],
  ])("Java RoundingMode table, HALF_UP: %s is %i", (value, expected) => {
    expect(roundedText(value, 0)).toBe(expected.toString());
    expect(toMinor(value, "JPY")).toBe(BigInt(expected));
    expect(divideBigHalfAway(BigInt(exact(value).times(10).toFixed()), 10n)).toBe(BigInt(expected));
  });

  // ISO 80000-1:2009, Annex B, B.2 and B.3 rule B; 12.25 and 12.35 from memory.
  test.each([
    ["12.223", 1, "12.2"],
    ["12.251", 1, "12.3"],
    ["12.275", 1, "12.3"],
    ["12.25", 1, "12.3"],
    ["12.35", 1, "12.4"],
  ])("ISO 80000-1:2009 Annex B, rule B: %s to %i place is %s", (value, places, expected) => {
    expect(roundedText(value, places)).toBe(expected);
  });

  // ISO 80000-1:2009, Annex B: rounding range 10, in whole tens.
  test.each([
    [12233, 1220],
    [12251, 1230],
    [12275, 1230],
    [12250, 1230],
    [12350, 1240],
  ])("ISO 80000-1:2009 Annex B, range 10: %i tenths is %i", (tenths, expected) => {
    expect(divideHalfUp(tenths, 100) * 10).toBe(expected);
  });

  // CICC data book 2.05, number rounding, type 1 (half up).
  test.each([
    ["123.4", 0, "123"],
    ["123.5", 0, "124"],
    ["123.454", 2, "123.45"],
    ["123.455", 2, "123.46"],
  ])("CICC data book 2.05, half up: %s to %i places is %s", (value, places, expected) => {
    expect(roundedText(value, places)).toBe(expected);
  });
});
