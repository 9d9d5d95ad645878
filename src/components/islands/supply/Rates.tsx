import { useState } from "react";
import { ageText, daysBetween, dayText } from "#src/components/day-text.ts";
import { CallFailed } from "#src/components/islands/call.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import type { RateView } from "#src/server/currency-rate-changes.ts";
import { RateForm } from "./RateForm.tsx";
import { removeRate, setRate } from "./rates-store.ts";

/** A rate older than this is worth a look before money is spent. */
const OLD_DAYS = 30;

interface RatesProps {
  workshop: string;
  reporting: string;
  rates: readonly RateView[];
  /** Currencies that suppliers or board houses of the workshop invoice in. */
  used: readonly string[];
  today: string;
  canChange: boolean;
}

type Row = { currency: string; rate: RateView | undefined };

/** Currency rates by hand: one row for each that is set or needed. */
export function Rates({ workshop, reporting, rates, used, today, canChange }: RatesProps) {
  const [open, setOpen] = useState<{ currency: string; fixed: boolean } | null>(null);
  const missing = used.filter(
    (currency) => currency !== reporting && !rates.some((rate) => rate.currency === currency),
  );
  const rows: Row[] = [
    ...missing.map((currency) => ({ currency, rate: undefined })),
    ...rates.map((rate) => ({ currency: rate.currency, rate })),
  ];
  const change = (currency: string) => setOpen({ currency, fixed: true });
  return (
    <Section
      title="Currency rates"
      aside={`what one unit is worth in ${reporting}, written down by hand`}
      id="rates"
      actions={
        canChange && (
          <Button
            size="small"
            onClick={() => setOpen({ currency: reporting === "USD" ? "EUR" : "USD", fixed: false })}
          >
            Add a rate
          </Button>
        )
      }
    >
      {open && (
        <RateForm
          key={open.currency + open.fixed}
          {...{ reporting, today }}
          fixed={open.fixed}
          rate={rates.find(({ currency }) => currency === open.currency) ?? { currency: open.currency }}
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
          keyOf={({ currency }) => currency}
          columns={columns({ workshop, reporting, today, canChange, change })}
        />
      )}
    </Section>
  );
}

interface Doing extends Pick<RatesProps, "workshop" | "reporting" | "today" | "canChange"> {
  change: (currency: string) => void;
}

function columns({ workshop, reporting, today, canChange, change }: Doing): Column<Row>[] {
  const columns: Column<Row>[] = [
    { key: "currency", head: "Currency", names: true, cell: ({ currency }) => currency },
    {
      key: "rate",
      head: `One is worth, in ${reporting}`,
      number: true,
      cell: ({ rate }) => rate?.perForeignUnit ?? "not known",
    },
    { key: "dated", head: "As of", wide: true, cell: ({ rate }) => (rate ? dayText(rate.dated) : "") },
    { key: "age", head: "State", cell: ({ rate }) => <Age rate={rate} today={today} /> },
  ];
  if (!canChange) return columns;
  return [
    ...columns,
    {
      key: "do",
      head: <span className="heard-only">Change</span>,
      cell: ({ currency, rate }) => (
        <span className="flex gap-4">
          <QuietButton onClick={() => change(currency)} aria-label={`Set the rate of ${currency}`}>
            {rate ? "Set anew" : "Set it"}
          </QuietButton>
          {rate && (
            <QuietButton
              onClick={() => void drop(workshop, rate)}
              aria-label={`Remove the rate of ${currency}`}
            >
              Remove
            </QuietButton>
          )}
        </span>
      ),
    },
  ];
}

function Age({ rate, today }: { rate: RateView | undefined; today: string }) {
  if (!rate) return <Chip kind="bad">No rate</Chip>;
  const age = ageText(rate.dated, today);
  return daysBetween(rate.dated, today) > OLD_DAYS ? <Chip kind="caution">{age}</Chip> : age;
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
