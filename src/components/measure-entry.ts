/** Reading a measure with or without its unit, and converting it exactly to the unit of the field. */

/** Powers of ten of the base unit; an inch and a mil count in tenths of a micrometre. */
const FAMILIES: Record<string, Record<string, readonly [factor: bigint, power: number]>> = {
  length: { m: [1n, 0], cm: [1n, -2], mm: [1n, -3], µm: [1n, -6], in: [254n, -4], mil: [254n, -7] },
  voltage: { kV: [1n, 3], V: [1n, 0], mV: [1n, -3] },
  current: { A: [1n, 0], mA: [1n, -3], µA: [1n, -6], nA: [1n, -9] },
  capacitance: { F: [1n, 0], mF: [1n, -3], µF: [1n, -6], nF: [1n, -9], pF: [1n, -12] },
  resistance: { MΩ: [1n, 6], kΩ: [1n, 3], Ω: [1n, 0], mΩ: [1n, -3] },
  power: { W: [1n, 0], mW: [1n, -3] },
  mass: { kg: [1n, 0], g: [1n, -3], mg: [1n, -6] },
  time: { h: [60n, 0], min: [1n, 0] },
};

export type MeasureEntry = { ok: true; value: string } | { ok: false; sentence: string };

/** "uF" and the Greek mu mean µF; "ohm" and the ohm sign mean Ω. */
function plainUnit(unit: string): string {
  return unit
    .replace(/^[uμ](?=[FAmHV])/, "µ")
    .replace(/ohms?|\u2126/i, "Ω")
    .replace(/^K(?=Ω)/, "k")
    .replace(/^"$/, "in");
}

function familyOf(unit: string) {
  return Object.values(FAMILIES).find((family) => Object.hasOwn(family, unit));
}

/** Decimal text of digits × 10^power, without needless zeros at the end. */
function plainDecimal(digits: bigint, power: number): string {
  if (power >= 0) return String(digits * 10n ** BigInt(power));
  const padded = String(digits).padStart(1 - power, "0");
  const part = padded.slice(power).replace(/0+$/, "");
  return padded.slice(0, power) + (part ? `.${part}` : "");
}

/**
 * Reads "8", "8,0", "0.8 cm", "100nF" for a field in `unit` and gives decimal text in that unit: "0.8 cm" in a field
 * of mm is "8". A unit of another kind comes back as a sentence. An empty entry is the empty text.
 */
export function readMeasure(entry: string, unit: string): MeasureEntry {
  const bare = entry.replace(/[\s\u00a0\u202f]/g, "");
  if (bare === "") return { ok: true, value: "" };
  const match = /^(\d*)(?:[.,](\d*))?([^\d.,]*)$/.exec(bare);
  const [, whole = "", part = "", typed = ""] = match ?? [];
  if (match === null || whole + part === "")
    return { ok: false, sentence: `Write a number, such as 8.0 ${unit}.` };
  const digits = BigInt(whole + part);
  const from = typed === "" ? unit : plainUnit(typed);
  if (from === unit)
    return { ok: true, value: typed === "" ? keptDecimals(whole, part) : plainDecimal(digits, -part.length) };
  const family = familyOf(unit);
  const source = family?.[from];
  const target = family?.[unit];
  if (source === undefined || target === undefined || target[0] !== 1n)
    return { ok: false, sentence: `Write it in ${unit}.` };
  return { ok: true, value: plainDecimal(digits * source[0], source[1] - target[1] - part.length) };
}

/** What was typed without a unit keeps its decimals: 8.0 says more than 8. */
function keptDecimals(whole: string, part: string): string {
  const plain = whole.replace(/^0+(?=\d)/, "") || "0";
  return part === "" ? plain : `${plain}.${part}`;
}
