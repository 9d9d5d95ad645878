import { usePlotArea } from "recharts";
import {
  BAD,
  hatchFill,
  INK,
  LINE_NAME,
  PAID_BACK_LINE,
  PETROL,
  PETROL_WASH,
  RUN_RING,
  SPOT_RING,
} from "#src/components/islands/chart-theme.ts";
import { money } from "#src/components/written.ts";
import { useChartScale } from "./chart-scale.ts";
import type { CostPoint } from "./cost-points.ts";
import type { EvenChartProps } from "./EvenChart.tsx";
import { EvenWindow } from "./EvenWindow.tsx";
import { type ChartPlace, crowded, type GainArea, gainAreas, meeting } from "./even-shapes.ts";

type Scale = (place: ChartPlace) => { x: number; y: number };

/** The outline of an area in pixels. */
export function areaPath({ upper, lower }: GainArea, scale: Scale): string {
  const ring = [...upper, ...[...lower].reverse()].map(scale);
  return `${ring.map(({ x, y }, place) => `${place === 0 ? "M" : "L"}${x.toFixed(2)} ${y.toFixed(2)}`).join("")}Z`;
}

export function areaFill(area: GainArea): string {
  return area.gain === "profit" ? PETROL_WASH : hatchFill("loss");
}

/** Loss hatched, profit plain, below the lines. */
export function EvenAreas({ points }: { points: readonly CostPoint[] }) {
  const scale = useChartScale();
  if (!scale) return null;
  return gainAreas(points).map((area) => (
    <path key={area.upper[0]?.kits} d={areaPath(area, scale)} fill={areaFill(area)} stroke="none" />
  ));
}

/** A crossing with its place in the chart. */
export interface PlacedCrossing {
  letter: string;
  kits: number;
  place: ChartPlace;
}

function placedCrossings({ points, crossings }: EvenChartProps): PlacedCrossing[] {
  return crossings.flatMap(({ letter, kits }) => {
    const after = points.findIndex((point) => point.kits === kits);
    const [before, at] = [points[after - 1], points[after]];
    const place = before && at ? meeting(before, at) : null;
    return place ? [{ letter, kits, place }] : [];
  });
}

/** Two rings nearer than this would touch. */
const APART = 30;

/** Rings, letters and names over the lines, and the enlarged window where crossings crowd. */
export function EvenMarks(props: EvenChartProps) {
  const scale = useChartScale();
  const plot = usePlotArea();
  if (!scale || !plot) return null;
  const { points, span, narrow } = props;
  const placed = placedCrossings(props);
  const perKit = plot.width / Math.max(1, span.to - span.from);
  const near = crowded(
    placed.map(({ kits }) => kits),
    perKit,
    APART,
  );
  return (
    <g>
      <AreaNames points={points} run={props.run} scale={scale} narrow={narrow} />
      <PaidBack {...props} scale={scale} foot={plot.y + plot.height} />
      {placed.map(({ letter, kits, place }) => (
        <Crossing
          key={letter}
          at={scale(place)}
          letter={near.includes(kits) ? null : letter}
          small={near.includes(kits)}
        />
      ))}
      {!narrow && near.length > 0 && (
        <EvenWindow
          points={points}
          crossings={placed.filter(({ kits }) => near.includes(kits))}
          scale={scale}
          plot={plot}
        />
      )}
    </g>
  );
}

function Crossing({
  at,
  letter,
  small,
}: {
  at: { x: number; y: number };
  letter: string | null;
  small: boolean;
}) {
  return (
    <g>
      <circle cx={at.x} cy={at.y} {...SPOT_RING} {...(small && { r: 4.5, strokeWidth: 3 })} />
      {letter && (
        <text x={at.x - 10} y={at.y - 12} {...LINE_NAME} textAnchor="end" fill={INK}>
          {letter}
        </text>
      )}
    </g>
  );
}

interface NamesProps {
  points: readonly CostPoint[];
  run: number;
  scale: Scale;
  narrow: boolean;
}

