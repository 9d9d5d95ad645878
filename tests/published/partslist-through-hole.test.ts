import { describe, expect, it } from "vitest";
import { recogniseProperties } from "#src/partslist/properties.ts";

const found = (text: string, partClass: Parameters<typeof recogniseProperties>[1], name: string) =>
  recogniseProperties([text], partClass, new Set()).find((one) => one.name === name)?.value;

/** Usual through-hole sizes: common practice, no published source. Only how they are written is tried here. */
describe("through-hole sizes as lists write them (common practice, no source)", () => {
  it.each([
    ["LED 3 mm red", "led", "diameter", "3"],
    ["LED 5mm", "led", "diameter", "5"],
    ["LED, ø 5 mm, clear", "led", "diameter", "5"],
    ["film capacitor RM 5", "capacitor", "hole-spacing", "5"],
    ["RM 2,5", "capacitor", "hole-spacing", "2.5"],
    ['pin header 0.1"', "connector", "hole-spacing", "2.54"],
    ["terminal block 5.08mm pitch", "connector", "hole-spacing", "5.08"],
    ["Elko 100µF 16V RM2.5", "capacitor", "hole-spacing", "2.5"],
    ["resistor 0207 1/4 W", "resistor", "power", "0.25"],
    ["resistor 0309 1/2W", "resistor", "power", "0.5"],
    ["resistor 250 mW", "resistor", "power", "0.25"],
    ["resistor 0207", "resistor", "package", "0207"],
    ["timer DIP-8", "integrated-circuit", "package", "DIP-8"],
    ["transistor TO-92", "transistor", "package", "TO-92"],
    ["diode DO-35", "diode", "package", "DO-35"],
    ["crystal HC49", "crystal", "package", "HC49"],
    ["Elko 100µF/16V", "capacitor", "voltage", "16"],
    ["ceramic 100n 1kV", "capacitor", "voltage", "1000"],
    ["resistor 1k ±1 %", "resistor", "tolerance", "1"],
    ["capacitor NP0", "capacitor", "dielectric", "C0G"],
  ] as const)("%s", (text, partClass, name, value) => expect(found(text, partClass, name)).toBe(value));
});
