import { useId } from "react";
import { usePlotArea } from "recharts";
import { STEP_SEGMENT } from "#src/components/islands/chart-theme.ts";

interface DrawnPoint {
  x: number | null;
  y: number | null;
  /** The row that the point is drawn from; it may say that the line breaks after it. */
  payload?: object;
}

/** What Recharts hands to the shape of a line. */
export interface BrokenLineProps {
  points?: readonly DrawnPoint[];
  stroke?: string;
  strokeWidth?: number | string;
  strokeDasharray?: string | number;
  /** Whether the line breaks after a row of the data; left out, it never does. */
  breaksAfter?: (row: object) => boolean;
}

type Placed = { x: number; y: number; breaks: boolean };

function placed(
  points: readonly DrawnPoint[],
  breaksAfter: BrokenLineProps["breaksAfter"],
): (Placed | null)[] {
  return points.map(({ x, y, payload }) =>
    x === null || y === null ? null : { x, y, breaks: (payload && breaksAfter?.(payload)) ?? false },
  );
}

/** The path with a gap after each step, and the steps as pairs of ends. */
function paths(points: readonly (Placed | null)[]): { line: string; steps: [Placed, Placed][] } {
  const line: string[] = [];
  const steps: [Placed, Placed][] = [];
  let drawing = false;
  for (const [place, point] of points.entries()) {
    if (point) line.push(`${drawing ? "L" : "M"}${point.x.toFixed(2)} ${point.y.toFixed(2)}`);
    const next = points[place + 1];
    if (point?.breaks && next) steps.push([point, next]);
    drawing = point !== null && !point.breaks;
  }
  return { line: line.join(""), steps };
}

/** A line that breaks where cost goes up in a step, its two ends joined by a fine dashed one. */
export function BrokenLine({
  points = [],
  stroke,
  strokeWidth,
  strokeDasharray,
  breaksAfter,
}: BrokenLineProps) {
  const { line, steps } = paths(placed(points, breaksAfter));
  const plot = usePlotArea();
  const clip = useId();
  return (
    <g clipPath={plot && `url(#${clip})`}>
      {plot && (
        <clipPath id={clip}>
          <rect x={plot.x} y={plot.y} width={plot.width} height={plot.height + 2} />
        </clipPath>
      )}
      {steps.map(([from, to]) => (
        <path key={from.x} d={`M${from.x} ${from.y}L${to.x} ${to.y}`} fill="none" {...STEP_SEGMENT} />
      ))}
      <path d={line} fill="none" {...{ stroke, strokeWidth, strokeDasharray }} strokeLinejoin="round" />
    </g>
  );
}
