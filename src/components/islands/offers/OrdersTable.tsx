import { moneyText } from "#src/components/amount-text.ts";
import { CallFailed, call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi } from "#src/components/islands/kit-address.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { Basket } from "#src/costing/run-result.ts";
import type { KitSupply } from "./kit-supply.ts";
import { offersSaved } from "./offers-store.ts";

interface OrdersTableProps {
  address: KitAddress;
  supply: KitSupply;
  canChoose: boolean;
}

/** One order to one supplier each, in its own currency, with what freight and fees add. */
export function OrdersTable({ address, supply, canChoose }: OrdersTableProps) {
  const opens = useOpens();
  const { baskets } = supply.run;
  const columns: Column<Basket>[] = [
    {
      key: "supplier",
      head: "Supplier",
      names: true,
      cell: ({ supplier, name }) => (
        <a href={supply.supplierHref(supplier)} className="text-ink no-underline hover:underline">
          {name}
        </a>
      ),
    },
    { key: "lines", head: "Lines", number: true, wide: true, cell: ({ lines }) => String(lines.length) },
    { key: "goods", head: "Goods", number: true, cell: ({ goods, currency }) => moneyText(goods, currency) },
    { key: "charges", head: "Freight and fees", number: true, cell: chargesText },
    {
      key: "total",
      head: "Order",
      number: true,
      cell: (basket) =>
        basket.total.known ? (
          <Figure
            label={`Order to ${basket.name}`}
            value={moneyText(basket.total.value, basket.currency)}
            {...opens(`basket:${basket.supplier}`)}
          />
        ) : (
          needWords(basket.total.needs)
        ),
    },
    { key: "note", head: "To know", wide: true, cell: noteText },
  ];
  if (canChoose)
    columns.push({
      key: "do",
      head: <span className="heard-only">Choice</span>,
      wide: true,
      cell: ({ supplier, name }) => (
        <QuietButton
          onClick={() => void shutOut(address, supplier, name, true)}
          aria-label={`Do without ${name}`}
        >
          Do without
        </QuietButton>
      ),
    });
  return (
    <>
      <Table caption="Orders" rows={baskets} columns={columns} keyOf={({ supplier }) => supplier} />
      <LeftOut {...{ address, supply, canChoose }} />
    </>
  );
}

function chargesText({ freight, handling, smallOrderFee, currency }: Basket): string {
  if (!freight.known) return needWords(freight.needs);
  const all = [freight.value, handling, smallOrderFee].filter((amount) => /[1-9]/.test(amount));
  return all.length === 0 ? "none" : all.map((amount) => moneyText(amount, currency)).join(" + ");
}

function noteText({ toFreeFreight, freeFreightReached, smallOrderFee, currency }: Basket): string {
  if (/[1-9]/.test(smallOrderFee)) return "Below its minimum, so a fee is added";
  if (freeFreightReached) return "Freight is free";
  return toFreeFreight === null ? "" : `${moneyText(toFreeFreight, currency)} more for free freight`;
}

function LeftOut({ address, supply, canChoose }: OrdersTableProps) {
  const out = supply.suppliers.filter(({ id }) => supply.plan.shutOutSuppliers.includes(id));
  if (out.length === 0) return null;
  return (
    <p className="type-note mt-3">
      This kit does without{" "}
      {out.map(({ id, name }, place) => (
        <span key={id}>
          {place > 0 && ", "}
          {name}
          {canChoose && (
            <>
              {" "}
              (
              <QuietButton onClick={() => void shutOut(address, id, name, false)}>
                use {name} again
              </QuietButton>
              )
            </>
          )}
        </span>
      ))}
      .
    </p>
  );
}

/** Has the kit do without a supplier, or use it again; the toast takes it back. */
async function shutOut(address: KitAddress, supplier: string, name: string, out: boolean): Promise<void> {
  try {
    await call<never>(out ? "PUT" : "DELETE", kitApi(address, `/suppliers/${supplier}/shut-out`));
    offersSaved(address);
    const text = out ? `This kit does without ${name} now.` : `${name} may be used again.`;
    showToast({ text, action: { label: "Undo", run: () => void shutOut(address, supplier, name, !out) } });
  } catch (error) {
    if (!(error instanceof CallFailed)) throw error;
    showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
  }
}
