import { usePlotArea } from "recharts";
import { moneyText } from "#src/components/amount-text.ts";
import {
  INK,
  INK_2,
  LINE_NAME,
  PETROL,
  RULE_2,
  RUN_RING,
  SPOT_RING,
} from "#src/components/islands/chart-theme.ts";
import { type NameBox, nameWidth } from "#src/components/islands/charts/label-room.ts";
import type { Pixels } from "#src/components/islands/charts/pixels.ts";
import type { CostChartProps } from "./CostChart.tsx";
import { useChartScale } from "./chart-scale.ts";
import { type PlacedName, ringNames } from "./cost-names.ts";
import type { UnitCostRange } from "./cost-points.ts";
import type { StepNote } from "./step-note.ts";

export interface CostMarksProps extends CostChartProps {
  range: UnitCostRange;
}

/** Rings and names over the line of unit costs. */
export function CostMarks(props: CostMarksProps) {
  const scale = useChartScale();
  const area = usePlotArea();
  if (!scale || !area) return null;
  const { points, span, run, brings, currency, spots, narrow, range, note } = props;
  const plot = {
    left: area.x - 2,
    right: area.x + area.width,
    top: area.y - 12,
    bottom: area.y + area.height,
  };
  const at = (kits: number) => {
    const exact = points.find((point) => point.kits === kits)?.exact.perKit ?? null;
    return exact === null ? null : { kits, exact, ...scale({ kits, money: Number(exact) }) };
  };
  const chosen = at(run);
  const rings = spots.flatMap((kits) => {
    const ring = kits === run || kits < span.from || kits > span.to ? null : at(kits);
    return ring && ring.y >= area.y ? [ring] : [];
  });
  const net = brings === null ? null : netLine(range, scale({ kits: run, money: Number(brings) }).y, plot);
  const start = !narrow && note ? at(note.kits) : null;
  const placed = start && note ? placedNote(note, start, plot) : null;
  const taken = placed ? [placed.box] : [];
  const names = ringNames(
    [...(chosen ? [{ ...chosen, rank: 0 }] : []), ...rings.map((ring) => ({ ...ring, rank: 1 }))].map(
      (ring) => ({ ...ring, figure: moneyText(ring.exact, currency) }),
    ),
    plot,
    chosen
      ? [...taken, { left: chosen.x - 3, right: chosen.x + 3, top: plot.top, bottom: plot.bottom }]
      : taken,
  );
  return (
    <g>
      {net && <NetName {...props} {...net} end={plot.right} />}
      {net && chosen && <EarnsName {...props} ring={chosen} net={net.y} taken={taken} />}
      {rings.map(({ kits, x, y }) => (
        <circle key={kits} cx={x} cy={y} {...SPOT_RING} />
      ))}
      {chosen && <circle cx={chosen.x} cy={chosen.y} {...RUN_RING} />}
      {names.map((name) => (
        <RingName key={name.kits} name={name} />
      ))}
      {placed && <StepWords {...placed} />}
    </g>
  );
}

function RingName({ name: { kits, figure, rank, box, anchor } }: { name: PlacedName }) {
  const x = anchor === "end" ? box.right : box.left;
  const first = rank === 0;
  return (
    <text y={box.top + 14} {...LINE_NAME} textAnchor={anchor}>
      <tspan x={x} fill={INK} fontWeight={first ? 700 : 600}>
        {first ? `${kits} kits` : kits}
      </tspan>
      <tspan x={x} dy={19} fill={first ? INK : INK_2} fontWeight={first ? 700 : 400}>
        {figure}
      </tspan>
    </text>
  );
}

/** Where the name of what a kit brings in stands: at its line, or at the edge behind which the line lies. */
function netLine({ brings }: UnitCostRange, y: number, plot: NameBox) {
  if (brings === "above") return { y: plot.top, name: plot.top + 28 };
  if (brings === "below") return { y: plot.bottom, name: plot.bottom - 9 };
  return { y, name: y - 9 };
}

function NetName({
  brings,
  currency,
  narrow,
  range,
  name,
  end,
}: CostMarksProps & { name: number; end: number }) {
  if (brings === null) return null;
  const where = range.brings === "drawn" ? "" : `, ${range.brings} this`;
  const when = narrow || where !== "" ? "" : " after tax, fees and postage";
  return (
    <text x={end} y={name} {...LINE_NAME} textAnchor="end" fill={PETROL}>
      One kit brings in {moneyText(brings, currency)}
      {when}
      {where}
    </text>
  );
}

interface EarnsProps extends CostMarksProps {
  ring: Pixels;
  net: number;
  taken: readonly NameBox[];
}

/** Between the ring of the run and what a kit brings. */
function EarnsName({ earns, currency, ring, net, taken }: EarnsProps) {
  if (earns === null) return null;
  const room = Math.abs(ring.y - net);
  const y = Math.min(ring.y, net) + Math.min(room / 2 + 5, 44);
  const x = ring.x + 10;
  const covered = taken.some(({ left, top, bottom }) => left < x + 110 && top < y + 6 && bottom > y - 16);
  if (room < 44 || covered) return null;
  const lost = earns.startsWith("-");
  return (
    <text {...{ x, y }} {...LINE_NAME} fill={PETROL}>
      {lost ? "loses" : "earns"} {moneyText(lost ? earns.slice(1) : earns, currency)}
    </text>
  );
}

interface PlacedNote {
  note: StepNote;
  from: Pixels;
  box: NameBox;
}

/** Above right of the step where there is room, else ending at the edge above it; below it where it stands too high. */
function placedNote(note: StepNote, from: Pixels, plot: NameBox): PlacedNote | null {
  const width = nameWidth(note.title, note.reason) * 0.92;
  const left = Math.min(from.x + 44, plot.right - width);
  if (left < plot.left) return null;
  const top = from.y - 74 > plot.top + 20 ? from.y - 74 : from.y + 44;
  return { note, from, box: { left, right: left + width, top, bottom: top + 42 } };
}

/** What one kit more sets off, with a leader to the place where the line goes on. */
function StepWords({ note, from, box }: PlacedNote) {
  const above = box.bottom < from.y;
  const foot = Math.min(Math.max(from.x + 20, box.left - 4), box.left + 30);
  return (
    <g>
      <path
        d={`M${from.x + 4} ${from.y + (above ? -5 : 5)}L${foot} ${above ? box.bottom + 2 : box.top - 2}`}
        stroke={RULE_2}
        strokeWidth={1.25}
        fill="none"
      />
      <text y={box.top + 15} {...LINE_NAME} fill={INK}>
        <tspan x={box.left}>{note.title}</tspan>
        <tspan x={box.left} dy={20} fontWeight={400} fill={INK_2}>
          {note.reason}
        </tspan>
      </text>
    </g>
  );
}
