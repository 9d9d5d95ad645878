import { type PlotArea, usePlotArea } from "recharts";
import { moneyText } from "#src/components/amount-text.ts";
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
import { useChartScale } from "./chart-scale.ts";
import type { CostPoint } from "./cost-points.ts";
import type { EvenChartProps } from "./EvenChart.tsx";
import { EvenWindow } from "./EvenWindow.tsx";
import { type ChartPlace, crowded, type GainArea, gainAreas, meeting } from "./even-shapes.ts";
import { freePlace, labelsWithRoom, type NameBox } from "./label-room.ts";

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
  const paid = paidBack(props, scale, plot);
  const placed = placedCrossings(props);
  const perKit = plot.width / Math.max(1, span.to - span.from);
  const near = crowded(
    placed.map(({ kits }) => kits),
    perKit,
    APART,
  );
  const alone = placed
    .filter(({ kits }) => narrow || !near.includes(kits))
    .map(({ letter, place }) => ({ letter, at: scale(place).x, half: 8, rank: 0 }));
  const lettered = new Set(labelsWithRoom(alone).map(({ letter }) => letter));
  return (
    <g>
      <AreaNames
        points={points}
        scale={scale}
        narrow={narrow}
        taken={paid ? [paid.soldBox, paid.runBox] : []}
      />
      {paid && <PaidBack paid={paid} run={props.run} soldToPay={props.soldToPay} currency={props.currency} />}
      {placed.map(({ letter, kits, place }) => (
        <Crossing
          key={letter}
          at={scale(place)}
          letter={lettered.has(letter) ? letter : null}
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
  scale: Scale;
  narrow: boolean;
  /** Room that other names take. */
  taken: readonly NameBox[];
}

/** The middle of an area where it is tallest, or so far to the side of that as it stays tall enough for a name. */
function middleOf(points: readonly CostPoint[], gain: GainArea["gain"], scale: Scale, aside: number) {
  const tall = points.flatMap(({ kits, total, kept }) => {
    if (total === null || kept === null || kept >= total !== (gain === "profit")) return [];
    const [one, other] = [scale({ kits, money: total }), scale({ kits, money: kept })];
    return [{ x: one.x, y: (one.y + other.y) / 2, height: Math.abs(one.y - other.y) }];
  });
  const tallest = tall.reduce((best, place) => (place.height > best.height ? place : best), {
    x: 0,
    y: 0,
    height: 0,
  });
  const wanted = tallest.x + aside;
  const near = tall
    .filter(({ height }) => height > NAME_HEIGHT)
    .reduce(
      (best, place) => (Math.abs(place.x - wanted) < Math.abs(best.x - wanted) ? place : best),
      tallest,
    );
  return near.height > NAME_HEIGHT ? near : null;
}

/** An area lower than this has no room for its name. */
const NAME_HEIGHT = 30;

/** Where along the span the cost line has room beside it for its name. */
function costNameAt({ points, scale }: NamesProps, taken: readonly NameBox[]) {
  const known = points.filter(({ total }) => total !== null);
  const at = [0.62, 0.8, 0.48, 0.34, 0.2].flatMap((share) => {
    const point = known[Math.floor((known.length - 1) * share)];
    return point ? [scale({ kits: point.kits, money: point.total ?? 0 })] : [];
  });
  const named = (dy: number) =>
    at.map(({ x, y }) => ({
      x,
      y: y + dy,
      left: x - 40,
      right: x + 40,
      top: y + dy - 16,
      bottom: y + dy + 6,
    }));
  const places = [...named(26), ...named(-12)];
  return freePlace(places, taken);
}

/** Names stand in their areas and at their lines. */
function AreaNames(props: NamesProps) {
  const { points, scale, narrow, taken } = props;
  const loss = middleOf(points, "loss", scale, narrow ? 22 : 40);
  const profit = middleOf(points, "profit", scale, narrow ? -44 : -110);
  const costAt = costNameAt(props, taken);
  const last = points.findLast(({ kept }) => kept !== null);
  const takingsAt = last && scale({ kits: last.kits, money: last.kept ?? 0 });
  return (
    <g>
      {loss && (
        <text x={loss.x} y={loss.y + 5} {...LINE_NAME} textAnchor="middle" fill={BAD}>
          Loss
        </text>
      )}
      {profit && (
        <text
          x={profit.x}
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
        <text x={costAt.x} y={costAt.y} {...LINE_NAME} textAnchor="middle" fill={INK}>
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

/** Places of the run's ring, of the takings that pay for it, and of both names. */
interface PaidPlaces {
  ring: { x: number; y: number };
  cost: string;
  back: { x: number; y: number } | null;
  foot: number;
  runName: { x: number; y: number; anchor: "start" | "end" };
  soldBox: NameBox;
  runBox: NameBox;
}

const NAME_WIDTH = 150;

function paidBack(
  { points, run, soldToPay, narrow }: EvenChartProps,
  scale: Scale,
  plot: PlotArea,
): PaidPlaces | null {
  const made = points.find(({ kits }) => kits === run);
  if (!made || made.total === null || made.exact.total === null) return null;
  const ring = scale({ kits: run, money: made.total });
  const sold = soldToPay === null ? undefined : points.find(({ kits }) => kits === soldToPay);
  const back = sold ? scale({ kits: sold.kits, money: made.total }) : null;
  const foot = plot.y + plot.height;
  // Below the ring where there is room above the names at the foot; else above it.
  const y = foot - ring.y > 100 ? ring.y + 26 : ring.y - 16;
  const anchor = narrow || ring.x + NAME_WIDTH + 12 > plot.x + plot.width ? "end" : "start";
  const x = anchor === "end" ? ring.x + 8 : ring.x + 12;
  const left = anchor === "end" ? x - NAME_WIDTH : x;
  const soldLeft = (back?.x ?? plot.x) + 8;
  return {
    ring,
    cost: made.exact.total,
    back,
    foot,
    runName: { x, y, anchor },
    runBox: { left, right: left + NAME_WIDTH, top: y - 16, bottom: y + 6 },
    soldBox: { left: soldLeft - 12, right: soldLeft + 130, top: foot - 54, bottom: foot },
  };
}

type PaidBackProps = Pick<EvenChartProps, "run" | "soldToPay" | "currency"> & { paid: PaidPlaces };

/** From the cost of the run back to the takings and down: how many sold pay for it. */
function PaidBack({ paid, run, soldToPay, currency }: PaidBackProps) {
  const { ring, back, foot, runName, cost } = paid;
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
      <text x={runName.x} y={runName.y} {...LINE_NAME} fill={INK} textAnchor={runName.anchor}>
        {run} cost {moneyText(cost, currency)}
      </text>
    </g>
  );
}
