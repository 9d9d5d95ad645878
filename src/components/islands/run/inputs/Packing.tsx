import { addRow, removeRow } from "#src/components/islands/plan/plan-lists.ts";
import type { PlanPacking } from "#src/shapes/plan.ts";
import { EditionsEntry } from "./EditionsEntry.tsx";
import { EntryTable } from "./EntryTable.tsx";
import { AmountEntry } from "./fields.tsx";
import type { InputProps } from "./input-props.ts";
import { NameEntry } from "./NameEntry.tsx";

/** What goes round the parts: bags, box, sheet. */
export function Packing({ address, held, may }: InputProps) {
  const { packing, editions, currency } = held.plan;
  const off = !may.changeRun;
  const entry = (field: string, { id, name }: PlanPacking) => ({
    address,
    row: { kind: "packing", id } as const,
    field,
    currency,
    thing: name,
  });
  return (
    <EntryTable
      caption="Packing"
      rows={packing}
      columns={[
        {
          head: "Item",
          cell: (item) => <NameEntry value={item.name} off={off} entry={entry("name", item)} />,
        },
        {
          head: "Costs",
          number: true,
          className: "w-56",
          cell: (item) => (
            <AmountEntry
              label={`Cost of ${item.name}`}
              labelHidden
              row
              mayBeEmpty
              places={4}
              unit="a kit"
              off={off}
              value={item.costPerKit}
              entry={entry("costPerKit", item)}
            />
          ),
        },
        ...(editions.length > 1
          ? [
              {
                head: "Editions",
                cell: (item: PlanPacking) => (
                  <EditionsEntry
                    value={item.editions}
                    editions={editions}
                    off={off}
                    entry={entry("editions", item)}
                  />
                ),
              },
            ]
          : []),
      ]}
      edit={
        off
          ? undefined
          : {
              add: "Add a packing item",
              onAdd: (name) => addRow(address, "packing", { name, editions: null, costPerKit: null }),
              onRemove: ({ id, name }) => void removeRow(address, "packing", id, name),
            }
      }
    />
  );
}
