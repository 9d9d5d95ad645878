import {
  INK,
  LINE_NAME,
  PAID_BACK_LINE,
  PETROL,
  RUN_RING,
  SPOT_RING,
} from "#src/components/islands/chart-theme.ts";
import type { PaidPlaces } from "./even-places.ts";

interface PaidBackProps {
  paid: PaidPlaces;
  run: number;
  soldToPay: number | null;
}

/** From the cost of the run back to the takings and down: how many sold pay for it. */
export function PaidBack({ paid: { ring, back, foot, runName }, run, soldToPay }: PaidBackProps) {
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
        {runName.words}
      </text>
    </g>
  );
}
