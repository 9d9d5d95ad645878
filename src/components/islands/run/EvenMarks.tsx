import { usePlotArea } from "recharts";
import { INK, LINE_NAME, SPOT_RING } from "#src/components/islands/chart-theme.ts";
import { labelsWithRoom } from "#src/components/islands/charts/label-room.ts";
import type { Pixels } from "#src/components/islands/charts/pixels.ts";
import { useChartScale } from "./chart-scale.ts";
import type { EvenChartProps } from "./EvenChart.tsx";
import { EvenNames } from "./EvenNames.tsx";
import { EvenWindow } from "./EvenWindow.tsx";
import { paidBack, placedCrossings } from "./even-places.ts";
import { crowded } from "./even-shapes.ts";
import { PaidBack } from "./PaidBack.tsx";

/** Two rings nearer than this would touch. */
const APART = 30;

/** Rings, letters and names over the lines, and the enlarged window where crossings crowd. */
export function EvenMarks(props: EvenChartProps) {
  const scale = useChartScale();
  const plot = usePlotArea();
  if (!scale || !plot) return null;
  const { points, span, narrow, run, soldToPay } = props;
  const paid = paidBack(props, scale, plot);
  const placed = placedCrossings(props).map((crossing) => ({ ...crossing, at: scale(crossing.place) }));
  const perKit = plot.width / Math.max(1, span.to - span.from);
  const near = crowded(
    placed.map(({ kits }) => kits),
    perKit,
    APART,
  );
  const isNear = ({ kits }: { kits: number }) => near.includes(kits);
  const alone = placed
    .filter((crossing) => narrow || !isNear(crossing))
    .map(({ letter, at }) => ({ letter, at: at.x, half: 8, rank: 0 }));
  const lettered = new Set(labelsWithRoom(alone).map(({ letter }) => letter));
  const rings = placed.map(({ at }) => ({
    left: at.x - 22,
    right: at.x + 8,
    top: at.y - 26,
    bottom: at.y + 8,
  }));
  return (
    <g>
      <EvenNames {...{ points, scale, narrow }} taken={[...(paid?.taken ?? []), ...rings]} />
      {paid && <PaidBack {...{ paid, run, soldToPay }} />}
      {placed.map((crossing) => (
        <Crossing
          key={crossing.letter}
          at={crossing.at}
          letter={lettered.has(crossing.letter) ? crossing.letter : null}
          small={isNear(crossing)}
        />
      ))}
      {!narrow && near.length > 0 && (
        <EvenWindow {...{ points, scale, plot }} crossings={placed.filter(isNear)} />
      )}
    </g>
  );
}

interface CrossingProps {
  at: Pixels;
  letter: string | null;
  small: boolean;
}

function Crossing({ at, letter, small }: CrossingProps) {
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
