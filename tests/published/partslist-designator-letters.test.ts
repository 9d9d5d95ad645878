import { describe, expect, it } from "vitest";
import { classFromDesignator } from "#src/partslist/classes.ts";
import { readDesignators } from "#src/partslist/designators.ts";

/** Lepton EDA reference manual, "refdes naming conventions"; T there is a transformer, see below. */
const LEPTON = {
  R: "resistor",
  RN: "resistor",
  FB: "inductor",
  L: "inductor",
  C: "capacitor",
  J: "connector",
  P: "connector",
  S: "switch",
  D: "diode",
  Q: "transistor",
  U: "integrated-circuit",
} as const;

/** A public list of class letters in the manner of IEEE 315, where our classes have a name for them. */
const LIST = {
  AR: "integrated-circuit",
  BR: "diode",
  BT: "battery-holder",
  CR: "diode",
  DS: "led",
  HW: "mechanical",
  JP: "connector",
  MH: "mechanical",
  MP: "mechanical",
  RT: "resistor",
  TB: "connector",
  Y: "crystal",
} as const;

/** General practice, common aliases. */
const ALIASES = { IC: "integrated-circuit", SW: "switch", RV: "potentiometer", LED: "led" } as const;

describe("class letters of reference designators", () => {
  it.each(Object.entries(LEPTON))("%s is a %s (Lepton EDA manual)", (letters, partClass) =>
    expect(classFromDesignator(`${letters}1`)).toBe(partClass),
  );

  it.each(Object.entries(LIST))("%s is a %s (list in the manner of IEEE 315)", (letters, partClass) =>
    expect(classFromDesignator(`${letters}1`)).toBe(partClass),
  );

  it.each(Object.entries(ALIASES))("%s is a %s (common alias)", (letters, partClass) =>
    expect(classFromDesignator(`${letters}1`)).toBe(partClass),
  );
});

describe("counts of designator ranges (own parsing checks, no outside source)", () => {
  it.each([
    ["R1-R4, R7", 5],
    ["C1,C2;C5", 3],
    ["D1–D8", 8],
    ["SW1 SW2", 2],
    ["J1-3", 3],
  ])("%s counts %i", (text, count) => expect(readDesignators(text).designators).toHaveLength(count));
});
