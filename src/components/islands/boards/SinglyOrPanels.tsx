import { useMemo } from "react";
import { moneyText } from "#src/components/amount-text.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { grains } from "#src/costing/grains.ts";
import type { QuoteResult, RunResult } from "#src/costing/run-result.ts";
import { singlyOrPanels } from "#src/costing/singly-or-panels.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { orderWords, quoteName } from "./board-words.ts";
import { paysSentence, runsWords } from "./pays-words.ts";

interface Way {
  name: string;
  quote: QuoteResult;
}

/** The cheapest of some quotes at this run; of those whose cost is known. */
function cheapest(quotes: readonly QuoteResult[]): QuoteResult | null {
  return quotes.reduce<QuoteResult | null>((best, one) => {
    if (!one.landed.known) return best;
    return best?.landed.known && grains(best.landed.value) <= grains(one.landed.value) ? best : one;
  }, null);
}

/** What a good board costs singly and in panels, and at which runs which of the two is cheaper. */
export function SinglyOrPanels({ plan, run }: { plan: Plan; run: RunResult }) {
  const to = Math.max(plan.run.sweepTo, plan.run.kits);
  const pays = useMemo(() => singlyOrPanels(plan, to), [plan, to]);
  const { quotes } = run.boards;
  const singly = cheapest(quotes.filter(({ boardsPerPiece }) => boardsPerPiece === 1));
  const panelled = cheapest(quotes.filter(({ boardsPerPiece }) => boardsPerPiece > 1));
  const ways = [
    ...(singly ? [{ name: "Singly", quote: singly }] : []),
    ...(panelled ? [{ name: "In panels", quote: panelled }] : []),
  ];
  return (
    <>
      {ways.length > 0 && <Ways {...{ ways, plan }} />}
      {pays === null ? (
        <p className="mt-3">{WITHOUT[singly ? "panels" : "singly"]}</p>
      ) : (
        <>
          <p className="mt-4 font-semibold">{paysSentence(pays, to)}</p>
          <Runs name="Panels cost less at runs of" runs={runsWords(pays, "panelled")} />
          <Runs name="Single boards cost less at runs of" runs={runsWords(pays, "singly")} />
          <Runs name="Both cost the same at runs of" runs={runsWords(pays, "same")} />
        </>
      )}
    </>
  );
}

const WITHOUT = {
  panels: "No quote for panels can be reckoned yet, so there is nothing to compare with.",
  singly: "No quote for single boards can be reckoned yet, so there is nothing to compare with.",
};

function Runs({ name, runs }: { name: string; runs: string | null }) {
  if (runs === null) return null;
  return (
    <p className="mt-1">
      <span className="text-ink-2">{name}</span> {runs}.
    </p>
  );
}

function Ways({ ways, plan }: { ways: readonly Way[]; plan: Plan }) {
  const opens = useOpens();
  const columns: Column<Way>[] = [
    { key: "way", head: "Boards", names: true, cell: ({ name }) => name },
    { key: "house", head: "Cheapest at", cell: ({ quote }) => quoteName(quote) },
    { key: "order", head: "You order", wide: true, cell: ({ quote }) => orderWords(quote) },
    {
      key: "landed",
      head: "Landed",
      number: true,
      cell: ({ quote }) => (quote.landed.known ? moneyText(quote.landed.value, plan.currency) : ""),
    },
    {
      key: "each",
      head: "A good board",
      number: true,
      cell: ({ name, quote }) =>
        quote.perBoard.known && (
          <Figure
            label={`A good board, ${name.toLowerCase()}`}
            value={moneyText(quote.perBoard.value, plan.currency)}
            {...opens(`quote:${quote.id}`)}
          />
        ),
    },
  ];
  return (
    <Table
      caption="Single boards and panels at this run"
      columns={columns}
      rows={ways}
      keyOf={({ name }) => name}
      chosen={({ quote }) => quote.chosen}
    />
  );
}
