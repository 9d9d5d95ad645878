import { currencySign } from "#src/components/amount-text.ts";
import type { Form } from "#src/components/islands/forms/use-form.ts";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { CURRENCY_CHOICES } from "#src/components/islands/supply/currency-choices.ts";
import type { QuoteDraft } from "./quote-draft.ts";

const ROW = "grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-4";

/** Who quotes, in what currency, and how soon it is here. */
export function WhoFields({ form: { fields, set, words } }: { form: Form<QuoteDraft> }) {
  return (
    <div className={ROW}>
      <TextField
        label="Board house"
        {...words("boardHouse")}
        autoComplete="off"
        value={fields.boardHouse}
        onChange={(change) => set({ boardHouse: change.currentTarget.value })}
      />
      <ChoiceField
        label="Priced in"
        {...words("currency")}
        choices={CURRENCY_CHOICES}
        value={fields.currency}
        onChange={(change) => set({ currency: change.currentTarget.value })}
      />
      <MeasureField
        label="Made and sent in"
        {...words("leadTimeDays")}
        unit="days"
        value={fields.leadTimeDays}
        onMeasure={(leadTimeDays) => set({ leadTimeDays })}
        hint="Empty: not known."
      />
    </div>
  );
}

/** What is charged beside the boards, and when it was quoted. */
export function ChargeFields({ form: { fields, set, words } }: { form: Form<QuoteDraft> }) {
  const currency = currencySign(fields.currency);
  return (
    <div className={ROW}>
      <MoneyField
        label="Engineering charge"
        {...{ currency }}
        {...words("engineeringCharge")}
        value={fields.engineeringCharge}
        onMoney={(amount) => set({ engineeringCharge: amount || "0" })}
      />
      <MoneyField
        label="Stencil"
        {...{ currency }}
        {...words("stencilCharge")}
        value={fields.stencilCharge}
        onMoney={(amount) => set({ stencilCharge: amount || "0" })}
      />
      <MoneyField
        label="Freight"
        {...{ currency }}
        {...words("freight")}
        value={fields.freight ?? ""}
        onMoney={(amount) => set({ freight: amount || null })}
        hint="0 if it is free. Empty: not known, and the cost stays open."
      />
      <TextField
        label="Quoted on"
        {...words("pricedOn")}
        type="date"
        value={fields.pricedOn ?? ""}
        onChange={(change) => set({ pricedOn: change.currentTarget.value || null })}
      />
    </div>
  );
}

/** The board the quote is for. */
export function BoardFields({ form: { fields, set, words } }: { form: Form<QuoteDraft> }) {
  return (
    <div className={ROW}>
      <MeasureField
        label="Width"
        {...words("width")}
        unit="mm"
        value={fields.width ?? ""}
        onMeasure={(width) => set({ width: width || null })}
      />
      <MeasureField
        label="Height"
        {...words("height")}
        unit="mm"
        value={fields.height ?? ""}
        onMeasure={(height) => set({ height: height || null })}
      />
      <MeasureField
        label="Copper"
        {...words("layers")}
        unit="layers"
        value={fields.layers}
        onMeasure={(layers) => set({ layers })}
      />
      <TextField
        label="Valid until"
        {...words("validUntil")}
        type="date"
        value={fields.validUntil ?? ""}
        onChange={(change) => set({ validUntil: change.currentTarget.value || null })}
      />
      <TextField
        label="Finish"
        {...words("finish")}
        value={fields.finish}
        onChange={(change) => set({ finish: change.currentTarget.value })}
      />
      <TextField
        label="Colour"
        {...words("colour")}
        value={fields.colour}
        onChange={(change) => set({ colour: change.currentTarget.value })}
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
