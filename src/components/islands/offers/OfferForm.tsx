import { FormFaults } from "#src/components/islands/forms/FormFaults.tsx";
import { type Form, useForm } from "#src/components/islands/forms/use-form.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { CURRENCY_CHOICES } from "#src/components/islands/supply/currency-choices.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import type { PriceModel } from "#src/shapes/limits.ts";
import type { OfferFields } from "#src/shapes/offer.ts";
import { LadderEditor, type RungDraft, rungDrafts, rungsOf } from "./LadderEditor.tsx";

/** The form's own fields: numbers as text while they are typed. */
type Draft = Omit<
  OfferFields,
  "breaks" | "minimumOrder" | "orderMultiple" | "stockShown" | "leadTimeDays"
> & {
  breaks: RungDraft[];
  minimumOrder: string;
  orderMultiple: string;
  stockShown: string;
  leadTimeDays: string;
};

const MODELS: readonly { value: PriceModel; label: string }[] = [
  { value: "whole-order", label: "The whole order" },
  { value: "by-slice", label: "Each slice" },
  { value: "lots", label: "A lot" },
];

function draftOf(offer: OfferFields): Draft {
  const text = (value: number | null) => (value === null ? "" : String(value));
  return {
    ...offer,
    breaks: rungDrafts(offer.breaks),
    minimumOrder: text(offer.minimumOrder),
    orderMultiple: text(offer.orderMultiple),
    stockShown: text(offer.stockShown),
    leadTimeDays: text(offer.leadTimeDays),
  };
}

function fieldsOf(draft: Draft): OfferFields {
  const whole = (text: string) => (text === "" ? null : Number(text));
  return {
    ...draft,
    breaks: rungsOf(draft.breaks),
    minimumOrder: whole(draft.minimumOrder) ?? 1,
    orderMultiple: whole(draft.orderMultiple) ?? 1,
    stockShown: whole(draft.stockShown),
    leadTimeDays: whole(draft.leadTimeDays),
  };
}

/** What may be set of an offer that stands. */
export function offerFields({ id: _, partId: __, version: ___, ...fields }: OfferView): OfferFields {
  return fields;
}

/** An offer of a supplier about which nothing is written down yet. */
export function blankOffer(supplier: SupplierView | undefined, today: string): OfferFields {
  return {
    supplierId: supplier?.id ?? "",
    orderCode: "",
    currency: supplier?.currency ?? "EUR",
    priceModel: "whole-order",
    breaks: [],
    minimumOrder: 1,
    orderMultiple: 1,
    stockShown: null,
    leadTimeDays: null,
    pricedOn: today,
    validUntil: null,
    note: "",
  };
}

interface OfferFormProps {
  first: OfferFields;
  version: number;
  suppliers: readonly SupplierView[];
  /** Where a supplier that is not in the list can be added. */
  suppliersHref: string;
  action: string;
  onSave: (fields: OfferFields, version: number) => Promise<void>;
  onLeave: () => void;
}

/** One supplier's offer for one part: its ladder, order quantities, stock, dates. */
export function OfferForm(props: OfferFormProps) {
  const { first, version, suppliers, suppliersHref, action, onSave, onLeave } = props;
  const form = useForm(draftOf(first), version, (draft, seen) => onSave(fieldsOf(draft), seen));
  return (
    <form onSubmit={form.submit} noValidate className="flex flex-col gap-6">
      <FormFaults form={form} title="The offer is not saved" />
      <WhoFields {...{ form, suppliers, suppliersHref }} />
      <LadderEditor form={form} />
      <OrderFields form={form} />
      <div className="flex flex-wrap items-center gap-5">
        <Button type="submit" busy={form.busy} busyWord="Saving">
          {action}
        </Button>
        <QuietButton onClick={onLeave}>Leave it</QuietButton>
      </div>
    </form>
  );
}

type WhoProps = { form: Form<Draft> } & Pick<OfferFormProps, "suppliers" | "suppliersHref">;

function WhoFields({ form, suppliers, suppliersHref }: WhoProps) {
  const { fields, set, words } = form;
  const supplier = suppliers.find(({ id }) => id === fields.supplierId);
  const other = supplier && supplier.currency !== fields.currency;
  return (
    <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-4">
      <ChoiceField
        label="Supplier"
        {...words("supplierId")}
        choices={suppliers.map(({ id, name }) => ({ value: id, label: name }))}
        value={fields.supplierId}
        onChange={(change) => {
          const chosen = suppliers.find(({ id }) => id === change.currentTarget.value);
          set({ supplierId: change.currentTarget.value, currency: chosen?.currency ?? fields.currency });
        }}
        hint={<a href={suppliersHref}>Another supplier</a>}
      />
      <TextField
        label="Their order code"
        {...words("orderCode")}
        autoComplete="off"
        value={fields.orderCode}
        onChange={(change) => set({ orderCode: change.currentTarget.value })}
      />
      <ChoiceField
        label="Priced in"
        {...words("currency")}
        choices={CURRENCY_CHOICES}
        value={fields.currency}
        onChange={(change) => set({ currency: change.currentTarget.value })}
        hint={
          other
            ? `${supplier.name} invoices in ${supplier.currency}; an offer in ${fields.currency} is not used.`
            : undefined
        }
      />
      <ChoiceField
        label="A price holds for"
        {...words("priceModel")}
        choices={MODELS}
        value={fields.priceModel}
        onChange={(change) => set({ priceModel: change.currentTarget.value as PriceModel })}
      />
    </div>
  );
}

type NumberName = "minimumOrder" | "orderMultiple" | "stockShown" | "leadTimeDays";
const NUMBERS: readonly { name: NumberName; label: string; unit: string; hint?: string }[] = [
  { name: "minimumOrder", label: "Minimum order", unit: "pieces" },
  { name: "orderMultiple", label: "Sold in multiples of", unit: "pieces" },
  { name: "stockShown", label: "Stock shown", unit: "pieces", hint: "Empty: not shown." },
  { name: "leadTimeDays", label: "Lead time", unit: "days", hint: "Empty: the supplier’s usual." },
];

function OrderFields({ form }: { form: Form<Draft> }) {
  const { fields, set, words } = form;
  return (
    <div className="grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-4">
      {NUMBERS.map(({ name, label, unit, hint }) => (
        <MeasureField
          key={name}
          {...{ label, unit, hint }}
          {...words(name)}
          value={fields[name]}
          onMeasure={(value) => set({ [name]: value } as Partial<Draft>)}
        />
      ))}
      <TextField
        label="Price seen on"
        {...words("pricedOn")}
        type="date"
        value={fields.pricedOn ?? ""}
        onChange={(change) => set({ pricedOn: change.currentTarget.value || null })}
      />
      <TextField
        label="Valid until"
        {...words("validUntil")}
        type="date"
        value={fields.validUntil ?? ""}
        onChange={(change) => set({ validUntil: change.currentTarget.value || null })}
        hint="Empty: no end stated."
      />
      <TextField
        label="Note"
        {...words("note")}
        value={fields.note}
        onChange={(change) => set({ note: change.currentTarget.value })}
        className="tablet:col-span-2"
      />
    </div>
  );
}
