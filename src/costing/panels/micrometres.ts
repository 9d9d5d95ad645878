import { scaled, scaledText } from "#src/costing/grains.ts";

/** A width and a height in whole micrometres. */
export interface Size {
  width: number;
  height: number;
}

/** A rectangle in whole micrometres from the panel's upper left corner. */
export interface Rect extends Size {
  x: number;
  y: number;
}

/**
 * Millimetres in text as whole micrometres; null where they are finer than that. At most six decimals.
 *
 * @example micrometres("21.5") === 21_500; micrometres("0.0005") === null
 */
export function micrometres(millimetres: string): number | null {
  const nanometres = scaled(millimetres, 6);
  return nanometres % 1000n === 0n ? Number(nanometres / 1000n) : null;
}

/**
 * Whole micrometres as millimetres in text, the shortest exact.
 *
 * @example millimetres(21_500) === "21.5"
 */
export function millimetres(whole: number): string {
  return scaledText(BigInt(whole), 3);
}

/**
 * A size in words.
 *
 * @example sizeWords({ width: 58_000, height: 42_000 }) === "58 × 42 mm"
 */
export function sizeWords({ width, height }: Size): string {
  return `${millimetres(width)} × ${millimetres(height)} mm`;
}

/**
 * Square micrometres as square centimetres in text, exact.
 *
 * @example squareCentimetres(58_000n * 42_000n) === "24.36"
 */
export function squareCentimetres(squareMicrometres: bigint): string {
  return scaledText(squareMicrometres, 8);
}
