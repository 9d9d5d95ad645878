import { BAD, INK, LINE_NAME, PETROL, PETROL_WASH } from "#src/components/islands/chart-theme.ts";
import type { NameBox } from "#src/components/islands/charts/label-room.ts";
import type { ChartScale } from "./chart-scale.ts";
import type { CostPoint } from "./cost-points.ts";
import { costNamePlace, middleOf } from "./even-places.ts";

interface EvenNamesProps {
  points: readonly CostPoint[];
  scale: ChartScale;
  narrow: boolean;
  /** Room that rings and other names take. */
  taken: readonly NameBox[];
}

/** Names stand in their areas and at their lines. */
export function EvenNames({ points, scale, narrow, taken }: EvenNamesProps) {
  const loss = middleOf(points, "loss", scale, narrow ? 22 : 40);
  const profit = middleOf(points, "profit", scale, narrow ? -44 : -110);
  const cost = costNamePlace(points, scale, taken);
  const last = points.findLast(({ brings }) => brings !== null);
  const takings = last && scale({ kits: last.kits, money: last.brings ?? 0 });
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
      {cost && (
        <text x={cost.x} y={cost.y} {...LINE_NAME} textAnchor="middle" fill={INK}>
          Total cost
        </text>
      )}
      {takings && (
        <text
          x={takings.x - (narrow ? 40 : 96)}
          y={takings.y + 12}
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
