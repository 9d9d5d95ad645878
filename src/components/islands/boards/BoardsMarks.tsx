import { usePlotArea } from "recharts";
import { moneyText } from "#src/components/amount-text.ts";
import { INK, INK_2, LINE_NAME, RUN_RING } from "#src/components/islands/chart-theme.ts";
import { usePixels } from "#src/components/islands/charts/pixels.ts";
import type { BoardsChartProps } from "./BoardsChart.tsx";

/** Two names one below the other. */
const APART = 20;

/** Heights of names so that none covers the next: each as near to its line as those above it allow. */
export function apart(wanted: readonly number[], foot: number): number[] {
  const order = wanted.map((y, place) => ({ y, place })).sort((one, other) => one.y - other.y);
  let before = Number.NEGATIVE_INFINITY;
  for (const name of order) {
    name.y = Math.max(name.y, before + APART);
    before = name.y;
  }
  let after = foot + APART;
  for (const name of order.toReversed()) {
    name.y = Math.min(name.y, after - APART);
    after = name.y;
  }
  return order.sort((one, other) => one.place - other.place).map(({ y }) => y);
}

/** The ring of the run with what a board costs there, and each quote's name at the end of its line. */
export function BoardsMarks(props: BoardsChartProps) {
  const pixels = usePixels();
  const plot = usePlotArea();
  if (!pixels || !plot) return null;
  const { lines, points, run } = props;
  const ends = lines.flatMap((line) => {
    const last = points.findLast(({ each }) => typeof each[line.id] === "number");
    return last ? [{ line, y: pixels(last.kits, last.each[line.id] ?? 0).y }] : [];
  });
  const heights = apart(
    ends.map(({ y }) => Math.max(y, plot.y)),
    plot.y + plot.height,
  );
  const chosen = lines.find((line) => line.chosen);
  const at = points.find(({ kits }) => kits === run);
  const value = chosen && at?.exact[chosen.id];
  return (
    <g>
      {ends.map(({ line: { id, label, chosen: first } }, place) => (
        <text
          key={id}
          x={plot.x + plot.width + 8}
          y={(heights[place] ?? 0) + 5}
          {...LINE_NAME}
          fill={first ? INK : INK_2}
          fontWeight={first ? 600 : 400}
        >
          {label}
        </text>
      ))}
      {value && (
        <RunRing {...props} value={value} {...pixels(run, Number(value))} foot={plot.y + plot.height} />
      )}
    </g>
  );
}

interface RunRingProps extends BoardsChartProps {
  value: string;
  x: number;
  y: number;
  foot: number;
}

/** Below left of the ring, or above it where it stands too low. */
function RunRing({ run, currency, narrow, value, x, y, foot }: RunRingProps) {
  const top = foot - y > 54 ? y + 24 : y - 34;
  return (
    <g>
      <circle cx={x} cy={y} {...RUN_RING} />
      <text y={top} {...LINE_NAME} textAnchor="end" fontWeight={700} fill={INK}>
        <tspan x={x - 8}>{run} kits</tspan>
        <tspan x={x - 8} dy={19}>
          {moneyText(value, currency)}
          {narrow ? "" : " a board"}
        </tspan>
      </text>
    </g>
  );
}
