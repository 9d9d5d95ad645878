import { scientific } from "./exact-decimal.ts";
import { BAND_COLOURS, type BandColour } from "./run-bands.ts";

/** Tolerance colours of IEC 60062:2016; earlier editions have no orange and yellow, and grey is 0.05 % there. */
const TOLERANCES: Readonly<Record<string, BandColour>> = {
  "1": "brown",
  "2": "red",
  "0.05": "orange",
  "0.02": "yellow",
  "0.5": "green",
  "0.25": "blue",
  "0.1": "violet",
  "0.01": "grey",
  "5": "gold",
  "10": "silver",
};
/** The power of ten of the last figure: gold is a tenth, silver a hundredth. */
const MULTIPLIERS_BELOW_ONE: Readonly<Record<number, BandColour>> = { [-1]: "gold", [-2]: "silver" };

/** A resistor's bands; `tolerance` says whether the last one is a tolerance. */
export interface ResistorBands {
  colours: BandColour[];
  tolerance: boolean;
}

function multiplier(power: number): BandColour | undefined {
  return power < 0 ? MULTIPLIERS_BELOW_ONE[power] : power <= 9 ? BAND_COLOURS[power] : undefined;
}

function percent(tolerance: string | null): string | undefined {
  return /\d+(?:[.,]\d+)?/.exec(tolerance ?? "")?.[0]?.replace(",", ".");
}

/**
 * The colour bands of a resistor: two figures, a multiplier and the tolerance, or three figures where the value
 * has three, or its tolerance is 2 % or finer (such parts carry five bands). `null` for zero and for a value that
 * no bands can say. Source: IEC 60062:2016, clause 3.
 *
 * @param ohms exact decimal text.
 * @param tolerance as written, such as "5 %"; `null`: not known, and no tolerance band is drawn.
 */
export function resistorBands(ohms: string, tolerance: string | null): ResistorBands | null {
  const { digits, exponent } = scientific(ohms);
  if (digits === "0" || digits.length > 3) return null;
  const known = percent(tolerance);
  const last = known === undefined ? undefined : TOLERANCES[known];
  const fine = known !== undefined && Number(known) <= 2;
  const figures = digits.length === 3 || fine ? 3 : 2;
  const by = multiplier(exponent + digits.length - figures);
  if (by === undefined) return null;
  const shown = digits.padEnd(figures, "0");
  const colours = [...[...shown].map((figure) => BAND_COLOURS[Number(figure)] as BandColour), by];
  return last === undefined
    ? { colours, tolerance: false }
    : { colours: [...colours, last], tolerance: true };
}
