import { describe, expect, it } from "vitest";
import { readAmount, readDay, readWhole } from "#src/components/islands/cells/entries.ts";

describe("entries in cells", () => {
  it.each([
    ["4.90", "4.90"],
    ["4,90", "4.90"],
    ["€ 4.90", "4.90"],
    ["1 793,65", "1793.65"],
    ["0,062", "0.062"],
    ["USD 3", "3"],
    ["", null],
  ])("an amount %s", (entry, value) => {
    const read = readAmount(entry, 3);
    expect(read.ok && (read.value === null ? null : Number(read.value))).toBe(
      value === null ? null : Number(value),
    );
  });

  it.each(["abc", "-4", "4.90 each", "1234567890123"])("is no amount: %s", (entry) => {
    expect(readAmount(entry, 2).ok).toBe(false);
  });

  it("an amount has at most so many decimals", () => {
    expect(readAmount("0.0625", 3)).toEqual({ ok: false, sentence: "Write at most 3 decimals." });
  });

  it.each([
    ["1 000", 1000],
    ["12", 12],
    ["", null],
  ])("a whole number %s", (entry, value) => {
    expect(readWhole(entry, 1)).toEqual({ ok: true, value });
  });

  it.each(["0", "1.5", "-3", "ten"])("is no whole number of at least 1: %s", (entry) => {
    expect(readWhole(entry, 1).ok).toBe(false);
  });

  it("a day, as a calendar has it", () => {
    expect(readDay("2026-03-09")).toEqual({ ok: true, value: "2026-03-09" });
    expect(readDay("9.3.2026")).toEqual({ ok: true, value: "2026-03-09" });
    expect(readDay("")).toEqual({ ok: true, value: null });
    for (const none of ["2026-02-30", "03/09/2026", "yesterday"]) expect(readDay(none).ok).toBe(false);
  });
});
