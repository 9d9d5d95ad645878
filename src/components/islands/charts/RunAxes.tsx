import { useMemo } from "react";
import { CartesianGrid, XAxis, YAxis } from "recharts";
import { axisTitle, GRID, X_AXIS, Y_AXIS } from "#src/components/islands/chart-theme.ts";
import { roundTicks } from "./round-ticks.ts";
import { useAxisMoney, useStable } from "./stable.ts";

interface RunAxesProps {
  span: { from: number; to: number };
  /** Lowest and highest money that is drawn, and the round figures between. */
  range: readonly [low: number, high: number];
  ticks: readonly number[];
  currency: string;
  narrow: boolean;
  /** "kits in the run". */
  title: string;
}

/** Run sizes below, money at the left, and a hairline at each figure of it. */
export function RunAxes({ span, range, ticks, currency, narrow, title }: RunAxesProps) {
  const money = useStable(ticks);
  return (
    <>
      <CartesianGrid {...GRID} syncWithTicks />
      <XAxis
        {...X_AXIS}
        dataKey="kits"
        domain={useStable([span.from, span.to])}
        ticks={useStable(roundTicks(span.from, span.to, narrow ? 5 : 9))}
        label={useMemo(() => axisTitle(title), [title])}
      />
      <YAxis
        {...Y_AXIS}
        domain={useStable(range)}
        ticks={money}
        width={narrow ? 54 : Y_AXIS.width}
        allowDataOverflow
        tickFormatter={useAxisMoney(money, currency)}
      />
    </>
  );
}
