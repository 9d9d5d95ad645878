import { describe, expect, it } from "vitest";
import { readMeasure } from "#src/components/measure-entry.ts";

/** Factors: SI prefixes; 1 in = 25.4 mm exactly (ISO 31-1, international inch); 1 mil = 0.001 in. */
describe("reading a measure", () => {
  it.each([
    ["8", "mm", "8"],
    ["8,0", "mm", "8.0"],
    ["8.0 mm", "mm", "8"],
    ["0.8 cm", "mm", "8"],
    ["0,1in", "mm", "2.54"],
    ["100 mil", "mm", "2.54"],
    ["1.5 m", "mm", "1500"],
    ["100nF", "µF", "0.1"],
    ["100 uF", "µF", "100"],
    ["4.7 μF", "nF", "4700"],
    ["4.7 kΩ", "Ω", "4700"],
    ["4.7 Kohm", "Ω", "4700"],
    ["250 mW", "W", "0.25"],
    ["1 h", "min", "60"],
    ["12", "pieces", "12"],
    ["", "mm", ""],
  ])("%j in a field of %s is %j", (entry, unit, value) => {
    expect(readMeasure(entry, unit)).toEqual({ ok: true, value });
  });

  it.each([
    ["8 V", "mm", "Write it in mm."],
    ["8 foo", "mm", "Write it in mm."],
    ["30 min", "h", "Write it in h."],
    ["wide", "mm", "Write a number, such as 8.0 mm."],
    ["-3", "mm", "Write a number, such as 8.0 mm."],
    ["3 mm 4", "mm", "Write a number, such as 8.0 mm."],
  ])("refuses %j in a field of %s", (entry, unit, sentence) => {
    expect(readMeasure(entry, unit)).toEqual({ ok: false, sentence });
  });
});
