import { countText, moneyText } from "#src/components/amount-text.ts";
import { kitPath } from "#src/components/islands/kit-address.ts";
import { Table } from "#src/components/islands/parts/Table.tsx";
import { grainText } from "#src/costing/grains.ts";
import { nearest } from "#src/costing/price/fraction.ts";
import { saleContext } from "#src/costing/price/sale-context.ts";
import { soldKit } from "#src/costing/price/sold-kit.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { PlanEdition } from "#src/shapes/plan.ts";
import type { InputProps } from "./input-props.ts";

/** What each channel leaves of a sale, in a line; they are set on the page about the price. */
export function SaleLines({ address, held }: InputProps) {
  const { plan } = held;
  const context = saleContext(plan);
  const most = plan.editions.reduce((one, other) => (other.weight > one.weight ? other : one));
  const total = plan.channels.reduce((sum, { weight }) => sum + weight, 0);
  const comesIn = (channel: string, edition: PlanEdition) => {
    const { sale, kept, needs } = soldKit(context, { edition: edition.id, channel });
    if (sale.lines.length === 0) return "–";
    return needs.kept.length > 0 ? needWords(needs.kept) : moneyText(grainText(nearest(kept)), plan.currency);
  };
  const columns = [
    { key: "name", head: "Channel", names: true, cell: ({ name }: { name: string }) => name },
    {
      key: "share",
      head: "Share",
      number: true,
      cell: ({ weight }: { weight: number }) => `${countText(weight)} of ${countText(total)}`,
    },
    {
      key: "in",
      head: plan.editions.length > 1 ? `Comes in, ${most.name}` : "Comes in, a kit",
      number: true,
      cell: ({ id }: { id: string }) => comesIn(id, most),
    },
  ];
  return (
    <>
      <Table
        caption="What comes in of a sale, channel by channel"
        columns={columns}
        rows={plan.channels}
        keyOf={({ id }) => id}
      />
      <p className="mt-3" data-screen-only>
        <a href={kitPath(address, "/price")}>Prices, fees, postage and tax of every channel</a>
      </p>
    </>
  );
}
