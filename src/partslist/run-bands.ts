import { type BandColour, numberBands } from "./colour-bands.ts";

/**
 * The bands of a run size: two figures and a multiplier where that is exact (120: brown, red, brown), else
 * three figures and a multiplier (125: brown, red, green, black). A run has no tolerance band. `null` for
 * a number that is no run size or needs more than three figures.
 */
export function runBands(kits: number): BandColour[] | null {
  if (!Number.isInteger(kits) || kits < 1) return null;
  return numberBands(String(kits), 2) ?? numberBands(String(kits), 3);
}
