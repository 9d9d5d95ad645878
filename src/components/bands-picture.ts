import type { BandColour } from "#src/partslist/run-bands.ts";

/** Geometry of the drawn axial body, in a box of 206 × 54; smaller sizes scale it. */
export const BANDS_BOX = { width: 206, height: 54 } as const;
/** Widths that the design uses; the height follows. */
export type BandsWidth = 52 | 64 | 92 | 104 | 206;

export const BODY_PATH =
  "M37 1H59C64 1 65 8 70 8H136C141 8 142 1 147 1H169Q179.5 1 179.5 12V42Q179.5 53 169 53H147C142 53 141 46 136 46H70C65 46 64 53 59 53H37Q26.5 53 26.5 42V12Q26.5 1 37 1Z";

export type DrawnBand = { colour: BandColour; x: number; y: number; width: number; height: number };

const CAP = { y: 1, height: 52 };
const WAIST = { y: 8, height: 38 };

/**
 * Where each band lies: the first on the left cap, the rest in the waist, a tolerance band on the right cap.
 * Without a tolerance the right part stays empty.
 */
export function drawnBands(colours: readonly BandColour[], tolerance = false): DrawnBand[] {
  const value = tolerance ? colours.slice(0, -1) : colours;
  const few = value.length <= 3;
  const width = few ? 12 : 9.5;
  const xs = few ? [40, 77.5, 104.5] : [36, 72, 94.5, 118];
  const bands = value.map((colour, place) => ({
    colour,
    x: xs[place] ?? 118,
    width,
    ...(place === 0 ? CAP : WAIST),
  }));
  const last = colours.at(-1);
  return tolerance && last ? [...bands, { colour: last, x: 166 - width, width, ...CAP }] : bands;
}

/** "bands brown, red, brown": what a picture of bands is called. */
export function bandsInWords(colours: readonly BandColour[]): string {
  return colours.length === 0 ? "no bands" : `bands ${colours.join(", ")}`;
}

/** Left edges of the 8 px stripes on the 38 px edge of a kit label. */
export function edgeStripes(count: number): number[] {
  const gap = (38 - count * 8) / (count + 1);
  return Array.from({ length: count }, (_, place) => gap + place * (8 + gap));
}
