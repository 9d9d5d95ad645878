import { FormFaults } from "#src/components/islands/forms/FormFaults.tsx";
import { useForm } from "#src/components/islands/forms/use-form.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { readNumber } from "#src/partslist/numbers.ts";
import type { RateView } from "#src/server/currency-rate-changes.ts";
import type { CurrencyRateInput } from "#src/shapes/currency-rate.ts";
import { CURRENCY_CHOICES } from "./currency-choices.ts";

interface RateFields {
  currency: string;
  perForeignUnit: string;
  dated: string;
}

interface RateFormProps {
  /** What the workshop reckons in. */
  reporting: string;
  rate: Partial<RateView> & { currency: string };
  /** The version of the rate a currency has for a day, if it has one. */
  versionOf: (currency: string, day: string) => number | null;
  today: string;
  /** The currency is settled: the rate is set anew, or a supplier needs it. */
  fixed: boolean;
  onSave: (currency: string, input: CurrencyRateInput) => Promise<void>;
  onLeave: () => void;
}

/** What one unit of a foreign currency is worth, and as of when. */
export function RateForm({ reporting, rate, versionOf, today, fixed, onSave, onLeave }: RateFormProps) {
  const first = { currency: rate.currency, perForeignUnit: rate.perForeignUnit ?? "", dated: today };
  const save = ({ currency, perForeignUnit, dated }: RateFields, settled: number) => {
    // What is no number goes to the server as it is: its sentence is the one that is shown.
    const rate = readNumber(perForeignUnit, null) ?? perForeignUnit;
    return onSave(currency, { perForeignUnit: rate, dated, version: settled || versionOf(currency, dated) });
  };
  const form = useForm<RateFields>(first, 0, save);
  const { fields, set, words } = form;
  return (
    <form onSubmit={form.submit} noValidate className="flex flex-col gap-5 py-4">
      <FormFaults
        form={form}
        title="The rate is not saved"
        differences={(mine, theirs) => [
          `One ${mine.currency}: yours ${mine.perForeignUnit}, theirs ${theirs.perForeignUnit}.`,
        ]}
      />
      <div className="flex flex-wrap items-start gap-x-6 gap-y-5">
        <ChoiceField
          label="One"
          {...words("currency")}
          choices={CURRENCY_CHOICES.filter(({ value }) => value !== reporting)}
          value={fields.currency}
          disabled={fixed}
          onChange={(change) => set({ currency: change.currentTarget.value })}
          className="w-32"
        />
        <TextField
          label={`is worth, in ${reporting}`}
          {...words("perForeignUnit")}
          inputMode="decimal"
          autoComplete="off"
          value={fields.perForeignUnit}
          onChange={(change) => set({ perForeignUnit: change.currentTarget.value })}
          className="w-44"
        />
        <TextField
          label="as of"
          {...words("dated")}
          type="date"
          max={today}
          value={fields.dated}
          onChange={(change) => set({ dated: change.currentTarget.value })}
          className="w-48"
        />
      </div>
      <div className="flex flex-wrap items-center gap-5">
        <Button type="submit" busy={form.busy} busyWord="Saving">
          Save the rate
        </Button>
        <QuietButton onClick={onLeave}>Leave it</QuietButton>
      </div>
    </form>
  );
}
