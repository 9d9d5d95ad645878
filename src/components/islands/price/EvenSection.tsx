import { moneyText } from "#src/components/amount-text.ts";
import { kitPath } from "#src/components/islands/kit-address.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { Table } from "#src/components/islands/parts/Table.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import { evenColumns, MIX } from "./even-columns.tsx";
import { type EvenRow, evenRows } from "./even-rows.ts";
import type { PriceProps } from "./price-props.ts";
import { TargetProfit } from "./TargetProfit.tsx";

interface EvenSectionProps extends Pick<PriceProps, "address" | "context"> {
  run: RunResult;
  sweep: SweepResult;
  opens: ReturnType<typeof useOpens>;
}

/** From how many kits on the prices pay: by the mix, and each edition by itself. */
export function EvenSection({ address, context, run, sweep, opens }: EvenSectionProps) {
  const { plan } = context;
  const mix: EvenRow = {
    id: MIX,
    name: "The run, by its mix",
    kits: run.kits,
    ...sweep.breakEven,
    evenAfter: run.evenAfter,
  };
  const rows = plan.editions.length > 1 ? [mix, ...evenRows(context)] : [mix];
  return (
    <Section
      id="break-even"
      title="From how many on it pays"
      aside="every kit of the run sold, but for the last column"
    >
      <Table
        caption="Break-even at these prices"
        columns={evenColumns(opens)}
        rows={rows}
        keyOf={({ id }) => id}
        scrolls
      />
      <p className="type-note mt-3 text-ink-2">
        {rows.length > 1 && "An edition by itself bears the whole of what is paid once. "}
        <a href={kitPath(address, "/run")}>The chart of cost and takings</a>
        {run.profit.known &&
          ` is drawn for these prices; the run leaves ${moneyText(run.profit.value, plan.currency)}.`}
      </p>
      <TargetProfit sweep={sweep} currency={plan.currency} />
    </Section>
  );
}
