import type { PlotArea } from "recharts";
import {
  COST_LINE,
  INK,
  INK_2,
  LINE_NAME,
  RULE_2,
  SHEET,
  SPOT_RING,
  TAKINGS_LINE,
} from "#src/components/islands/chart-theme.ts";
import { labelsWithRoom } from "#src/components/islands/charts/label-room.ts";
import type { ChartScale } from "./chart-scale.ts";
import type { CostPoint } from "./cost-points.ts";
import { GainAreas } from "./EvenAreas.tsx";
import type { PlacedCrossing } from "./even-places.ts";
import type { ChartPlace } from "./even-shapes.ts";

interface EvenWindowProps {
  points: readonly CostPoint[];
  crossings: readonly PlacedCrossing[];
  scale: ChartScale;
  plot: PlotArea;
}

interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** Run sizes that the window shows: the crossings and a little on both sides. */
function shown(points: readonly CostPoint[], crossings: readonly PlacedCrossing[]): CostPoint[] {
  const kits = crossings.map((crossing) => crossing.kits);
  const [first, last] = [Math.min(...kits), Math.max(...kits)];
  const margin = Math.max(3, Math.ceil((last - first) * 0.35));
  return points.filter(
    (point) =>
      point.kits >= first - margin &&
      point.kits <= last + margin &&
      point.total !== null &&
      point.brings !== null,
  );
}

function bounds(points: readonly CostPoint[]) {
  const sums = points.flatMap(({ total, brings }) => [total ?? 0, brings ?? 0]);
  const [low, high] = [Math.min(...sums), Math.max(...sums)];
  const spare = (high - low) * 0.08 || 1;
  return {
    from: points[0]?.kits ?? 0,
    to: points.at(-1)?.kits ?? 1,
    low: low - spare,
    high: high + spare,
  };
}

/** The costs as one line with uprights at its steps: enlarged, a step is to be seen as one. */
function stepped(points: readonly CostPoint[]): ChartPlace[] {
  return points.flatMap((point, place) => {
    const here = { kits: point.kits, money: point.total ?? 0 };
    const next = points[place + 1];
    return point.breaksAfter && next ? [here, { kits: next.kits, money: here.money }] : [here];
  });
}

const path = (places: readonly ChartPlace[], scale: ChartScale) =>
  places
    .map(scale)
    .map(({ x, y }, place) => `${place === 0 ? "M" : "L"}${x.toFixed(2)} ${y.toFixed(2)}`)
    .join("");

/** A window at the upper left that enlarges crossings standing too near to be told apart. */
export function EvenWindow({ points, crossings, scale, plot }: EvenWindowProps) {
  const part = shown(points, crossings);
  if (part.length < 2) return null;
  const { from, to, low, high } = bounds(part);
  const frame: Box = {
    x: plot.x + 22,
    y: plot.y + 14,
    width: Math.min(352, plot.width * 0.4),
    height: Math.min(206, plot.height * 0.48),
  };
  const inner = { x: frame.x, y: frame.y + 30, width: frame.width, height: frame.height - 62 };
  const within = ({ kits, money }: ChartPlace) => ({
    x: inner.x + ((kits - from) / (to - from)) * inner.width,
    y: inner.y + ((high - money) / (high - low)) * inner.height,
  });
  const [corner, end] = [scale({ kits: from, money: high }), scale({ kits: to, money: low })];
  const foot = frame.y + frame.height;
  return (
    <g>
      <rect
        x={corner.x}
        y={corner.y}
        width={end.x - corner.x}
        height={end.y - corner.y}
        fill="none"
        stroke={INK}
        strokeWidth={1.25}
      />
      <path
        d={`M${frame.x} ${foot}L${corner.x} ${corner.y}M${frame.x + frame.width} ${foot}L${end.x} ${corner.y}`}
        stroke={RULE_2}
        strokeWidth={1.25}
        strokeDasharray="2 3"
        fill="none"
      />
      <rect {...frame} fill={SHEET} stroke={INK} strokeWidth={1.25} />
      <text x={frame.x + 12} y={frame.y + 20} {...LINE_NAME} stroke={SHEET} fontWeight={400} fill={INK_2}>
        enlarged
      </text>
      <GainAreas points={part} scale={within} />
      <path
        d={path(
          part.map(({ kits, brings }) => ({ kits, money: brings ?? 0 })),
          within,
        )}
        fill="none"
        stroke={TAKINGS_LINE.stroke}
        strokeWidth={TAKINGS_LINE.strokeWidth}
      />
      <path
        d={path(stepped(part), within)}
        fill="none"
        stroke={COST_LINE.stroke}
        strokeWidth={COST_LINE.strokeWidth}
      />
      {labelsWithRoom(
        crossings.map(({ kits, place }) => ({ kits, at: within(place).x, half: 15, rank: 0 })),
      ).map(({ kits, at }) => (
        <text
          key={kits}
          x={at}
          y={foot - 9}
          {...LINE_NAME}
          stroke={SHEET}
          fontWeight={400}
          textAnchor="middle"
          fill={INK_2}
        >
          {kits}
        </text>
      ))}
      {crossings.map(({ letter, place }) => {
        const { x, y } = within(place);
        return (
          <g key={letter}>
            <circle cx={x} cy={y} {...SPOT_RING} />
            <text x={x - 8} y={y - 14} {...LINE_NAME} stroke={SHEET} textAnchor="end" fill={INK}>
              {letter}
            </text>
          </g>
        );
      })}
    </g>
  );
}
