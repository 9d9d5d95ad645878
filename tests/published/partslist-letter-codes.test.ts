import { describe, expect, it } from "vitest";
import { resistorBands } from "#src/partslist/resistor-bands.ts";
import { guessBareCapacitance, readValue } from "#src/partslist/values.ts";

/** IEC 60062:2016, letter and digit code; cases of the test suite and README of rkm_codes 1.0 (14 September 2025). */
const RESISTANCES = [
  ["4R7", "4.7"],
  ["470R", "470"],
  ["K47", "470"],
  ["4K7", "4700"],
  ["6K8", "6800"],
  ["M470", "470000"],
  ["4M70", "4700000"],
  ["47M", "47000000"],
  ["470M", "470000000"],
  ["G470", "470000000"],
  ["4G7", "4700000000"],
  ["470L", "0.47"],
] as const;

/** The same; the last five from memory of the clause on capacitance codes. */
const CAPACITANCES = [
  ["2p5", "0.0000000000025"],
  ["2n5", "0.0000000025"],
  ["4µ7", "0.0000047"],
  ["4n7", "0.0000000047"],
  ["2u2", "0.0000022"],
  ["n47", "0.00000000047"],
  ["47p", "0.000000000047"],
  ["p10", "0.0000000000001"],
  ["330n", "0.00000033"],
] as const;

/** Three-figure marking in pF: public lists of capacitor codes; 479 by the rule that a third figure 9 is a tenth. */
const MARKINGS = [
  ["104", "0.0000001"],
  ["103", "0.00000001"],
  ["473", "0.000000047"],
  ["474", "0.00000047"],
  ["222", "0.0000000022"],
  ["472", "0.0000000047"],
  ["154", "0.00000015"],
  ["224", "0.00000022"],
  ["101", "0.0000000001"],
  ["100", "0.00000000001"],
  ["479", "0.0000000000047"],
] as const;

/** Colour code, IEC 60062: worked examples of public colour-code pages and tools, read from value to bands. */
const BANDS = [
  ["1000", "5", "brown black red gold"],
  ["4700", "5", "yellow violet red gold"],
  ["22000", "5", "red red orange gold"],
  ["2260", "1", "red red blue brown brown"],
  ["270000", "5", "red violet yellow gold"],
  ["10000", "5", "brown black orange gold"],
  ["2400", "1", "red yellow black brown brown"],
  ["0.22", null, "red red silver"],
  ["1000", "0.01", "brown black black brown grey"],
] as const;

describe("IEC 60062", () => {
  it.each(RESISTANCES)("resistance %s", (code, si) => expect(readValue(code, "resistor")?.si).toBe(si));

  it.each(CAPACITANCES)("capacitance %s", (code, si) => expect(readValue(code, "capacitor")?.si).toBe(si));

  it("0R is a link of zero ohms", () => expect(readValue("0R", "resistor")?.si).toBe("0"));

  it("a lone lower-case m is no multiplier of a resistor", () =>
    expect(readValue("4m7", "resistor")).toBeNull());

  it.each(MARKINGS)("marking %s", (code, si) => expect(guessBareCapacitance(code)?.si).toBe(si));

  it.each(BANDS)("bands of %s Ω, %s %%", (ohms, tolerance, bands) =>
    expect(resistorBands(ohms, tolerance)?.colours.join(" ")).toBe(bands),
  );
});
