import { type ComponentType, useEffect, useMemo, useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import { ChartFrame } from "#src/components/islands/charts/ChartFrame.tsx";
import { fileName } from "#src/components/islands/charts/file-name.ts";
import { usePhone } from "#src/components/islands/parts/phone.ts";
import { spanAround } from "#src/components/islands/run/cost-points.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { BoardsChartProps } from "./BoardsChart.tsx";
import { boardsPoints, boardsTable } from "./boards-points.ts";

/** The chart and its library are fetched when they are needed. */
function useChart() {
  const [Chart, setChart] = useState<ComponentType<BoardsChartProps>>();
  useEffect(() => {
    void import("./BoardsChart.tsx").then((loaded) => setChart(() => loaded.default));
  }, []);
  return Chart;
}

/** Landed cost of one board in a kit, at every board house and every run size round the chosen one. */
export function BoardsByRun({ plan, name }: { plan: Plan; name: string }) {
  const Chart = useChart();
  const narrow = usePhone();
  const run = plan.run.kits;
  const { from, to } = spanAround(run, Math.max(plan.run.sweepTo, run));
  const drawn = useMemo(() => boardsPoints(plan, { from, to }), [plan, from, to]);
  const height = narrow ? 300 : 360;
  return (
    <ChartFrame
      name={name}
      file={fileName(plan.kit, "board-by-run")}
      height={height}
      table={() => boardsTable(plan, drawn)}
      chosen={countText(run)}
    >
      {(width) =>
        Chart && (
          <Chart
            {...drawn}
            {...{ run, width, height, narrow }}
            span={{ from, to }}
            currency={plan.currency}
          />
        )
      }
    </ChartFrame>
  );
}
