import { countText, moneyText } from "#src/components/amount-text.ts";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import { exact } from "#src/costing/decimal.ts";
import type { QuoteResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** Runs worth comparing, and the chosen one among them. */
const RUNS = [10, 20, 30, 50, 75, 100, 150, 200, 300, 500];

interface Row {
  kits: number;
  quotes: readonly QuoteResult[];
  /** Id of the cheapest quote at this run. */
  least: string | null;
}

function leastOf(quotes: readonly QuoteResult[]): string | null {
  let least: { id: string; value: string } | null = null;
  for (const { id, perBoard } of quotes)
    if (perBoard.known && (least === null || exact(perBoard.value).lt(least.value)))
      least = { id, value: perBoard.value };
  return least?.id ?? null;
}

/** Landed cost of one board in a kit, at every board house and a spread of run sizes; the least stands out. */
export function BoardsByRun({ plan }: { plan: Plan }) {
  const runs = [...new Set([...RUNS, plan.run.kits])].sort((a, b) => a - b);
  const rows = runs.map((kits): Row => {
    const { quotes } = runOf(plan, kits).boards;
    return { kits, quotes, least: leastOf(quotes) };
  });
  const quotes = rows[0]?.quotes ?? [];
  const columns: Column<Row>[] = [
    { key: "kits", head: "Run", number: true, names: true, cell: ({ kits }) => countText(kits) },
    ...quotes.map(
      ({ id, boardHouse }): Column<Row> => ({
        key: id,
        head: boardHouse,
        number: true,
        cell: (row) => <Each row={row} quote={id} currency={plan.currency} />,
      }),
    ),
  ];
  return (
    <Table
      caption="Landed cost of one board at any run"
      height="dense"
      scrolls={quotes.length > 3}
      rows={rows}
      columns={columns}
      keyOf={({ kits }) => String(kits)}
      chosen={({ kits }) => kits === plan.run.kits}
    />
  );
}

function Each({ row, quote, currency }: { row: Row; quote: string; currency: string }) {
  const figure = row.quotes.find(({ id }) => id === quote)?.perBoard;
  if (!figure?.known) return <span className="text-ink-2">not known</span>;
  const text = moneyText(figure.value, currency);
  if (row.least !== quote) return text;
  return (
    <b>
      {text}
      <span className="heard-only">, the least</span>
    </b>
  );
}
