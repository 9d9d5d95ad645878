import type { ValueReading, ValueUnit } from "./draft.ts";
import { scientific, shiftDecimal } from "./exact-decimal.ts";

const SIGNS: Readonly<Record<ValueUnit, string>> = {
  ohm: "Ω",
  F: "F",
  H: "H",
  Hz: "Hz",
  V: "V",
  A: "A",
  W: "W",
};
const PREFIXES: readonly (readonly [number, string])[] = [
  [9, "G"],
  [6, "M"],
  [3, "k"],
  [0, ""],
  [-3, "m"],
  [-6, "µ"],
  [-9, "n"],
  [-12, "p"],
];
/** Capacitors are named in µF up to the largest and in nF between; millifarads are not in use. */
const UNUSED: Readonly<Partial<Record<ValueUnit, readonly string[]>>> = {
  F: ["m", "k", "M", "G"],
  H: ["k", "M", "G"],
  V: ["M", "G"],
  A: ["k", "M", "G"],
};

/**
 * A value for display, with the prefix of the trade and a no-break space: "4.7 kΩ", "100 nF", "4700 µF",
 * "0 Ω". Exact: no digit is rounded away.
 */
export function formatReading(reading: Pick<ValueReading, "si" | "unit">): string {
  const { digits, exponent } = scientific(reading.si);
  const sign = SIGNS[reading.unit];
  if (digits === "0") return `0\u00a0${sign}`;
  const magnitude = exponent + digits.length - 1;
  const unused = UNUSED[reading.unit] ?? [];
  const usable = PREFIXES.filter(([, prefix]) => !unused.includes(prefix));
  const [power, prefix] = usable.find(([places]) => magnitude >= places) ?? usable.at(-1) ?? [0, ""];
  return `${shiftDecimal(reading.si, -power)}\u00a0${prefix}${sign}`;
}

/** The letter code of IEC 60062:2016, 5.1 and 5.2: "4K7", "R47", "100n", "2µ2" written with u. */
export function letterCode(reading: Pick<ValueReading, "si" | "unit">): string {
  const text = formatReading(reading).split("\u00a0");
  const number = text[0] ?? "0";
  const prefix = (text[1] ?? "").replace(SIGNS[reading.unit], "");
  const letter = (prefix === "" ? (reading.unit === "ohm" ? "R" : SIGNS[reading.unit]) : prefix)
    .replace("k", "K")
    .replace("µ", "u");
  const [whole = "0", fraction = ""] = number.split(".");
  return `${whole === "0" && fraction !== "" ? "" : whole}${letter}${fraction}`;
}
