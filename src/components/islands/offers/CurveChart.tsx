import {
  Area,
  CartesianGrid,
  ComposedChart,
  Line,
  ReferenceDot,
  ReferenceLine,
  ResponsiveContainer,
  Tooltip,
  XAxis,
  YAxis,
} from "recharts";
import { countText, moneyText, roundMoneyText } from "#src/components/amount-text.ts";
import {
  axisTitle,
  CURSOR,
  GRID,
  hatchFill,
  INK,
  LINE_NAME,
  PETROL,
  RUN_RING,
  TAKINGS_LINE,
  TOOLTIP_LOOK,
  X_AXIS,
  Y_AXIS,
} from "#src/components/islands/chart-theme.ts";
import { HatchDefs } from "#src/components/islands/parts/HatchDefs.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import type { LadderTerms } from "#src/costing/ladder.ts";
import type { PartOrder } from "#src/costing/run-result.ts";
import { type CurveRow, curveEnd, curveRows, roundTicks } from "./curve-points.ts";

export interface CurveChartProps {
  terms: LadderTerms;
  need: number;
  order: PartOrder | null;
  /** "LEDs". */
  pieces: string;
  /** The table behind the chart is shown too. */
  asTable: boolean;
}

const HEIGHT = 340;

/** What any number costs at one offer: thick is what is paid, the hatched part what buying up saves. */
export default function CurveChart({ terms, need, order, pieces, asTable }: CurveChartProps) {
  const ordered = order?.quantity ?? need;
  const ticks = roundTicks(curveEnd(terms, need, ordered));
  const end = ticks.at(-1) ?? ordered;
  const rows = curveRows(terms, end);
  if (rows.length === 0) return <p className="type-note">No number of these has a price here.</p>;
  const { currency } = terms;
  const amounts = roundTicks(Math.max(...rows.map(({ pays, listed }) => listed ?? pays)), 0.01);
  const instead = order?.boughtUp;
  return (
    <div>
      <section
        style={{ height: HEIGHT }}
        aria-label={`What any number of ${pieces} costs, up to ${countText(end)}`}
      >
        <ResponsiveContainer width="100%" height={HEIGHT} initialDimension={{ width: 358, height: HEIGHT }}>
          <ComposedChart data={rows} margin={{ top: 16, right: 24, bottom: 10, left: 0 }}>
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
              tickFormatter={(amount) => roundMoneyText(String(amount), currency)}
              ticks={amounts}
              domain={[0, amounts.at(-1) ?? 1]}
            />
            <Tooltip content={<Tip currency={currency} />} cursor={CURSOR} isAnimationActive={false} />
            <Area
              dataKey="saved"
              type="linear"
              stroke="none"
              fill={hatchFill("savings")}
              isAnimationActive={false}
              activeDot={false}
              connectNulls={false}
            />
            <Line {...TAKINGS_LINE} dataKey="listed" stroke={INK} strokeWidth={1.25} />
            <Line {...TAKINGS_LINE} dataKey="pays" stroke={PETROL} />
            {need > 0 && (
              <ReferenceLine
                x={need}
                stroke={PETROL}
                strokeWidth={1.5}
                strokeDasharray="4 3"
                label={{
                  value: `need ${countText(need)}`,
                  position: "insideBottomRight",
                  ...LINE_NAME,
                  fill: PETROL,
                }}
              />
            )}
            {instead && (
              <ReferenceDot
                x={instead.insteadOf}
                y={Number(instead.insteadOfCosts)}
                r={4}
                fill={INK}
                label={{
                  value: `${countText(instead.insteadOf)} for ${moneyText(instead.insteadOfCosts, currency)}`,
                  position: "top",
                  offset: 10,
                  ...LINE_NAME,
                  fill: INK,
                }}
              />
            )}
            {order && (
              <ReferenceDot
                x={order.quantity}
                y={Number(order.extended)}
                {...RUN_RING}
                label={{
                  value: `${countText(order.quantity)} for ${moneyText(order.extended, currency)}`,
                  position: "bottom",
                  offset: 12,
                  ...LINE_NAME,
                  fill: INK,
                }}
              />
            )}
          </ComposedChart>
        </ResponsiveContainer>
      </section>
      {asTable && <CurveTable rows={rows} currency={currency} terms={terms} />}
    </div>
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
      <p className="font-semibold">{countText(row.quantity)} needed</p>
      <p>
        {countText(row.order)} for {moneyText(row.paysText, currency)}
      </p>
      {row.saved && row.pays !== row.saved[1] && (
        <p className="text-ink-2">{moneyText(row.listedText, currency)} by the price list</p>
      )}
    </div>
  );
}

/** The points where the price changes, and even steps between. */
function CurveTable({
  rows,
  currency,
  terms,
}: {
  rows: readonly CurveRow[];
  currency: string;
  terms: LadderTerms;
}) {
  const every = Math.max(1, Math.floor(rows.length / 16));
  const breaks = new Set(terms.breaks.map(({ quantity }) => quantity));
  const shown = rows.filter(({ quantity }, place) => place % every === 0 || breaks.has(quantity));
  const columns: Column<CurveRow>[] = [
    {
      key: "quantity",
      head: "Needed",
      number: true,
      names: true,
      cell: ({ quantity }) => countText(quantity),
    },
    { key: "order", head: "Buy", number: true, cell: ({ order }) => countText(order) },
    { key: "pays", head: "You pay", number: true, cell: ({ paysText }) => moneyText(paysText, currency) },
    {
      key: "listed",
      head: "By the list",
      number: true,
      cell: ({ listedText }) => moneyText(listedText, currency),
    },
  ];
  return (
    <Table
      caption="What any number costs"
      rows={shown}
      columns={columns}
      keyOf={({ quantity }) => String(quantity)}
      height="dense"
    />
  );
}
