import { useCallback } from "react";
import {
  CartesianGrid,
  DefaultZIndexes,
  Line,
  LineChart,
  ReferenceLine,
  Tooltip,
  XAxis,
  YAxis,
  ZIndexLayer,
} from "recharts";
import { moneyText } from "#src/components/amount-text.ts";
import {
  axisTitle,
  CHART_HEIGHT,
  COST_LINE,
  CURSOR,
  GRID,
  INK,
  INK_2,
  LINE_NAME,
  NET_LINE,
  PETROL,
  RULE_2,
  RUN_LINE,
  RUN_RING,
  SPOT_RING,
  X_AXIS,
  Y_AXIS,
} from "#src/components/islands/chart-theme.ts";
import { BrokenLine } from "./BrokenLine.tsx";
import { ChartTip } from "./ChartTip.tsx";
import { useChartScale } from "./chart-scale.ts";
import { type CostPoint, pixels, type Span, unitCostRange } from "./cost-points.ts";
import { labelsWithRoom } from "./label-room.ts";
import { axisTicks, roundTicks } from "./round-ticks.ts";
import { useAxisMoney, useStable } from "./stable.ts";

export interface NamedSpot {
  kits: number;
  /** Exact. */
  perKit: string;
}

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
  spots: readonly NamedSpot[];
  /** What the kit after the run costs, and why that is worth a note: "it opens a third set of panels". */
  nextKit: { title: string; reason: string } | null;
  /** One sentence that says what is to be seen. */
  label: string;
  /** "used" or "spent": the named view. */
  view: string;
}

const TITLE = axisTitle("kits in the run");
const MARGIN = { top: 12, right: 20, bottom: 0, left: 0 };
const NARROW_MARGIN = { ...MARGIN, right: 8 };
const drawLine = (line: object) => <BrokenLine {...line} />;

