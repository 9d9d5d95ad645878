import { currencySign } from "#src/components/amount-text.ts";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import type { AimName } from "#src/costing/price/aims.ts";
import type { AimDraft } from "./aim-draft.ts";

interface AimTargetProps {
  name: AimName;
  draft: AimDraft;
  currency: string;
  onDraft: (draft: AimDraft) => void;
}

const PERCENT = /^\d+(\.\d{1,4})?$/;

/** Hundredths below `end`. */
function checkBelow(end: number): (text: string) => string | undefined {
  return (text) => {
    if (!PERCENT.test(text)) return "Write at most four decimals.";
    return Number(text) >= end ? `Write less than ${end} %.` : undefined;
  };
}

/** What is asked of the price: nothing to write for the first two. */
export function AimTarget({ name, draft, currency, onDraft }: AimTargetProps) {
  const money = currencySign(currency);
  const give = (field: keyof AimDraft) => (value: string) => onDraft({ ...draft, [field]: value });
  switch (name) {
    case "next-kit":
    case "run-even":
      return null;
    case "margin":
    case "mark-up":
      return (
        <MeasureField
          label={name === "margin" ? "Margin" : "Mark-up"}
          labelHidden
          row
          live
          unit="%"
          value={draft[name]}
          check={checkBelow(name === "margin" ? 100 : 10_000)}
          onMeasure={give(name)}
        />
      );
    case "profit":
      return (
        <span className="flex flex-col gap-2">
          <MoneyField
            label="Profit of the run"
            labelHidden
            row
            live
            currency={money}
            value={draft.profit}
            onMoney={give("profit")}
          />
          <MeasureField
            label="of it taxed away"
            row
            live
            unit="%"
            value={draft.taxed}
            check={checkBelow(100)}
            onMeasure={give("taxed")}
          />
        </span>
      );
    case "hour":
      return (
        <MoneyField
          label="Pay for an hour"
          labelHidden
          row
          live
          currency={money}
          unit="an hour"
          value={draft.hour}
          onMoney={give("hour")}
        />
      );
  }
}
