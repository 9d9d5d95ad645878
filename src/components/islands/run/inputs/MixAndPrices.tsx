import { countText } from "#src/components/amount-text.ts";
import { EntryTable } from "./EntryTable.tsx";
import { AmountEntry, NumberEntry } from "./fields.tsx";
import type { InputProps } from "./input-props.ts";

/** The mix of editions and the price of each. */
export function MixAndPrices({ address, held, run, may }: InputProps) {
  const { plan } = held;
  const made = (id: string) => run.editions.find((edition) => edition.id === id)?.kits ?? 0;
  const entry = (kind: "price" | "weight", { id, name }: { id: string; name: string }) => ({
    address,
    row: { kind, id },
    field: kind,
    currency: plan.currency,
    thing: name,
  });
  return (
    <EntryTable
      caption="Mix and prices of the editions"
      rows={plan.editions}
      columns={[
        { head: "Edition", cell: ({ name }) => <span className="block pt-2 font-semibold">{name}</span> },
        {
          head: "Share of the run",
          number: true,
          className: "w-44",
          cell: (row) => (
            <NumberEntry
              label={`Share of the run of ${row.name}`}
              labelHidden
              row
              whole
              most={1_000_000}
              unit="parts"
              off={!may.changeRun}
              value={row.weight}
              entry={entry("weight", row)}
            />
          ),
        },
        {
          head: `Kits of ${run.kits}`,
          number: true,
          className: "w-28",
          cell: ({ id }) => <span className="block pt-2 text-right">{countText(made(id))}</span>,
        },
        {
          head: "Price, tax included",
          number: true,
          className: "w-56",
          cell: (row) => (
            <AmountEntry
              label={`Price of ${row.name}`}
              labelHidden
              row
              mayBeEmpty
              unit="a kit"
              off={!may.changePrice}
              value={row.price}
              entry={entry("price", row)}
            />
          ),
        },
      ]}
    />
  );
}
