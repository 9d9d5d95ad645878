import { useMemo, useState } from "react";
import { moneyText } from "#src/components/amount-text.ts";
import { ChartFrame, type ChartTable } from "#src/components/islands/charts/ChartFrame.tsx";
import { fileName } from "#src/components/islands/charts/file-name.ts";
import { FilterGroup } from "#src/components/islands/parts/FilterGroup.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { SweepColumns, SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { CostChart } from "./CostChart.tsx";
import { type CostView, costPoints, type Span, spanAround } from "./cost-points.ts";
import { stepNote } from "./step-note.ts";

export interface SectionProps {
  plan: Plan;
  run: RunResult;
  sweep: SweepResult;
  columns: SweepColumns;
  narrow: boolean;
  opens: ReturnType<typeof useOpens>;
  /** Said of figures that leave something out: "without 3 unpriced lines". */
  partial: string | null;
}

/** Whether the two views differ at any run size. */
function viewsDiffer({ used, spent }: SweepColumns): boolean {
  return used.some((value, place) => value !== spent[place]);
}

/** Every run size of the columns, for a table or a file. */
function costTable(columns: SweepColumns, span: Span, currency: string): ChartTable {
  const head = ["Run", "Used per kit", "Spent per kit", "Used", "Spent", "Next kit, used"];
  const of = (place: number) => [
    columns.perKitUsed[place],
    columns.perKitSpent[place],
    columns.used[place],
    columns.spent[place],
    columns.nextKitUsed[place],
  ];
  const sizes = Array.from({ length: span.to - span.from + 1 }, (_, place) => span.from + place);
  return {
    head,
    rows: sizes.map((kits) => [
      String(kits),
      ...of(kits - 1).map((value) =>
        value === null || value === undefined ? "not known" : moneyText(value, currency),
      ),
    ]),
    fileRows: columns.used.map((_, place) => [String(place + 1), ...of(place).map((value) => value ?? "")]),
  };
}

/** What one kit costs at every run size. */
export function CostSection({ plan, run, sweep, columns, narrow, opens, partial }: SectionProps) {
  const [whole, setWhole] = useState(false);
  const [view, setView] = useState<CostView>("used");
  const differ = viewsDiffer(columns);
  const shown = differ ? view : "used";
  const span = whole ? { from: 1, to: sweep.to } : spanAround(run.kits, sweep.to);
  const { from, to } = span;
  const points = useMemo(() => costPoints(columns, shown, { from, to }), [columns, shown, from, to]);
  const name = "What one kit costs, by run size";
  return (
    <Section
      title={name}
      aside={partial ?? (differ ? `as ${shown}` : "used and spent are the same here")}
      actions={<ShowWorking of="the cost per kit" onClick={opens("per-kit-used").onOpen} />}
    >
      <div className="mb-3 flex flex-wrap gap-3">
        <FilterGroup
          label="Run sizes shown"
          value={whole ? "whole" : "around"}
          onChoose={(value) => setWhole(value === "whole")}
          choices={[
            { value: "around", label: `Around ${run.kits}` },
            { value: "whole", label: `1 to ${sweep.to}` },
          ]}
        />
        {differ && (
          <FilterGroup
            label="View of cost"
            value={view}
            onChoose={(value) => setView(value as CostView)}
            choices={[
              { value: "used", label: "Used" },
              { value: "spent", label: "Spent" },
            ]}
          />
        )}
      </div>
      <ChartFrame
        name={name}
        file={fileName(plan.kit, "cost-per-kit")}
        height={narrow ? 330 : 430}
        table={() => costTable(columns, span, run.currency)}
        chosen={String(run.kits)}
      >
        {(width) => (
          <CostChart
            points={points}
            span={span}
            run={run.kits}
            width={width}
            narrow={narrow}
            currency={run.currency}
            brings={run.bringsPerKit.known ? run.bringsPerKit.value : null}
            earns={shown === "used" && run.earnsPerKit.known ? run.earnsPerKit.value : null}
            spots={sweep.sweetSpots.map(({ kits }) => kits)}
            note={shown === "used" && partial === null ? stepNote(plan, sweep, run.kits, to) : null}
            view={shown}
            label={`${name}: from ${span.from} to ${span.to} kits. Arrow keys go from run size to run size.`}
          />
        )}
      </ChartFrame>
    </Section>
  );
}
