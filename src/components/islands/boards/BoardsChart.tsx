import { useCallback } from "react";
import { DefaultZIndexes, Line, LineChart, ReferenceLine, Tooltip, ZIndexLayer } from "recharts";
import { moneyText } from "#src/components/amount-text.ts";
import { COST_LINE, CURSOR, INK, INK_2, RUN_LINE } from "#src/components/islands/chart-theme.ts";
import { BrokenLine } from "#src/components/islands/charts/BrokenLine.tsx";
import { ChartTip } from "#src/components/islands/charts/ChartTip.tsx";
import { nameWidth } from "#src/components/islands/charts/label-room.ts";
import { RunAxes } from "#src/components/islands/charts/RunAxes.tsx";
import { roundTicks } from "#src/components/islands/charts/round-ticks.ts";
import { BoardsMarks } from "./BoardsMarks.tsx";
import { type BoardsPoint, type BoardsPoints, boardsTop } from "./boards-points.ts";

export interface BoardsChartProps extends BoardsPoints {
  span: { from: number; to: number };
  run: number;
  width: number;
  height: number;
  narrow: boolean;
  currency: string;
}

/** Lines that are not chosen are told apart by their dashes too. */
const DASHES = [undefined, "10 4", "3 3", "12 4 3 4"];

/** Landed cost of one board in a kit by run size, a line for each quote. */
export default function BoardsChart(props: BoardsChartProps) {
  const { lines, points, span, run, width, height, narrow, currency } = props;
  const top = boardsTop(props, run);
  const ticks = roundTicks(0, top, 6);
  const others = lines.flatMap(({ id, chosen }) => (chosen ? [] : [id]));
  const names = nameWidth("", ...lines.map(({ label }) => label));
  return (
    <LineChart
      {...{ width, height }}
      data={points as BoardsPoint[]}
      margin={{ top: 12, right: names + 14, bottom: 4, left: 0 }}
      aria-label={`A board at any run, from ${span.from} to ${span.to} kits. Arrow keys go from run size to run size.`}
    >
      <RunAxes {...{ span, ticks, narrow, currency }} range={[0, top]} title="kits in the run" />
      <ReferenceLine x={run} {...RUN_LINE} />
      {[...lines]
        .sort((one, other) => Number(one.chosen) - Number(other.chosen))
        .map(({ id, chosen }) => (
          <Line
            key={id}
            {...COST_LINE}
            name={id}
            dataKey={({ each }: BoardsPoint) => each[id]}
            stroke={chosen ? INK : INK_2}
            strokeWidth={chosen ? COST_LINE.strokeWidth : 1.25}
            strokeDasharray={chosen ? undefined : DASHES[others.indexOf(id) % DASHES.length]}
            shape={(line: object) => (
              <BrokenLine {...line} breaksAfter={(row) => (row as BoardsPoint).breaks[id] ?? false} />
            )}
          />
        ))}
      <ZIndexLayer zIndex={DefaultZIndexes.scatter}>
        <BoardsMarks {...props} />
      </ZIndexLayer>
      <Tooltip cursor={CURSOR} isAnimationActive={false} content={useTip(props)} />
    </LineChart>
  );
}

function useTip({ lines, currency }: BoardsChartProps) {
  return useCallback(
    (tip: object) => (
      <ChartTip<BoardsPoint>
        {...tip}
        lines={({ exact }) =>
          lines.map(({ id, name }) => {
            const value = exact[id] ?? null;
            return { name, figure: value === null ? "not known" : moneyText(value, currency) };
          })
        }
      />
    ),
    [lines, currency],
  );
}
