import { useState } from "react";
import { CallFailed } from "#src/components/islands/call.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { Table } from "#src/components/islands/parts/Table.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import type { RateView } from "#src/server/currency-rate-changes.ts";
import { RateForm } from "./RateForm.tsx";
import { RatesSource } from "./RatesSource.tsx";
import { type RateRow, rateColumns } from "./rate-columns.tsx";
import { removeRate, setRate } from "./rates-store.ts";

interface RatesProps {
  workshop: string;
  reporting: string;
  rates: readonly RateView[];
  /** Currencies that suppliers or board houses of the workshop invoice in. */
  used: readonly string[];
  today: string;
  canChange: boolean;
  /** Whether the settings name an address of reference rates. */
  canFetch: boolean;
}

/** Rows in the order shown: what lacks a rate, then each currency with its newest, and its older ones if unfolded. */
function rowsOf(rates: readonly RateView[], missing: readonly string[], unfolded: string | null): RateRow[] {
  const rows: RateRow[] = missing.map((currency) => ({ currency, rate: undefined, earlier: 0 }));
  for (const rate of rates) {
    const { currency } = rate;
    const isNewest = rows.at(-1)?.currency !== currency;
    const count = rates.filter((one) => one.currency === currency).length;
    if (isNewest) rows.push({ currency, rate, earlier: count - 1 });
    else if (unfolded === currency) rows.push({ currency, rate, earlier: null });
  }
  return rows;
}

/** Currency rates, each from its day on: those that hold, and those that are needed. */
export function Rates({ workshop, reporting, rates, used, today, canChange, canFetch }: RatesProps) {
  const [open, setOpen] = useState<{ currency: string; fixed: boolean } | null>(null);
  const [unfolded, setUnfolded] = useState<string | null>(null);
  const missing = used.filter(
    (currency) => currency !== reporting && !rates.some((rate) => rate.currency === currency),
  );
  const rows = rowsOf(rates, missing, unfolded);
  const newest = (currency: string) => rates.find((rate) => rate.currency === currency);
  return (
    <Section
      title="Currency rates"
      aside={`what one unit is worth in ${reporting}, from a day on`}
      id="rates"
      actions={
        canChange && (
          <>
            <RatesSource {...{ workshop, canFetch }} />
            <Button
              size="small"
              onClick={() => setOpen({ currency: reporting === "USD" ? "EUR" : "USD", fixed: false })}
            >
              Add a rate
            </Button>
          </>
        )
      }
    >
      {open && (
        <RateForm
          key={open.currency + open.fixed}
          {...{ reporting, today }}
          fixed={open.fixed}
          rate={newest(open.currency) ?? { currency: open.currency }}
          versionOf={(currency, day) =>
            rates.find((rate) => rate.currency === currency && rate.dated === day)?.version ?? null
          }
          onLeave={() => setOpen(null)}
          onSave={async (currency, input) => {
            await setRate(workshop, currency, input);
            setOpen(null);
          }}
        />
      )}
      {rows.length === 0 ? (
        <p className="type-note text-ink-2">Every price is in {reporting}. No rate is needed.</p>
      ) : (
        <Table
          caption="Currency rates"
          rows={rows}
          keyOf={({ currency, rate }) => `${currency} ${rate?.dated}`}
          columns={rateColumns({
            ...{ reporting, today, canChange, unfolded },
            change: (currency) => setOpen({ currency, fixed: true }),
            remove: (rate) => void drop(workshop, rate),
            unfold: (currency) => setUnfolded(unfolded === currency ? null : currency),
          })}
        />
      )}
    </Section>
  );
}

/** Taken back by the toast: a rate is soon written again. */
async function drop(workshop: string, rate: RateView): Promise<void> {
  const { currency, perForeignUnit, dated } = rate;
  try {
    await removeRate(workshop, rate);
    const put = () => void setRate(workshop, currency, { perForeignUnit, dated, version: null });
    showToast({ text: `The rate of ${currency} is removed.`, action: { label: "Undo", run: put } });
  } catch (error) {
    if (!(error instanceof CallFailed)) throw error;
    showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
  }
}
