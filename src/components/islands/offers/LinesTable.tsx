import { countText, moneyText } from "#src/components/amount-text.ts";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { PartLine } from "#src/costing/run-result.ts";
import type { OpenThing } from "#src/costing/to-settle.ts";
import { compressDesignators } from "#src/partslist/designators.ts";
import type { OfferPart } from "#src/server/kit-offers.ts";
import type { KitSupply } from "./kit-supply.ts";
import type { Mark } from "./offer-words.ts";

interface Row {
  part: OfferPart;
  line: PartLine;
}

interface LinesTableProps {
  supply: KitSupply;
  parts: readonly OfferPart[];
  things: readonly OpenThing[];
}

/** The lines of a kit, each with the offer that is taken, how many are bought, and what is paid. */
export function LinesTable({ supply, parts, things }: LinesTableProps) {
  const opens = useOpens();
  const rows = parts.flatMap((part): Row[] => {
    const line = supply.run.parts.find(({ id }) => id === part.id);
    return line ? [{ part, line }] : [];
  });
  const columns: Column<Row>[] = [
    { key: "number", head: "Line", number: true, wide: true, cell: ({ part }) => part.lines.join(", ") },
    {
      key: "part",
      head: "Part",
      names: true,
      cell: ({ part }) => <PartName part={part} href={supply.partHref(part.id)} />,
    },
    { key: "from", head: "From", cell: ({ line }) => fromText(supply, line) },
    {
      key: "buy",
      head: "Buy",
      number: true,
      cell: ({ line }) => (line.ordered > 0 ? countText(line.ordered) : ""),
    },
    {
      key: "pay",
      head: "You pay",
      number: true,
      cell: ({ line }) =>
        line.goods.known && line.orders.length > 0 ? (
          <Figure
            label={`${line.name}, you pay`}
            value={moneyText(line.goods.value, supply.run.currency)}
            {...opens(`part:${line.id}`)}
          />
        ) : null,
    },
    {
      key: "over",
      head: "Left over",
      number: true,
      wide: true,
      cell: ({ line }) => (line.leftOver > 0 ? countText(line.leftOver) : ""),
    },
    {
      key: "state",
      head: "State",
      wide: true,
      cell: ({ line }) => (
        <LineChip
          mark={lineMark(
            line,
            things.find(({ at }) => at.part === line.id),
          )}
        />
      ),
    },
  ];
  return (
    <Table caption="Lines with their offers" rows={rows} columns={columns} keyOf={({ part }) => part.id} />
  );
}

function PartName({ part, href }: { part: OfferPart; href: string }) {
  return (
    <a href={href} className="text-ink no-underline hover:underline">
      {part.name}
      <span className="ml-2 font-normal text-ink-2 max-tablet:ml-0 max-tablet:block max-tablet:type-label">
        {compressDesignators(part.designators.split(", ").filter(Boolean))}
      </span>
    </a>
  );
}

function fromText(supply: KitSupply, { state, orders }: PartLine): string {
  if (state === "not-needed") return "not in this run";
  const suppliers = [...new Set(orders.map(({ supplier }) => supplier))];
  if (suppliers.length > 0) return suppliers.map(supply.nameOf).join(", ");
  return state === "settled" ? "the shelf" : "nobody";
}

function LineChip({ mark }: { mark: Mark }) {
  return <Chip kind={mark.kind}>{mark.word}</Chip>;
}

/** What a line's chip says: the worst that is true of it. `thing`: what is to settle about its part. */
export function lineMark(line: PartLine, thing: OpenThing | undefined): Mark {
  if (line.state === "unpriced") return { kind: "bad", word: "No price" };
  if (line.state === "short") return { kind: "bad", word: `${countText(line.shortBy)} short` };
  if (line.state === "refused") return { kind: "bad", word: "Order too small" };
  if (thing !== undefined) return { kind: "caution", word: doubt(thing) };
  return line.state === "not-needed"
    ? { kind: "neutral", word: "Not needed" }
    : { kind: "plain", word: "Settled" };
}

function doubt({ problems }: OpenThing): string {
  const lacks = problems.reduce(
    (sum, { code, facts }) => sum + (code === "stock-short" ? (facts.by ?? 0) : 0),
    0,
  );
  if (lacks > 0) return `${countText(lacks)} not in stock`;
  return problems.some(({ code }) => code === "price-old") ? "Old price" : "To settle";
}
