import { useMemo } from "react";
import { countText, moneyText } from "#src/components/amount-text.ts";
import { ChartFrame, type ChartTable } from "#src/components/islands/charts/ChartFrame.tsx";
import { fileName } from "#src/components/islands/charts/file-name.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import type { SweepColumns } from "#src/costing/sweep-result.ts";
import type { SectionProps } from "./CostSection.tsx";
import { costPoints, type Span, spanOfCrossings } from "./cost-points.ts";
import { crossingWords } from "./crossing-words.ts";
import { EvenChart } from "./EvenChart.tsx";

function evenTable(columns: SweepColumns, span: Span, currency: string): ChartTable {
  const sizes = Array.from({ length: span.to - span.from + 1 }, (_, place) => span.from + place);
  const written = (value: string | null | undefined) =>
    value === null || value === undefined ? "not known" : moneyText(value, currency);
  return {
    head: ["Run", "Takings", "Total cost, used", "Left", "Sold to pay for it"],
    rows: sizes.map((kits) => [
      String(kits),
      written(columns.brings[kits - 1]),
      written(columns.used[kits - 1]),
      written(columns.profit[kits - 1]),
      columns.soldToPay[kits - 1] == null ? "–" : countText(columns.soldToPay[kits - 1] ?? 0),
    ]),
    fileRows: columns.used.map((used, place) => [
      String(place + 1),
      columns.brings[place] ?? "",
      used ?? "",
      columns.profit[place] ?? "",
      columns.soldToPay[place]?.toString() ?? "",
    ]),
  };
}

/** Takings against cost at every run size, with every crossing. */
export function EvenSection({ plan, run, sweep, columns, narrow, opens, partial }: SectionProps) {
  const { breakEven } = sweep;
  const crossings = crossingWords(plan, breakEven);
  const span = spanOfCrossings(
    run.kits,
    crossings.map(({ kits }) => kits),
    sweep.to,
  );
  const { from, to } = span;
  const points = useMemo(() => costPoints(columns, "used", { from, to }), [columns, from, to]);
  const name = "Takings against total cost, if every kit sells";
  const figure = breakEven.safe === null ? "even-after" : "safe-even";
  return (
    <Section
      title={name}
      aside={partial ?? "cost as used"}
      actions={<ShowWorking of="the break-even" onClick={opens(figure).onOpen} />}
    >
      <ChartFrame
        name={name}
        file={fileName(plan.kit, "break-even")}
        height={narrow ? 360 : 500}
        table={() => evenTable(columns, span, run.currency)}
        chosen={String(run.kits)}
      >
        {(width) => (
          <EvenChart
            points={points}
            span={span}
            run={run.kits}
            width={width}
            narrow={narrow}
            currency={run.currency}
            crossings={crossings}
            soldToPay={columns.soldToPay[run.kits - 1] ?? null}
            label={`${name}: from ${span.from} to ${span.to} kits. Arrow keys go from run size to run size.`}
          />
        )}
      </ChartFrame>
    </Section>
  );
}
