import { countText, moneyText } from "#src/components/amount-text.ts";
import { listed } from "#src/components/count-words.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { Figure as CostFigure } from "#src/costing/figure.ts";
import { figureLess } from "#src/costing/figure-less.ts";
import type { Need } from "#src/costing/problem.ts";
import { needWords } from "#src/costing/problem-words.ts";
import { joinNeeds } from "#src/costing/run-needs.ts";
import type { EditionResult, RunResult } from "#src/costing/run-result.ts";
import type { FigureId } from "#src/costing/working-tree.ts";

/** What each edition costs, brings in and earns, in both views. */
export function EditionsSection({ run, opens }: { run: RunResult; opens: ReturnType<typeof useOpens> }) {
  const { currency } = run;
  const written = (label: string, figure: CostFigure, figureId?: FigureId) =>
    figure.known ? (
      <Figure label={label} value={moneyText(figure.value, currency)} {...(figureId && opens(figureId))} />
    ) : (
      <span className="whitespace-normal text-ink-2">{unknownWord(figure.needs)}</span>
    );
  const columns: Column<EditionResult>[] = [
    { key: "name", head: "Edition", names: true, cell: ({ name }) => name },
    { key: "kits", head: "Kits", number: true, cell: ({ kits }) => countText(kits) },
    {
      key: "price",
      head: "Price",
      number: true,
      wide: true,
      cell: ({ price }) => (price === null ? "not set" : moneyText(price, currency)),
    },
    {
      key: "brings",
      head: "Brings in",
      number: true,
      cell: ({ id, name, brings }) => written(`${name} brings in`, brings, `kit-brings:${id}`),
    },
    {
      key: "used",
      head: "Costs, used",
      number: true,
      cell: ({ id, name, perKit }) => written(`${name} costs, used`, perKit.used, `edition:${id}`),
    },
    {
      key: "spent",
      head: "Costs, spent",
      number: true,
      wide: true,
      cell: ({ name, perKit }) => written(`${name} costs, spent`, perKit.spent),
    },
    {
      key: "earns",
      head: "Earns",
      number: true,
      cell: ({ id, name, brings, perKit }) =>
        written(`${name} earns`, figureLess(brings, perKit.used), `kit-left:${id}`),
    },
  ];
  const needs = joinNeeds(
    ...run.editions
      .filter(({ kits }) => kits > 0)
      .flatMap(({ brings, perKit }) => [brings, perKit.used, perKit.spent])
      .map((figure) => (figure.known ? [] : figure.needs)),
  );
  return (
    <Section title="Edition by edition" aside={`one kit of each, in a run of ${run.kits}`}>
      <Table
        caption="Edition by edition"
        columns={columns}
        rows={run.editions}
        keyOf={({ id }) => id}
        scrolls
      />
      {needs.length > 0 && <p className="type-note pt-3 text-ink-2">{notKnownWords(needs)}</p>}
    </Section>
  );
}

/** Instead of a figure; the cost of an edition of which none is made does not apply. */
function unknownWord(needs: readonly Need[]): string {
  return needs.every(({ code }) => code === "not-in-run") ? "–" : "not known";
}

/** What the figures that are not known wait for, once for all of them: "Not known yet: needs 2 prices and the tax rate." */
function notKnownWords(needs: readonly Need[]): string {
  const words = needs.map((one) => needWords([one]));
  const wanted = words.filter((word) => word.startsWith("needs ")).map((word) => word.slice(6));
  const others = words.filter((word) => !word.startsWith("needs "));
  const all = [...(wanted.length > 0 ? [`needs ${listed(wanted)}`] : []), ...others];
  return `Not known yet: ${all.join("; ")}.`;
}
