import type { ValueUnit } from "./draft.ts";
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
const PREFIXES: Readonly<Record<number, string>> = {
  9: "G",
  6: "M",
  3: "k",
  0: "",
  [-3]: "m",
  [-6]: "µ",
  [-9]: "n",
  [-12]: "p",
};

/**
 * A value as people write it: `("4700", "ohm")` is "4.7 kΩ", `("0.0000001", "F")` is "100 nF". The prefix leaves one
 * to three digits before the point; farads are never written in milli, which people misread.
 */
export function valueWords(si: string, unit: ValueUnit): string {
  const { digits, exponent } = scientific(si);
  const sign = SIGNS[unit];
  if (digits === "0") return `0 ${sign}`;
  const leading = digits.length + exponent - 1;
  const wished = Math.min(9, Math.max(-12, Math.floor(leading / 3) * 3));
  const power = unit === "F" && wished === -3 ? -6 : wished;
  return `${shiftDecimal(si, -power)} ${PREFIXES[power] ?? ""}${sign}`;
}
