import { countText, moneyText, shareText } from "#src/components/amount-text.ts";
import { kitPath } from "#src/components/islands/kit-address.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import { type EvenRow, evenRows } from "./even-rows.ts";
import type { PriceProps } from "./price-props.ts";
import { countOf } from "./price-words.ts";
import { TargetProfit } from "./TargetProfit.tsx";

interface EvenSectionProps extends Pick<PriceProps, "address" | "context"> {
  run: RunResult;
  sweep: SweepResult;
  opens: ReturnType<typeof useOpens>;
}

const MIX = "by the mix";

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
  const kits = ({ known, upTo }: EvenRow, value: number | null) =>
    !known ? "not known" : value === null ? `none up to ${countText(upTo)}` : countText(value);
  const opened = (row: EvenRow, value: number | null, figure: "first-even" | "safe-even") =>
    row.id === MIX && value !== null ? opens(figure) : undefined;
  const columns: Column<EvenRow>[] = [
    { key: "name", head: "Sold", names: true, cell: ({ name }) => name },
    { key: "kits", head: "Made", number: true, wide: true, cell: (row) => countText(row.kits) },
    {
      key: "first",
      head: "Pays first at",
      number: true,
      cell: (row) => (
        <Figure
          label="Pays first at a run of"
          value={kits(row, row.first)}
          {...opened(row, row.first, "first-even")}
        />
      ),
    },
    {
      key: "safe",
      head: "Safe from",
      number: true,
      cell: (row) => (
        <Figure label="Safe from" value={kits(row, row.safe)} {...opened(row, row.safe, "safe-even")} />
      ),
    },
    {
      key: "margin",
      head: "Margin of safety",
      number: true,
      wide: true,
      cell: ({ marginOfSafety }) => (marginOfSafety === null ? "–" : shareText(marginOfSafety)),
    },
    {
      key: "sold",
      head: "Even after",
      number: true,
      cell: (row) =>
        row.evenAfter.known ? (
          <Figure
            label="Even after"
            value={`${countOf(row.evenAfter)} sold`}
            {...(row.id === MIX ? opens("even-after") : undefined)}
          />
        ) : (
          countOf(row.evenAfter)
        ),
    },
  ];
  return (
    <Section
      id="break-even"
      title="From how many on it pays"
      aside="every kit of the run sold, but for the last column"
    >
      <Table
        caption="Break-even at these prices"
        columns={columns}
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
