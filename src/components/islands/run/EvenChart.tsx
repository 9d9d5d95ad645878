import { useCallback } from "react";
import { DefaultZIndexes, Line, LineChart, Tooltip, ZIndexLayer } from "recharts";
import { moneyText } from "#src/components/amount-text.ts";
import { CHART_HEIGHT, COST_LINE, CURSOR, TAKINGS_LINE } from "#src/components/islands/chart-theme.ts";
import { BrokenLine } from "#src/components/islands/charts/BrokenLine.tsx";
import { ChartTip } from "#src/components/islands/charts/ChartTip.tsx";
import { RunAxes } from "#src/components/islands/charts/RunAxes.tsx";
import { axisTicks } from "#src/components/islands/charts/round-ticks.ts";
import { HatchDefs } from "#src/components/islands/parts/HatchDefs.tsx";
import type { CostPoint, Span } from "./cost-points.ts";
import { EvenAreas } from "./EvenAreas.tsx";
import { EvenMarks } from "./EvenMarks.tsx";

/** A place where takings and cost cross, with its letter. */
export interface LetteredCrossing {
  letter: string;
  kits: number;
}

export interface EvenChartProps {
  points: readonly CostPoint[];
  span: Span;
  run: number;
  width: number;
  narrow: boolean;
  currency: string;
  crossings: readonly LetteredCrossing[];
  /** So many sold pay for the run; null where even all do not. */
  soldToPay: number | null;
  label: string;
}

const MARGIN = { top: 12, right: 20, bottom: 4, left: 0 };
const NARROW_MARGIN = { ...MARGIN, right: 8 };
const drawLine = (line: object) => (
  <BrokenLine {...line} breaksAfter={(row) => (row as CostPoint).breaksAfter} />
);
const drawWhole = (line: object) => <BrokenLine {...line} />;

/** Takings against total cost, if every kit sells. */
export function EvenChart(props: EvenChartProps) {
  const { points, span, width, narrow, currency } = props;
  const top = Math.max(1, ...points.flatMap(({ total, brings }) => [total ?? 0, brings ?? 0]));
  const low = Math.min(0, ...points.map(({ brings }) => brings ?? 0));
  const ticks = axisTicks(low, top, 7);
  return (
    <LineChart
      width={width}
      height={narrow ? 360 : CHART_HEIGHT.breakEven}
      data={points as CostPoint[]}
      margin={narrow ? NARROW_MARGIN : MARGIN}
      aria-label={props.label}
    >
      <defs>
        <HatchDefs />
      </defs>
      <RunAxes
        {...{ span, ticks, narrow, currency }}
        range={[ticks[0] ?? 0, ticks.at(-1) ?? 0]}
        title="kits made and sold"
      />
      <EvenAreas points={points} />
      <Line {...TAKINGS_LINE} dataKey="brings" shape={drawWhole} />
      <Line {...COST_LINE} dataKey="total" shape={drawLine} />
      <ZIndexLayer zIndex={DefaultZIndexes.scatter}>
        <EvenMarks {...props} />
      </ZIndexLayer>
      <Tooltip cursor={CURSOR} isAnimationActive={false} content={useTip(currency)} />
    </LineChart>
  );
}

function useTip(currency: string) {
  return useCallback(
    (tip: object) => {
      const written = (value: string | null) => (value === null ? "not known" : moneyText(value, currency));
      return (
        <ChartTip<CostPoint>
          {...tip}
          lines={({ exact }) => [
            { name: "Takings", figure: written(exact.brings) },
            { name: "Total cost, used", figure: written(exact.total) },
          ]}
        />
      );
    },
    [currency],
  );
}
