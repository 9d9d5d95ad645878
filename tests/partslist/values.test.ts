import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { formatReading, letterCode } from "#src/partslist/value-format.ts";
import { guessBareCapacitance, namesTwoValues, readValue } from "#src/partslist/values.ts";

const si = (text: string, partClass: Parameters<typeof readValue>[1]) =>
  readValue(text, partClass)?.si ?? null;

describe("resistances", () => {
  it.each([
    ["4k7", "4700"],
    ["4.7K", "4700"],
    ["4R7", "4.7"],
    ["4,7 kΩ", "4700"],
    ["4,7 k\u2126", "4700"],
    ["1K5", "1500"],
    ["470", "470"],
    ["0R", "0"],
    ["27 \u03a9", "27"],
    ["2.2Meg", "2200000"],
    ["10к", "10000"],
    ["4,7 кОм", "4700"],
    ["１０ｋΩ", "10000"],
    ["680,1W", "680"],
    ["100R/2W", "100"],
    ["2kR, 1%", "2000"],
    ["240mR", "0.24"],
    ["B10k", "10000"],
    ["10kA", "10000"],
    ["10.0K 1%", "10000"],
    ["RES 47K OHM 1/4W 5% AXIAL", "47000"],
    ["Resistor 330OHMS 1/10W", "330"],
    ["0207, 1.5k, 1/4W, 1%", "1500"],
    ["~10Kohm", "10000"],
  ])("%s", (text, expected) => expect(si(text, "resistor")).toBe(expected));

  it.each(["10-30Mohm", "n/a", "1/4W", "TRIMMER", "R3 and R4", "5%"])("%s is no value", (text) =>
    expect(si(text, "resistor")).toBeNull(),
  );
});

describe("capacitances and inductances", () => {
  it.each([
    ["100n", "0.0000001"],
    ["0.1uF", "0.0000001"],
    ["0.1 \u00b5F", "0.0000001"],
    ["0.1 \u03bcF", "0.0000001"],
    [".022uf 50V", "0.000000022"],
    ["10nF (.01uf)", "0.00000001"],
    ["0u22", "0.00000022"],
    ["1500u/100V", "0.0015"],
    ["CAP CER .5PF 50V", "0.0000000000005"],
    ["4,7nF ceramic", "0.0000000047"],
    ["C_100nF", "0.0000001"],
    ["0.1 MFD", "0.0000001"],
    ["10мкФ", "0.00001"],
    ["4,700 pF", "0.0000000047"],
  ])("%s", (text, expected) => expect(si(text, "capacitor")).toBe(expected));

  it("reads inductors, and leaves the impedance of a ferrite bead alone", () => {
    expect(si("10u", "inductor")).toBe("0.00001");
    expect(si("5.6NH 300MA", "inductor")).toBe("0.0000000056");
    expect(si("120 OHM 800mA", "inductor")).toBeNull();
  });

  it("only suggests what a number without unit means", () => {
    expect(si("104", "capacitor")).toBeNull();
    expect(guessBareCapacitance("104")?.si).toBe("0.0000001");
    expect(guessBareCapacitance(".047")?.si).toBe("0.000000047");
    expect(guessBareCapacitance("22")?.si).toBe("0.000000000022");
  });

  it("takes no value from a text that names two", () => {
    expect(namesTwoValues("potentiometer 5K 10K", "potentiometer")).toBe(true);
    expect(namesTwoValues("potentiometer 10K stereo, 10K", "potentiometer")).toBe(false);
  });
});

describe("writing values", () => {
  it.each([
    ["4700", "ohm", "4.7\u00a0kΩ", "4K7"],
    ["0.47", "ohm", "470\u00a0mΩ", "470m"],
    ["0", "ohm", "0\u00a0Ω", "0R"],
    ["0.0000001", "F", "100\u00a0nF", "100n"],
    ["0.0047", "F", "4700\u00a0µF", "4700u"],
    ["0.00001", "H", "10\u00a0µH", "10u"],
  ] as const)("%s %s", (value, unit, shown, code) => {
    expect(formatReading({ si: value, unit })).toBe(shown);
    expect(letterCode({ si: value, unit })).toBe(code);
  });

  it("reads back what it shows, digit for digit", () => {
    const digits = fc.integer({ min: 1, max: 9999 });
    const power = fc.integer({ min: -11, max: -6 });
    fc.assert(
      fc.property(digits, power, (number, places) => {
        const reading = {
          si: readValue(`${number}e`, "capacitor")?.si ?? decimal(number, places),
          unit: "F" as const,
        };
        expect(si(formatReading(reading), "capacitor")).toBe(reading.si);
      }),
    );
  });
});

/** The number times ten to a negative power, written out. */
function decimal(number: number, places: number): string {
  const text = String(number).padStart(1 - places, "0");
  const point = text.length + places;
  return `${text.slice(0, point)}.${text.slice(point)}`.replace(/0+$/, "").replace(/\.$/, "");
}

describe("numbers beside values", () => {
  it("are not drawn into them", () => {
    expect(si("CF-25 220R", "resistor")).toBe("220");
    expect(si("RM 5 100n", "capacitor")).toBe("0.0000001");
    expect(si("10 000 pF", "capacitor")).toBe("0.00000001");
    expect(si("10 000", "resistor")).toBe("10000");
    expect(si("10KLIN", "potentiometer")).toBe("10000");
  });
});
