import { describe, expect, it } from "vitest";
import { resistorBands } from "#src/partslist/resistor-bands.ts";

/** From IEC 60062:2016, table 1 (colours), by hand; the values agree with the charts that print four and five bands. */
describe("bands of a resistor (IEC 60062:2016)", () => {
  it.each([
    ["1000", "5 %", "brown black red gold"],
    ["4700", "5 %", "yellow violet red gold"],
    ["22000", "5%", "red red orange gold"],
    ["270000", "±5 %", "red violet yellow gold"],
    ["2260", "1 %", "red red blue brown brown"],
    ["2400", "1 %", "red yellow black brown brown"],
    ["10000", "1 %", "brown black black red brown"],
    ["4.7", "5 %", "yellow violet gold gold"],
    ["0.22", "5 %", "red red silver gold"],
    ["10000000", "10 %", "brown black blue silver"],
  ])("%s ohm, %s", (ohms, tolerance, colours) => {
    expect(resistorBands(ohms, tolerance)).toEqual({ colours: colours.split(" "), tolerance: true });
  });

  it("leaves the tolerance out where it is not known", () => {
    expect(resistorBands("120", null)).toEqual({ colours: ["brown", "red", "brown"], tolerance: false });
  });

  it.each([["0"], ["12345"], ["0.001"]])("has none for %s ohm", (ohms) => {
    expect(resistorBands(ohms, "5 %")).toBeNull();
  });
});
