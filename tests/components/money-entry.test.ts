import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readMoney, stepMoney } from "#src/components/money-entry.ts";

describe("reading money as it is typed", () => {
  it.each([
    ["34", "34.00"],
    ["34,5", "34.50"],
    ["34.50", "34.50"],
    ["€34", "34.00"],
    ["€ 34", "34.00"],
    ["1\u00a0793.65", "1793.65"],
    [".5", "0.50"],
    ["007", "7.00"],
    ["", ""],
    ["  ", ""],
  ])("%j is %j", (entry, value) => {
    expect(readMoney(entry)).toEqual({ ok: true, value });
  });

  it("takes four decimals for a unit price and keeps at least two", () => {
    expect(readMoney("0,062", 4)).toEqual({ ok: true, value: "0.062" });
    expect(readMoney("0.0043", 4)).toEqual({ ok: true, value: "0.0043" });
    expect(readMoney("0.1", 4)).toEqual({ ok: true, value: "0.10" });
  });

  it.each([
    ["-1", "An amount here is never below zero."],
    ["−1", "An amount here is never below zero."],
    ["12o", "Write an amount such as 34.50."],
    ["1.2.3", "Write an amount such as 34.50."],
    ["1,234", "Write at most two decimals."],
    ["1234567890123", "Write an amount of at most twelve figures."],
  ])("refuses %j with what is right", (entry, sentence) => {
    expect(readMoney(entry)).toEqual({ ok: false, sentence });
  });

  it("reads what it writes as the same amount", () => {
    fc.assert(
      fc.property(fc.nat({ max: 99_999_999 }), (cents) => {
        const text = `${Math.floor(cents / 100)}.${String(cents % 100).padStart(2, "0")}`;
        expect(readMoney(text)).toEqual({ ok: true, value: text });
      }),
    );
  });
});

describe("stepping money", () => {
  it("steps exactly, where binary fractions would not", () => {
    expect(stepMoney("0.20", 10)).toBe("0.30");
    expect(stepMoney("34.00", -10)).toBe("33.90");
    expect(stepMoney("34.00", 100)).toBe("35.00");
    expect(stepMoney("0.0625", 10)).toBe("0.1625");
    expect(stepMoney("", 10)).toBe("0.10");
  });

  it("never goes below zero", () => {
    expect(stepMoney("0.05", -10)).toBe("0.00");
  });

  it("is undone by the opposite step", () => {
    fc.assert(
      fc.property(fc.nat({ max: 1_000_000 }), fc.integer({ min: 1, max: 500 }), (cents, by) => {
        const start = `${Math.floor(cents / 100)}.${String(cents % 100).padStart(2, "0")}`;
        expect(stepMoney(stepMoney(start, by), -by)).toBe(start);
      }),
    );
  });
});