/** Cost of one kit against run size. */
export function CostChart(props: CostChartProps) {
  const { points, span, run, width, narrow } = props;
  const brings = pixels(props.brings);
  const range = unitCostRange(points, run, brings);
  const yTicks = useStable(axisTicks(range.low, range.high, 6));
  const top = yTicks.at(-1) ?? 0;
  return (
    <LineChart
      width={width}
      height={narrow ? 330 : CHART_HEIGHT.cost}
      data={points as CostPoint[]}
      margin={narrow ? NARROW_MARGIN : MARGIN}
      aria-label={props.label}
    >
      <CartesianGrid {...GRID} />
      <XAxis
        {...X_AXIS}
        dataKey="kits"
        domain={useStable([span.from, span.to])}
        ticks={useStable(roundTicks(span.from, span.to, narrow ? 4 : 9))}
        label={TITLE}
      />
      <YAxis
        {...Y_AXIS}
        domain={useStable([yTicks[0] ?? 0, top])}
        ticks={yTicks}
        width={narrow ? 46 : Y_AXIS.width}
        allowDataOverflow
        tickFormatter={useAxisMoney(yTicks, props.currency)}
      />
      {brings !== null && <ReferenceLine y={brings} {...NET_LINE} />}
      {run >= span.from && run <= span.to && <ReferenceLine x={run} {...RUN_LINE} />}
      <Line {...COST_LINE} dataKey="perKit" shape={drawLine} />
      <ZIndexLayer zIndex={DefaultZIndexes.scatter}>
        <CostMarks {...props} top={top} />
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
        <ChartTip
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

interface PlacedSpot extends NamedSpot {
  x: number;
  y: number;
}

type Scale = NonNullable<ReturnType<typeof useChartScale>>;

function placed({ kits, perKit }: NamedSpot, scale: Scale): PlacedSpot {
  return { kits, perKit, ...scale({ kits, money: Number(perKit) }) };
}

/** Rings and names over the line. */
function CostMarks(props: CostChartProps & { top: number }) {
  const scale = useChartScale();
  if (!scale) return null;
  const { points, span, run, brings, currency, spots, narrow, top } = props;
  const exactAt = (kits: number) => points.find((point) => point.kits === kits)?.exact.perKit ?? null;
  const perKit = exactAt(run);
  const chosen = perKit === null ? null : placed({ kits: run, perKit }, scale);
  const rings = spots
    .filter(
      ({ kits, perKit }) => kits !== run && kits >= span.from && kits <= span.to && Number(perKit) <= top,
    )
    .map((spot) => placed(spot, scale));
  return (
    <g>
      {brings !== null && <BringsName span={span} brings={brings} {...{ currency, narrow, scale }} />}
      {chosen && <EarnsName {...props} chosen={chosen} scale={scale} />}
      {rings.map(({ kits, x, y }) => (
        <circle key={kits} cx={x} cy={y} {...SPOT_RING} />
      ))}
      {chosen && <circle cx={chosen.x} cy={chosen.y} {...RUN_RING} />}
      <SpotNames chosen={chosen} rings={rings} narrow={narrow} currency={currency} />
      {!narrow && chosen && props.nextKit && (
        <NextKitNote
          note={props.nextKit}
          end={scale({ kits: span.to, money: 0 }).x}
          from={scale({ kits: Math.min(run + 1, span.to), money: Number(exactAt(run + 1) ?? chosen.perKit) })}
        />
      )}
    </g>
  );
}

interface SpotNamesProps {
  chosen: PlacedSpot | null;
  rings: readonly PlacedSpot[];
  narrow: boolean;
  currency: string;
}

/** Run and cost, below left of each ring that has the room. */
function SpotNames({ chosen, rings, narrow, currency }: SpotNamesProps) {
  const half = narrow ? 26 : 30;
  const wanted = [...(chosen ? [chosen] : []), ...rings].map((spot) => ({
    ...spot,
    at: spot.x,
    half,
    rank: spot === chosen ? 0 : 1,
  }));
  return labelsWithRoom(wanted).map(({ kits, perKit, x, y, rank }) => (
    <text key={kits} y={y + 24} {...LINE_NAME} textAnchor="end">
      <tspan x={x - 8} fill={INK} fontWeight={rank === 0 ? 700 : 600}>
        {rank === 0 ? `${kits} kits` : kits}
      </tspan>
      <tspan x={x - 8} dy={19} fill={rank === 0 ? INK : INK_2} fontWeight={rank === 0 ? 700 : 400}>
        {moneyText(perKit, currency)}
      </tspan>
    </text>
  ));
}

type BringsNameProps = Pick<CostChartProps, "span" | "currency" | "narrow"> & {
  brings: string;
  scale: Scale;
};

function BringsName({ span, brings, currency, narrow, scale }: BringsNameProps) {
  const { x, y } = scale({ kits: span.to, money: Number(brings) });
  return (
    <text x={x} y={y - 9} {...LINE_NAME} textAnchor="end" fill={PETROL}>
      One kit brings in {moneyText(brings, currency)}
      {narrow ? "" : " after tax, fees and postage"}
    </text>
  );
}

/** Between the line of the run and what a kit brings. */
function EarnsName({
  brings,
  earns,
  currency,
  chosen,
  scale,
}: CostChartProps & { chosen: PlacedSpot; scale: Scale }) {
  if (brings === null || earns === null) return null;
  const { y } = scale({ kits: chosen.kits, money: Number(brings) });
  const room = Math.abs(chosen.y - y);
  if (room < 44) return null;
  const lost = earns.startsWith("-");
  return (
    <text
      x={chosen.x + 10}
      y={Math.min(chosen.y, y) + Math.min(room / 2 + 5, 44)}
      {...LINE_NAME}
      fill={PETROL}
    >
      {lost ? "loses" : "earns"} {moneyText(lost ? earns.slice(1) : earns, currency)}
    </text>
  );
}

interface NextKitNoteProps {
  note: { title: string; reason: string };
  from: { x: number; y: number };
  end: number;
}

/** What one kit more sets off, with a leader to the place where the line goes on. */
function NextKitNote({ note, from, end }: NextKitNoteProps) {
  const x = from.x + 44;
  const y = Math.max(from.y - 56, 40);
  if (end - x < 260) return null;
  return (
    <g>
      <path
        d={`M${from.x + 6} ${from.y - 3}L${x - 4} ${y + 14}`}
        stroke={RULE_2}
        strokeWidth={1.25}
        fill="none"
      />
      <text y={y} {...LINE_NAME} fill={INK}>
        <tspan x={x}>{note.title}</tspan>
        <tspan x={x} dy={20} fontWeight={400} fill={INK_2}>
          {note.reason}
        </tspan>
      </text>
    </g>
  );
}
