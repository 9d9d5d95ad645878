import { useState } from "react";
import { countText, currencySign, moneyText } from "#src/components/amount-text.ts";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { fromPercent } from "#src/components/percent.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import { profitBeforeTax, runsForProfit } from "#src/costing/target-profit.ts";

/** Runs that reach a profit, written before tax, or after it with its rate. */
export function TargetProfit({ sweep, currency }: { sweep: SweepResult; currency: string }) {
  const [wanted, setWanted] = useState("500.00");
  const [taxed, setTaxed] = useState("");
  const rate = taxed === "" ? "0" : fromPercent(taxed);
  return (
    <div className="mt-6">
      <h3 className="type-h3 mb-2">For a profit of</h3>
      <div className="flex flex-wrap items-start gap-x-6 gap-y-3">
        <MoneyField
          label="Profit after tax"
          hint="Without a rate: before tax."
          live
          currency={currencySign(currency)}
          value={wanted}
          onMoney={setWanted}
          className="w-56"
        />
        <MeasureField
          label="Taxed away"
          unit="%"
          live
          value={taxed}
          check={(text) => {
            if (!/^\d+(\.\d{1,4})?$/.test(text)) return "Write at most four decimals.";
            return Number(text) >= 100 ? "Write less than 100 %." : undefined;
          }}
          onMeasure={setTaxed}
          className="w-44"
        />
      </div>
      <p className="mt-3" aria-live="polite">
        {wanted === ""
          ? "Write the profit that is wanted."
          : inWords(sweep, profitBeforeTax(wanted, rate), currency)}
      </p>
    </div>
  );
}

function inWords(sweep: SweepResult, before: string, currency: string): string {
  const money = moneyText(before, currency);
  const { first, safe } = runsForProfit(sweep, before);
  if (first === null)
    return `${money} before tax: no run up to ${countText(sweep.breakEven.upTo)} reaches it.`;
  const always = safe === null ? "larger runs miss it again" : `every run from ${countText(safe)} on does`;
  return `${money} before tax: a run of ${countText(first)} reaches it first; ${always}.`;
}
