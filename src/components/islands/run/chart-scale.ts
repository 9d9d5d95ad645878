import { useXAxisScale, useYAxisScale } from "recharts";
import type { ChartPlace } from "./even-shapes.ts";

/** Turns kits and money into pixels, for what is drawn over the lines; null before the chart has its scales. */
export function useChartScale(): ((place: ChartPlace) => { x: number; y: number }) | null {
  const x = useXAxisScale();
  const y = useYAxisScale();
  if (!x || !y) return null;
  return ({ kits, money }) => ({ x: x(kits) ?? 0, y: y(money) ?? 0 });
}
