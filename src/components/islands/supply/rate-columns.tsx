import { ageText } from "#src/components/day-text.ts";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import type { Column } from "#src/components/islands/parts/Table.tsx";
import { daysBetween } from "#src/costing/calendar/days.ts";
import { dayWords } from "#src/costing/day-words.ts";
import type { RateView } from "#src/server/currency-rate-changes.ts";

/** A rate older than this is worth a look before money is spent. */
const OLD_DAYS = 30;

/** One row: the rate that holds, one that held before it, or a currency that lacks one. */
export interface RateRow {
  currency: string;
  rate: RateView | undefined;
  /** How many older rates the currency has; `null` on a row of an older one. */
  earlier: number | null;
}

interface Doing {
  reporting: string;
  today: string;
  canChange: boolean;
  change: (currency: string) => void;
  remove: (rate: RateView) => void;
  unfold: (currency: string) => void;
  unfolded: string | null;
}

/** The columns of the table of rates; who may not change them has none to change. */
export function rateColumns(doing: Doing): Column<RateRow>[] {
  const { reporting, today, canChange } = doing;
  const columns: Column<RateRow>[] = [
    {
      key: "currency",
      head: "Currency",
      names: true,
      cell: ({ currency, earlier }) =>
        earlier === null ? <span className="pl-6 text-ink-2">{currency}, before</span> : currency,
    },
    {
      key: "rate",
      head: `One is worth, in ${reporting}`,
      number: true,
      cell: ({ rate }) => rate?.perForeignUnit ?? "not known",
    },
    { key: "dated", head: "From", wide: true, cell: ({ rate }) => (rate ? dayWords(rate.dated) : "") },
    { key: "age", head: "State", cell: ({ rate, earlier }) => <Age {...{ rate, earlier, today }} /> },
    { key: "earlier", head: "Earlier", cell: (row) => <Earlier {...row} {...doing} /> },
  ];
  if (!canChange) return columns;
  const head = <span className="heard-only">Change</span>;
  return [...columns, { key: "do", head, cell: (row) => <Ways {...row} {...doing} /> }];
}

function Age({ rate, earlier, today }: Pick<RateRow, "rate" | "earlier"> & { today: string }) {
  if (!rate) return <Chip kind="bad">No rate</Chip>;
  const age = ageText(rate.dated, today);
  return earlier !== null && daysBetween(rate.dated, today) > OLD_DAYS ? (
    <Chip kind="caution">{age}</Chip>
  ) : (
    age
  );
}

function Earlier({ currency, earlier, unfold, unfolded }: RateRow & Doing) {
  if (!earlier) return null;
  const open = unfolded === currency;
  return (
    <QuietButton
      aria-expanded={open}
      aria-label={`${earlier} earlier ${earlier === 1 ? "rate" : "rates"} of ${currency}`}
      onClick={() => unfold(currency)}
    >
      {open ? "Fold away" : `${earlier} earlier`}
    </QuietButton>
  );
}

function Ways({ currency, rate, earlier, change, remove }: RateRow & Doing) {
  return (
    <span className="flex gap-4">
      {earlier !== null && (
        <QuietButton onClick={() => change(currency)} aria-label={`Set the rate of ${currency}`}>
          {rate ? "Set anew" : "Set it"}
        </QuietButton>
      )}
      {rate && (
        <QuietButton
          onClick={() => remove(rate)}
          aria-label={`Remove the rate of ${currency} from ${dayWords(rate.dated)}`}
        >
          Remove
        </QuietButton>
      )}
    </span>
  );
}
