import { hatchFill, PETROL_WASH } from "#src/components/islands/chart-theme.ts";
import { type ChartScale, useChartScale } from "./chart-scale.ts";
import type { CostPoint } from "./cost-points.ts";
import { type GainArea, gainAreas } from "./even-shapes.ts";

/** The outline of an area in pixels. */
function areaPath({ upper, lower }: GainArea, scale: ChartScale): string {
  const ring = [...upper, ...[...lower].reverse()].map(scale);
  return `${ring.map(({ x, y }, place) => `${place === 0 ? "M" : "L"}${x.toFixed(2)} ${y.toFixed(2)}`).join("")}Z`;
}

/** Loss hatched, profit plain, as outlines on a scale. */
export function GainAreas({ points, scale }: { points: readonly CostPoint[]; scale: ChartScale }) {
  return gainAreas(points).map((area) => (
    <path
      key={area.upper[0]?.kits}
      d={areaPath(area, scale)}
      fill={area.gain === "profit" ? PETROL_WASH : hatchFill("loss")}
      stroke="none"
    />
  ));
}

/** The areas of a chart, below its lines. */
export function EvenAreas({ points }: { points: readonly CostPoint[] }) {
  const scale = useChartScale();
  return scale && <GainAreas points={points} scale={scale} />;
}
