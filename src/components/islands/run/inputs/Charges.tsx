import { addRow, removeRow } from "#src/components/islands/plan/plan-lists.ts";
import type { PlanCharge } from "#src/shapes/plan.ts";
import { EntryTable } from "./EntryTable.tsx";
import { AmountEntry, NumberEntry } from "./fields.tsx";
import type { InputProps } from "./input-props.ts";
import { NameEntry } from "./NameEntry.tsx";

/** What is paid once, and over how many kits it is spread. */
export function Charges({ address, held, may }: InputProps) {
  const { charges, currency } = held.plan;
  const off = !may.changeRun;
  const entry = (field: string, { id, name }: PlanCharge) => ({
    address,
    row: { kind: "charge", id } as const,
    field,
    currency,
    thing: name,
  });
  return (
    <EntryTable
      caption="Once-only costs"
      rows={charges}
      columns={[
        {
          head: "Cost",
          cell: (charge) => <NameEntry value={charge.name} off={off} entry={entry("name", charge)} />,
        },
        {
          head: "Amount",
          number: true,
          className: "w-44",
          cell: (charge) => (
            <AmountEntry
              label={`Amount of ${charge.name}`}
              labelHidden
              row
              off={off}
              value={charge.amount}
              entry={entry("amount", charge)}
            />
          ),
        },
        {
          head: "Spread over",
          number: true,
          className: "w-52",
          cell: (charge) => (
            <NumberEntry
              label={`Kits that ${charge.name} is spread over; empty: this run alone`}
              labelHidden
              row
              whole
              mayBeEmpty
              least={1}
              unit="kits in all"
              off={off}
              value={charge.spreadOver}
              entry={entry("spreadOver", charge)}
            />
          ),
        },
      ]}
      edit={
        off
          ? undefined
          : {
              add: "Add a once-only cost",
              onAdd: (name) => addRow(address, "charge", { name, amount: "0", spreadOver: null }),
              onRemove: ({ id, name }) => void removeRow(address, "charge", id, name),
            }
      }
    />
  );
}
