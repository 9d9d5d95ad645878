import { countText, moneyText, shareText } from "#src/components/amount-text.ts";
import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { Figure as CostFigure } from "#src/costing/figure.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { PartLine, RunResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

interface LeftOverProps {
  address: KitAddress;
  plan: Plan;
  run: RunResult;
  opens: ReturnType<typeof useOpens>;
}

/** The most valuable first; what is not known comes first of all. */
function byValue(one: PartLine, other: PartLine): number {
  const value = ({ leftOverValue }: PartLine) =>
    leftOverValue.known ? Number(leftOverValue.value) : Number.POSITIVE_INFINITY;
  return value(other) - value(one);
}

/** What lies on the shelf after the run: pieces, value, and the share of it that keeps. */
export function LeftOverSection({ address, plan, run, opens }: LeftOverProps) {
  const { currency } = run;
  const left = run.parts.filter(({ leftOver }) => leftOver > 0).sort(byValue);
  const written = (figure: CostFigure) =>
    figure.known ? moneyText(figure.value, currency) : needWords(figure.needs);
  const keep = (id: string) => plan.parts.find((part) => part.id === id)?.keepShare ?? "0";
  const columns: Column<PartLine>[] = [
    {
      key: "part",
      head: "Part",
      names: true,
      total: "Together",
      cell: ({ id, name, designators }) => (
        <>
          <a href={kitPath(address, `/offers/${id}`)}>{name}</a>
          <span className="ml-2 font-normal text-ink-2 max-tablet:block max-tablet:ml-0">
            {designators.length > 28 ? `${designators.slice(0, 26)} …` : designators}
          </span>
        </>
      ),
    },
    {
      key: "ordered",
      head: "Ordered",
      number: true,
      wide: true,
      cell: ({ ordered }) => countText(ordered),
      total: "",
    },
    { key: "left", head: "Left", number: true, cell: ({ leftOver }) => countText(leftOver), total: "" },
    {
      key: "value",
      head: "Value",
      number: true,
      total: <Figure label="Left over" value={written(run.leftOver)} {...opens("left-over")} />,
      cell: ({ id, name, leftOverValue }) => (
        <Figure label={`${name} left over`} value={written(leftOverValue)} {...opens(`part:${id}`)} />
      ),
    },
    {
      key: "share",
      head: "Keeps",
      number: true,
      wide: true,
      cell: ({ id }) => shareText(keep(id)),
      total: "",
    },
    {
      key: "kept",
      head: "Kept value",
      number: true,
      cell: ({ keptOnShelf }) => written(keptOnShelf),
      total: written(run.keptOnShelf),
      result: true,
    },
  ];
  return (
    <Section
      title="What is left over"
      aside={`after a run of ${run.kits}`}
      actions={<ShowWorking of="what is left over" onClick={opens("left-over").onOpen} />}
    >
      {left.length === 0 ? (
        <p className="type-note">Nothing. Every piece ordered goes into a kit.</p>
      ) : (
        <Table caption="What is left over" columns={columns} rows={left} keyOf={({ id }) => id} />
      )}
    </Section>
  );
}
