import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { type NextBoards, nextBoards } from "#src/costing/next-boards.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import type { BoardsResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** What the next lots would really add; often the first extra boards cost nothing. */
export function NextLots({ plan, boards }: { plan: Plan; boards: BoardsResult }) {
  const chosen = boards.quotes.find(({ id }) => id === boards.chosen);
  const quote = plan.boards.quotes.find(({ id }) => id === boards.chosen);
  if (!chosen?.ordered || !quote || boards.toOrder === null) return null;
  const free = chosen.ordered - boards.toOrder;
  const rows = nextBoards(quote, chosen.ordered, 3);
  const { currency } = quote;
  const panelled = quote.boardsPerPanel !== null;
  const columns: Column<NextBoards>[] = [
    {
      key: "ordered",
      head: "Order instead",
      names: true,
      cell: ({ ordered, pieces }) =>
        panelled ? `${countText(pieces)} panels, ${countText(ordered)}` : countText(ordered),
    },
    { key: "more", head: "More boards", number: true, cell: ({ more }) => countText(more) },
    {
      key: "total",
      head: "In all",
      number: true,
      wide: true,
      cell: ({ total }) => moneyText(total, currency),
    },
    { key: "adds", head: "Adds", number: true, cell: ({ adds }) => moneyText(adds, currency) },
    {
      key: "each",
      head: "Each of them",
      number: true,
      cell: ({ addsEach }) => unitPriceText(roundedText(addsEach, 3), currency),
    },
  ];
  return (
    <>
      <p className="mb-3">
        {free > 0
          ? `${countText(free)} more than must be ordered come with it, at no extra cost: ${countText(chosen.ordered)} are the cheapest way to have ${countText(boards.toOrder)}.`
          : `${countText(chosen.ordered)} are ordered, exactly as many as must be.`}
      </p>
      {rows.length > 0 && (
        <div className="max-w-[640px]">
          <Table
            caption="The next larger orders"
            rows={rows}
            columns={columns}
            keyOf={({ ordered }) => String(ordered)}
          />
        </div>
      )}
    </>
  );
}
