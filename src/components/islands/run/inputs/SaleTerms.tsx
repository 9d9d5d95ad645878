import { AmountEntry, RateEntry } from "./fields.tsx";
import type { InputProps } from "./input-props.ts";

/** Tax, fees and postage: one rule for every sale. */
export function SaleTerms({ address, held, may }: InputProps) {
  const { sale, currency } = held.plan;
  const entry = (field: keyof typeof sale) => ({ address, row: { kind: "sale" } as const, field, currency });
  const off = !may.changePrice;
  const common = { off, mayBeEmpty: true } as const;
  return (
    <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-3">
      <RateEntry
        {...common}
        label="Tax inside the price"
        hint="0 if you charge none."
        most={999}
        value={sale.taxRate}
        entry={entry("taxRate")}
      />
      <RateEntry
        {...common}
        label="Fee on price and postage"
        hint="What the market place or payment takes."
        below={100}
        value={sale.feeRate}
        entry={entry("feeRate")}
      />
      <AmountEntry
        {...common}
        label="Fixed fee"
        unit="an order"
        value={sale.feeFixed}
        entry={entry("feeFixed")}
      />
      <AmountEntry
        {...common}
        label="Postage the buyer pays"
        unit="an order"
        value={sale.postageCharged}
        entry={entry("postageCharged")}
      />
      <AmountEntry
        {...common}
        label="Postage you pay"
        unit="an order"
        value={sale.postagePaid}
        entry={entry("postagePaid")}
      />
    </div>
  );
}
