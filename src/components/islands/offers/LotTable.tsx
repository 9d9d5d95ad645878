import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { convertedEach } from "#src/costing/converted-each.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import type { PartOrder } from "#src/costing/run-result.ts";

interface LotTableProps {
  offer: { currency: string; breaks: readonly { quantity: number; price: string }[] };
  order: Pick<PartOrder, "lots"> | null;
}

type Lot = { quantity: number; price: string };

/** Lots at a total price, with how many of each are taken. */
export function LotTable({ offer: { breaks, currency }, order }: LotTableProps) {
  const taken = ({ quantity }: Lot) => order?.lots.find((lot) => lot.quantity === quantity)?.count ?? 0;
  const columns: Column<Lot>[] = [
    { key: "lot", head: "Lot of", number: true, names: true, cell: ({ quantity }) => countText(quantity) },
    { key: "price", head: "Costs", number: true, cell: ({ price }) => moneyText(price, currency) },
    {
      key: "each",
      head: "Each",
      number: true,
      cell: ({ price, quantity }) =>
        unitPriceText(roundedText(convertedEach(price, "1", quantity), 3), currency),
    },
    {
      key: "taken",
      head: "Taken",
      number: true,
      cell: (lot) => (taken(lot) === 0 ? "" : countText(taken(lot))),
    },
  ];
  return (
    <Table
      caption="Lots"
      rows={breaks}
      columns={columns}
      keyOf={({ quantity }) => String(quantity)}
      chosen={(lot) => taken(lot) > 0}
    />
  );
}
