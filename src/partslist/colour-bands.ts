import { scientific, shiftDecimal } from "./exact-decimal.ts";

/** The colours of the code; their drawn shades are the page's matter. */
export const BAND_COLOURS = [
  "black",
  "brown",
  "red",
  "orange",
  "yellow",
  "green",
  "blue",
  "violet",
  "grey",
  "white",
  "gold",
  "silver",
  "pink",
] as const;
export type BandColour = (typeof BAND_COLOURS)[number];

/** IEC 60062:2016, table 1: figures 0 to 9. */
const FIGURES = BAND_COLOURS.slice(0, 10);
/** Multiplier as a power of ten: black 0 to white 9, gold −1, silver −2, pink −3. */
const MULTIPLIERS: ReadonlyMap<number, BandColour> = new Map([
  ...FIGURES.map((colour, power): [number, BandColour] => [power, colour]),
  [-1, "gold"],
  [-2, "silver"],
  [-3, "pink"],
]);

/** Tolerance in per cent. Orange, yellow and grey as in the 2016 edition; editions before differ. */
const TOLERANCES: Readonly<Record<string, BandColour>> = {
  "20": "black",
  "10": "silver",
  "5": "gold",
  "2": "red",
  "1": "brown",
  "0.5": "green",
  "0.25": "blue",
  "0.1": "violet",
  "0.05": "orange",
  "0.02": "yellow",
  "0.01": "grey",
};

/** Figures and multiplier of a number of so many digits; `null` where it needs more digits or a power beyond the code. */
export function numberBands(value: string, figures: 2 | 3): BandColour[] | null {
  const { digits, exponent } = scientific(value);
  if (digits.length > figures || digits === "0") return null;
  const multiplier = MULTIPLIERS.get(exponent - (figures - digits.length));
  if (multiplier === undefined) return null;
  return [...digits.padEnd(figures, "0")]
    .map((digit) => FIGURES[Number(digit)] ?? "black")
    .concat(multiplier);
}

/**
 * The bands of a resistor, in reading order: two figures, multiplier, tolerance; three figures where the
 * value needs them or the tolerance is 2 % or closer. A link of 0 Ω has one black band. A tolerance of 20 %
 * has no band. `null` for a value the code cannot write or a tolerance it does not know.
 *
 * @param si ohms as decimal text, such as "4700"
 * @param tolerance per cent as decimal text, such as "5"; `null` where not known: no tolerance band
 */
export function resistorBands(si: string, tolerance: string | null): BandColour[] | null {
  if (scientific(si).digits === "0") return ["black"];
  const band = tolerance === null || tolerance === "20" ? [] : [TOLERANCES[tolerance]];
  const close =
    tolerance !== null && ["2", "1", "0.5", "0.25", "0.1", "0.05", "0.02", "0.01"].includes(tolerance);
  const bands = (close ? null : numberBands(si, 2)) ?? numberBands(si, 3);
  const last = band[0];
  if (bands === null || (band.length > 0 && last === undefined)) return null;
  return last === undefined ? bands : [...bands, last];
}

/** Reads bands back: three or four bands have two figures, five and six have three. `null` for no valid code. */
export function readBands(bands: readonly BandColour[]): { si: string; tolerance: string } | null {
  if (bands.length === 1 && bands[0] === "black") return { si: "0", tolerance: "0" };
  if (bands.length < 3 || bands.length > 6) return null;
  const figures = bands.length > 4 ? 3 : 2;
  const digits = bands.slice(0, figures).map((colour) => FIGURES.indexOf(colour));
  const power = [...MULTIPLIERS].find(([, colour]) => colour === bands[figures])?.[0];
  const tolerance =
    bands[figures + 1] === undefined
      ? "20"
      : Object.entries(TOLERANCES).find(([, colour]) => colour === bands[figures + 1])?.[0];
  if (digits.includes(-1) || power === undefined || tolerance === undefined) return null;
  return { si: shiftDecimal(digits.join(""), power), tolerance };
}

/** The colours in words, for the name of a picture: "brown, red, brown". */
export function bandWords(bands: readonly BandColour[]): string {
  return bands.join(", ");
}
