import { useXAxisScale, useYAxisScale } from "recharts";

/** A point in a chart, in pixels. */
export interface Pixels {
  x: number;
  y: number;
}

/** Turns values of both axes into pixels, for what is drawn over the lines; null before the chart has its scales. */
export function usePixels(): ((across: number, up: number) => Pixels) | null {
  const x = useXAxisScale();
  const y = useYAxisScale();
  if (!x || !y) return null;
  return (across, up) => ({ x: x(across) ?? 0, y: y(up) ?? 0 });
}
