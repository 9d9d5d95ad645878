import { unitPriceText } from "#src/components/amount-text.ts";
import type { OfferDifference, OfferDifferences } from "#src/server/bring-in/offer-difference.ts";
import type { Rung } from "#src/shapes/ladder.ts";
import { Section } from "../parts/Section.tsx";
import { type Column, Table } from "../parts/Table.tsx";
import { counted } from "./count-words.ts";

function ladderText(breaks: readonly Rung[], currency: string): string {
  if (breaks.length === 0) return "no price yet";
  return breaks.map(({ quantity, price }) => `${quantity}: ${unitPriceText(price, currency)}`).join(", ");
}

const COLUMNS: Column<OfferDifference>[] = [
  { key: "part", head: "Part", names: true, cell: ({ part }) => part },
  { key: "supplier", head: "Supplier", cell: ({ supplier }) => supplier, wide: true },
  { key: "code", head: "Order code", cell: ({ orderCode }) => orderCode || "–", wide: true },
  {
    key: "was",
    head: "Now",
    wide: true,
    cell: ({ was }) => (was === null ? "not offered" : ladderText(was.breaks, was.currency)),
  },
  { key: "becomes", head: "Then", cell: ({ becomes, currency }) => ladderText(becomes, currency) },
];

/** What a price list would change of the offers that stand. */
export function OfferDifferenceSection({ difference }: { difference: OfferDifferences }) {
  const { counts, added, changed } = difference;
  const stay = counts.same + counts.confirmed;
  return (
    <Section
      id="difference"
      title="What changes"
      aside={stay > 0 ? `${counted(stay, "price stays", "prices stay")} as they are` : undefined}
    >
      {counts.added + counts.changed === 0 && (
        <p>
          {counts.confirmed > 0
            ? "No price changes; their day becomes today."
            : "Nothing: every offer stands so already."}
        </p>
      )}
      <OfferGroup title="Another price" count={counts.changed} offers={changed} />
      <OfferGroup title="New offers" count={counts.added} offers={added} />
    </Section>
  );
}

function OfferGroup({
  title,
  count,
  offers,
}: {
  title: string;
  count: number;
  offers: readonly OfferDifference[];
}) {
  if (count === 0) return null;
  return (
    <details open={count <= 20} className="py-2">
      <summary className="type-h3 min-h-8 py-1">
        {title} <span className="font-normal text-ink-2">{count}</span>
      </summary>
      <Table
        caption={title}
        columns={COLUMNS}
        rows={offers}
        keyOf={({ row, orderCode }) => `${row} ${orderCode}`}
      />
      {count > offers.length && <p className="mt-1 text-ink-2">and {count - offers.length} more</p>}
    </details>
  );
}
