import { useCallback } from "react";
import { DefaultZIndexes, Line, LineChart, ReferenceLine, Tooltip, ZIndexLayer } from "recharts";
import { moneyText } from "#src/components/amount-text.ts";
import { CHART_HEIGHT, COST_LINE, CURSOR, NET_LINE, RUN_LINE } from "#src/components/islands/chart-theme.ts";
import { BrokenLine } from "#src/components/islands/charts/BrokenLine.tsx";
import { ChartTip } from "#src/components/islands/charts/ChartTip.tsx";
import { RunAxes } from "#src/components/islands/charts/RunAxes.tsx";
import { roundTicks } from "#src/components/islands/charts/round-ticks.ts";
import { CostMarks } from "./CostMarks.tsx";
import { type CostPoint, pixels, type Span, unitCostRange } from "./cost-points.ts";
import type { StepNote } from "./step-note.ts";

export interface CostChartProps {
  points: readonly CostPoint[];
  span: Span;
  run: number;
  width: number;
  narrow: boolean;
  currency: string;
  /** What one kit brings after tax, fees and postage, for the dashed line; exact, null while not known. */
  brings: string | null;
  /** What one kit of the run earns; exact, null while not known. */
  earns: string | null;
  /** Run sizes that get a ring. */
  spots: readonly number[];
  /** The step at the run or after it. */
  note: StepNote | null;
  /** One sentence that says what is to be seen. */
  label: string;
  /** "used" or "spent": the named view. */
  view: string;
}

const MARGIN = { top: 12, right: 20, bottom: 4, left: 0 };
const NARROW_MARGIN = { ...MARGIN, right: 8 };
const drawLine = (line: object) => (
  <BrokenLine {...line} breaksAfter={(row) => (row as CostPoint).breaksAfter} />
);

/** Cost of one kit against run size. */
export function CostChart(props: CostChartProps) {
  const { points, span, run, width, narrow, currency } = props;
  const brings = pixels(props.brings);
  const range = unitCostRange(points, run, brings);
  const ticks = roundTicks(range.low, range.high, 6);
  return (
    <LineChart
      width={width}
      height={narrow ? 330 : CHART_HEIGHT.cost}
      data={points as CostPoint[]}
      margin={narrow ? NARROW_MARGIN : MARGIN}
      aria-label={props.label}
    >
      <RunAxes
        {...{ span, ticks, narrow, currency }}
        range={[range.low, range.high]}
        title="kits in the run"
      />
      {brings !== null && range.brings === "drawn" && <ReferenceLine y={brings} {...NET_LINE} />}
      {run >= span.from && run <= span.to && <ReferenceLine x={run} {...RUN_LINE} />}
      <Line {...COST_LINE} dataKey="perKit" shape={drawLine} />
      <ZIndexLayer zIndex={DefaultZIndexes.scatter}>
        <CostMarks {...props} range={range} />
      </ZIndexLayer>
      <Tooltip cursor={CURSOR} isAnimationActive={false} content={useTip(props)} />
    </LineChart>
  );
}

function useTip({ view, brings, currency }: CostChartProps) {
  return useCallback(
    (tip: object) => {
      const written = (value: string | null) => (value === null ? "not known" : moneyText(value, currency));
      return (
        <ChartTip<CostPoint>
          {...tip}
          lines={({ exact }) => [
            { name: `One kit, ${view}`, figure: written(exact.perKit) },
            { name: `The run, ${view}`, figure: written(exact.total) },
            { name: "One kit brings", figure: written(brings) },
          ]}
        />
      );
    },
    [view, brings, currency],
  );
}
