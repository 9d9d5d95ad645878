import { type Pixels, usePixels } from "#src/components/islands/charts/pixels.ts";
import type { ChartPlace } from "./even-shapes.ts";

export type ChartScale = (place: ChartPlace) => Pixels;

/** Turns kits and money into pixels, for what is drawn over the lines; null before the chart has its scales. */
export function useChartScale(): ChartScale | null {
  const pixels = usePixels();
  return pixels && (({ kits, money }) => pixels(kits, money));
}