/** The area of a kind where it is tallest, with its middle and height in pixels. */
function tallest(points: readonly CostPoint[], gain: GainArea["gain"], scale: Scale) {
  let best = { x: 0, y: 0, height: 0 };
  for (const { kits, total, kept } of points) {
    if (total === null || kept === null || kept >= total !== (gain === "profit")) continue;
    const [upper, lower] = [scale({ kits, money: total }), scale({ kits, money: kept })];
    const height = Math.abs(upper.y - lower.y);
    if (height > best.height) best = { x: upper.x, y: (upper.y + lower.y) / 2, height };
  }
  return best;
}

/** Where along the span the cost line has room below it for its name: not under the name of the run. */
function costNameAt(points: readonly CostPoint[], run: number): CostPoint | undefined {
  const known = points.filter(({ total }) => total !== null);
  const at = (share: number) => known[Math.floor((known.length - 1) * share)];
  const wanted = at(0.62);
  const near = wanted && Math.abs(wanted.kits - run) < known.length * 0.2;
  return near ? at(0.36) : wanted;
}

/** Names stand in their areas and at their lines. */
function AreaNames({ points, run, scale, narrow }: NamesProps) {
  const [loss, profit] = [tallest(points, "loss", scale), tallest(points, "profit", scale)];
  const cost = costNameAt(points, run);
  const last = points.findLast(({ kept }) => kept !== null);
  const costAt = cost && scale({ kits: cost.kits, money: cost.total ?? 0 });
  const takingsAt = last && scale({ kits: last.kits, money: last.kept ?? 0 });
  const profitShift = narrow ? 44 : 110;
  return (
    <g>
      {loss.height > 30 && (
        <text x={loss.x + (narrow ? 22 : 40)} y={loss.y + 5} {...LINE_NAME} textAnchor="middle" fill={BAD}>
          Loss
        </text>
      )}
      {profit.height > 60 && (
        <text
          x={profit.x - profitShift}
          y={profit.y + 5}
          {...LINE_NAME}
          stroke={PETROL_WASH}
          textAnchor="middle"
          fill={PETROL}
        >
          Profit
        </text>
      )}
      {costAt && (
        <text x={costAt.x} y={costAt.y + 26} {...LINE_NAME} textAnchor="middle" fill={INK}>
          Total cost
        </text>
      )}
      {takingsAt && (
        <text
          x={takingsAt.x - (narrow ? 40 : 96)}
          y={takingsAt.y + 12}
          {...LINE_NAME}
          textAnchor="end"
          fill={PETROL}
        >
          Takings
        </text>
      )}
    </g>
  );
}

/** From the cost of the run back to the takings and down: how many sold pay for it. */
function PaidBack({
  points,
  run,
  soldToPay,
  currency,
  scale,
  foot,
  narrow,
}: EvenChartProps & { scale: Scale; foot: number }) {
  const made = points.find(({ kits }) => kits === run);
  if (!made || made.total === null) return null;
  const ring = scale({ kits: run, money: made.total });
  const sold = soldToPay === null ? undefined : points.find(({ kits }) => kits === soldToPay);
  const back = sold && sold.kept !== null ? scale({ kits: sold.kits, money: made.total }) : null;
  return (
    <g>
      {back && (
        <>
          <path d={`M${ring.x} ${ring.y}H${back.x}V${foot}`} fill="none" {...PAID_BACK_LINE} />
          <circle cx={back.x} cy={back.y} {...SPOT_RING} stroke={PETROL} strokeWidth={2.5} r={5} />
          <text y={foot - 36} {...LINE_NAME} fill={INK}>
            <tspan x={back.x + 8}>{soldToPay} sold pays for</tspan>
            <tspan x={back.x + 8} dy={19}>
              a run of {run}
            </tspan>
          </text>
        </>
      )}
      <circle cx={ring.x} cy={ring.y} {...RUN_RING} />
      <text
        x={ring.x + (narrow ? 0 : 12)}
        y={ring.y + 26}
        {...LINE_NAME}
        fill={INK}
        textAnchor={narrow ? "end" : "start"}
      >
        {run} cost {money(made.exact.total ?? "0", currency)}
      </text>
    </g>
  );
}
