import { currencySign } from "#src/components/amount-text.ts";
import { FormFaults } from "#src/components/islands/forms/FormFaults.tsx";
import { type Form, useForm } from "#src/components/islands/forms/use-form.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { LongTextField, TextField } from "#src/components/islands/parts/TextField.tsx";
import type { FreightTerm, SmallOrderTerm } from "#src/shapes/limits.ts";
import type { SupplierFields } from "#src/shapes/supplier.ts";
import { CURRENCY_CHOICES } from "./currency-choices.ts";

/** A supplier about whom nothing is known yet. */
export function blankSupplier(currency: string): SupplierFields {
  return {
    name: "",
    currency,
    freightTerm: "not-known",
    freightAmount: null,
    freeFreightFrom: null,
    handlingFee: "0",
    minimumOrderValue: null,
    smallOrderTerm: "none",
    smallOrderFee: null,
    leadTimeDays: null,
    note: "",
  };
}

const FREIGHT: readonly { value: FreightTerm; label: string }[] = [
  { value: "not-known", label: "Not known yet" },
  { value: "flat", label: "One amount for each order" },
  { value: "none", label: "None is charged" },
];

const SMALL_ORDERS: readonly { value: SmallOrderTerm; label: string }[] = [
  { value: "none", label: "It is taken all the same" },
  { value: "fee", label: "A fee is added" },
  { value: "refused", label: "It is refused" },
];

interface SupplierFormProps {
  first: SupplierFields;
  version: number;
  /** "Add the supplier", "Save the terms". */
  action: string;
  onSave: (fields: SupplierFields, version: number) => Promise<void>;
  onLeave?: () => void;
}

/** The terms of one supplier. */
export function SupplierForm({ first, version, action, onSave, onLeave }: SupplierFormProps) {
  const form = useForm(first, version, onSave);
  return (
    <form onSubmit={form.submit} noValidate className="flex flex-col gap-6">
      <FormFaults form={form} title="The supplier is not saved" differences={differences} />
      <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-3">
        <TextField
          label="Name"
          {...form.words("name")}
          value={form.fields.name}
          onChange={(change) => form.set({ name: change.currentTarget.value })}
          autoComplete="off"
        />
        <ChoiceField
          label="Invoices in"
          {...form.words("currency")}
          choices={CURRENCY_CHOICES}
          value={form.fields.currency}
          onChange={(change) => form.set({ currency: change.currentTarget.value })}
        />
        <MeasureField
          label="Days from order to parcel"
          {...form.words("leadTimeDays")}
          unit="days"
          value={form.fields.leadTimeDays === null ? "" : String(form.fields.leadTimeDays)}
          onMeasure={(days) => form.set({ leadTimeDays: days === "" ? null : Number(days) })}
          hint="An offer may say otherwise."
        />
      </div>
      <FreightFields form={form} />
      <SmallOrderFields form={form} />
      <LongTextField
        label="Note"
        {...form.words("note")}
        value={form.fields.note}
        onChange={(change) => form.set({ note: change.currentTarget.value })}
      />
      <div className="flex flex-wrap items-center gap-5">
        <Button type="submit" kind="primary" busy={form.busy} busyWord="Saving">
          {action}
        </Button>
        {onLeave && <QuietButton onClick={onLeave}>Leave it</QuietButton>}
      </div>
    </form>
  );
}

function FreightFields({ form }: { form: Form<SupplierFields> }) {
  const { fields, set, words } = form;
  const sign = currencySign(fields.currency);
  return (
    <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-4">
      <ChoiceField
        label="Freight"
        {...words("freightTerm")}
        choices={FREIGHT}
        value={fields.freightTerm}
        onChange={(change) => set({ freightTerm: change.currentTarget.value as FreightTerm })}
        hint={
          fields.freightTerm === "not-known" ? "Costs that need it stay open until it is known." : undefined
        }
      />
      <MoneyField
        label="Freight for an order"
        {...words("freightAmount")}
        currency={sign}
        value={fields.freightAmount ?? ""}
        onMoney={(amount) =>
          set({ freightAmount: amount || null, freightTerm: amount ? "flat" : fields.freightTerm })
        }
      />
      <MoneyField
        label="No freight from"
        {...words("freeFreightFrom")}
        currency={sign}
        value={fields.freeFreightFrom ?? ""}
        onMoney={(amount) => set({ freeFreightFrom: amount || null })}
        hint="Value of the goods. Empty: never free."
      />
      <MoneyField
        label="Handling for an order"
        {...words("handlingFee")}
        currency={sign}
        value={fields.handlingFee}
        onMoney={(amount) => set({ handlingFee: amount || "0" })}
      />
    </div>
  );
}

function SmallOrderFields({ form }: { form: Form<SupplierFields> }) {
  const { fields, set, words } = form;
  const sign = currencySign(fields.currency);
  return (
    <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-4">
      <MoneyField
        label="Minimum order"
        {...words("minimumOrderValue")}
        currency={sign}
        value={fields.minimumOrderValue ?? ""}
        onMoney={(amount) => set({ minimumOrderValue: amount || null })}
        hint="Value of the goods. Empty: none."
      />
      <ChoiceField
        label="An order below it"
        {...words("smallOrderTerm")}
        choices={SMALL_ORDERS}
        value={fields.smallOrderTerm}
        onChange={(change) => set({ smallOrderTerm: change.currentTarget.value as SmallOrderTerm })}
      />
      <MoneyField
        label="Fee for it"
        {...words("smallOrderFee")}
        currency={sign}
        value={fields.smallOrderFee ?? ""}
        onMoney={(amount) => set({ smallOrderFee: amount || null })}
        off={fields.smallOrderTerm !== "fee"}
        hint={fields.smallOrderTerm === "fee" ? undefined : "Only where a fee is added."}
      />
    </div>
  );
}

const NAMES: Record<keyof SupplierFields, string> = {
  name: "Name",
  currency: "Currency",
  freightTerm: "Freight",
  freightAmount: "Freight for an order",
  freeFreightFrom: "No freight from",
  handlingFee: "Handling",
  minimumOrderValue: "Minimum order",
  smallOrderTerm: "An order below it",
  smallOrderFee: "Fee for it",
  leadTimeDays: "Days from order to parcel",
  note: "Note",
};

/** What two people wrote into the same fields, side by side. */
function differences(mine: SupplierFields, theirs: Partial<SupplierFields>): string[] {
  const names = Object.keys(NAMES) as (keyof SupplierFields)[];
  return names
    .filter((name) => mine[name] !== theirs[name])
    .map((name) => `${NAMES[name]}: yours ${mine[name] ?? "not set"}, theirs ${theirs[name] ?? "not set"}.`);
}
