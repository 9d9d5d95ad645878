/** Colour names of IEC 60062, in the order of the figures 0 to 9, then the two metals (multipliers below one, tolerances). */
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
] as const;
export type BandColour = (typeof BAND_COLOURS)[number];

/** The colour of one decimal figure. */
function figureColour(figure: string): BandColour {
  return BAND_COLOURS[Number(figure)] ?? "black";
}

/**
 * The bands that stand for a run of kits: two figures and a multiplier when that is exact (120: brown, red, brown),
 * else three figures and a multiplier (125: brown, red, green, black). A run under ten takes the gold multiplier of
 * a tenth (5: green, black, gold). No tolerance band: a run has none.
 * Source of the colours and of gold as one tenth: IEC 60062, marking codes for resistors.
 * @returns nothing for what is no whole number from 1, or has more than three figures that count.
 */
export function runBands(kits: number): BandColour[] {
  if (!Number.isInteger(kits) || kits < 1) return [];
  const digits = String(kits);
  if (digits.length === 1) return [figureColour(digits), "black", "gold"];
  const figures = /^..0*$/.test(digits) ? 2 : 3;
  if (!/^0*$/.test(digits.slice(figures))) return [];
  return [...digits.slice(0, figures), String(digits.length - figures)].map(figureColour);
}
