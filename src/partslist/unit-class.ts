import type { PartClass } from "#src/shapes/limits.ts";
import { plainUnits } from "./values.ts";

/** Units that only one class of parts is named by. Volts, watts and hertz say too little. */
const UNITS: readonly (readonly [RegExp, PartClass])[] = [
  [/^~?\d[\d.,]*\s?[pnumk]?F(?![A-Za-z0-9])/, "capacitor"],
  [/^~?\d[\d.,]*\s?[mkKMG]?Ω(?![A-Za-z0-9])/, "resistor"],
  [/^~?\d[\d.,]*\s?[num]?H(?![A-Za-z0-9])/, "inductor"],
];

/** The class a value begins to say by its written unit: "100 nF" a capacitor; `null` for "10k" or a name. */
export function classFromUnit(value: string): PartClass | null {
  const plain = plainUnits(value).trim();
  return UNITS.find(([pattern]) => pattern.test(plain))?.[1] ?? null;
}
