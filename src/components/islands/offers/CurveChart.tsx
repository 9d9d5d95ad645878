import {
  Area,
  CartesianGrid,
  ComposedChart,
  DefaultZIndexes,
  Line,
  Tooltip,
  XAxis,
  YAxis,
  ZIndexLayer,
} from "recharts";
import { axisMoneyText, countText, moneyText } from "#src/components/amount-text.ts";
import {
  axisTitle,
  CURSOR,
  GRID,
  INK,
  PETROL,
  SAVINGS_AREA,
  TAKINGS_LINE,
  TOOLTIP_LOOK,
  X_AXIS,
  Y_AXIS,
} from "#src/components/islands/chart-theme.ts";
import { axisTicks, roundTicks } from "#src/components/islands/charts/round-ticks.ts";
import { HatchDefs } from "#src/components/islands/parts/HatchDefs.tsx";
import type { LadderTerms } from "#src/costing/ladder.ts";
import type { PartOrder } from "#src/costing/run-result.ts";
import { CurveMarks } from "./CurveMarks.tsx";
import type { CurveRow } from "./curve-points.ts";

export interface CurveChartProps {
  terms: LadderTerms;
  rows: readonly CurveRow[];
  need: number;
  order: PartOrder | null;
  /** "LEDs". */
  pieces: string;
  end: number;
  width: number;
  height: number;
  narrow: boolean;
}

/** What any number costs at one offer: thick is what is paid, the hatched part what buying up saves. */
export default function CurveChart(props: CurveChartProps) {
  const { terms, rows, pieces, end, width, height, narrow } = props;
  const ticks = roundTicks(0, end, narrow ? 5 : 9);
  const amounts = axisTicks(0, Math.max(...rows.map(({ pays, listed }) => listed ?? pays)), 6);
  return (
    <ComposedChart
      {...{ width, height }}
      data={rows as CurveRow[]}
      margin={{ top: 12, right: narrow ? 8 : 20, bottom: 4, left: 0 }}
      aria-label={`What any number of ${pieces} costs, up to ${countText(end)}. Arrow keys go from number to number.`}
    >
      <defs>
        <HatchDefs />
      </defs>
      <CartesianGrid {...GRID} />
      <XAxis
        {...X_AXIS}
        dataKey="quantity"
        domain={[0, end]}
        tickFormatter={countText}
        ticks={ticks}
        label={axisTitle(`${pieces} bought`)}
      />
      <YAxis
        {...Y_AXIS}
        width={narrow ? 50 : Y_AXIS.width}
        tickFormatter={(amount) => axisMoneyText(amount, amounts, terms.currency)}
        ticks={amounts}
        domain={[0, amounts.at(-1) ?? 1]}
      />
      <Tooltip content={<Tip currency={terms.currency} />} cursor={CURSOR} isAnimationActive={false} />
      <Area {...SAVINGS_AREA} dataKey="saved" connectNulls={false} />
      <Line {...TAKINGS_LINE} dataKey="listed" stroke={INK} strokeWidth={1.25} />
      <Line {...TAKINGS_LINE} dataKey="pays" stroke={PETROL} />
      <ZIndexLayer zIndex={DefaultZIndexes.scatter}>
        <CurveMarks {...props} />
      </ZIndexLayer>
    </ComposedChart>
  );
}

interface TipProps {
  currency: string;
  active?: boolean;
  payload?: readonly { payload?: CurveRow }[];
}

function Tip({ currency, active, payload }: TipProps) {
  const row = payload?.[0]?.payload;
  if (!active || !row) return null;
  return (
    <div role="status" className={TOOLTIP_LOOK}>
      <p className="font-semibold">{countText(row.quantity)} wanted</p>
      <p>
        {countText(row.order)} for {moneyText(row.paysText, currency)}
      </p>
      {row.order !== row.quantity && (
        <p className="text-ink-2">{moneyText(row.listedText, currency)} by the price list</p>
      )}
    </div>
  );
}
