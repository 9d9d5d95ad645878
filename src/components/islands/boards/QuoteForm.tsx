import { currencySign } from "#src/components/amount-text.ts";
import { FormFaults } from "#src/components/islands/forms/FormFaults.tsx";
import { type Form, useForm } from "#src/components/islands/forms/use-form.ts";
import {
  LadderEditor,
  type RungDraft,
  rungDrafts,
  rungsOf,
} from "#src/components/islands/offers/LadderEditor.tsx";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { CURRENCY_CHOICES } from "#src/components/islands/supply/SupplierForm.tsx";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";
import type { BoardPriceModel } from "#src/shapes/limits.ts";

type Draft = Omit<BoardQuoteFields, "breaks" | "layers" | "leadTimeDays"> & {
  breaks: RungDraft[];
  layers: string;
  leadTimeDays: string;
};

const MODELS: readonly { value: BoardPriceModel; label: string }[] = [
  { value: "lots", label: "Lots at a fixed price" },
  { value: "whole-order", label: "Each board, at the break reached" },
];

/** A quote of which nothing is written down; its board is the kit's. */
export function blankQuote(
  currency: string,
  today: string,
  width: string | null,
  height: string | null,
): BoardQuoteFields {
  return {
    boardHouse: "",
    currency,
    width,
    height,
    layers: 2,
    finish: "",
    colour: "",
    priceModel: "lots",
    breaks: [],
    engineeringCharge: "0",
    stencilCharge: "0",
    freight: null,
    leadTimeDays: null,
    pricedOn: today,
    validUntil: null,
    note: "",
  };
}

function draftOf(quote: BoardQuoteFields): Draft {
  return {
    ...quote,
    breaks: rungDrafts(quote.breaks),
    layers: quote.layers === null ? "" : String(quote.layers),
    leadTimeDays: quote.leadTimeDays === null ? "" : String(quote.leadTimeDays),
  };
}

function fieldsOf(draft: Draft): BoardQuoteFields {
  const whole = (text: string) => (text === "" ? null : Number(text));
  return {
    ...draft,
    breaks: rungsOf(draft.breaks),
    layers: whole(draft.layers),
    leadTimeDays: whole(draft.leadTimeDays),
  };
}

interface QuoteFormProps {
  first: BoardQuoteFields;
  version: number;
  action: string;
  onSave: (fields: BoardQuoteFields, version: number) => Promise<void>;
  onLeave?: () => void;
}

/** A board house's quote: lots or breaks, charges, freight, and the board it is for. */
export function QuoteForm({ first, version, action, onSave, onLeave }: QuoteFormProps) {
  const form = useForm(draftOf(first), version, (draft, seen) => onSave(fieldsOf(draft), seen));
  return (
    <form onSubmit={form.submit} noValidate className="flex flex-col gap-6">
      <FormFaults form={form} title="The quote is not saved" />
      <WhoFields form={form} />
      <LadderEditor form={form} />
      <ChargeFields form={form} />
      <BoardFields form={form} />
      <div className="flex flex-wrap items-center gap-5">
        <Button type="submit" busy={form.busy} busyWord="Saving">
          {action}
        </Button>
        {onLeave && <QuietButton onClick={onLeave}>Leave it</QuietButton>}
      </div>
    </form>
  );
}

const ROW = "grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-4";

function WhoFields({ form: { fields, set, words } }: { form: Form<Draft> }) {
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
      <ChoiceField
        label="Boards are sold as"
        {...words("priceModel")}
        choices={MODELS}
        value={fields.priceModel}
        onChange={(change) => set({ priceModel: change.currentTarget.value as BoardPriceModel })}
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

function ChargeFields({ form: { fields, set, words } }: { form: Form<Draft> }) {
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

function BoardFields({ form: { fields, set, words } }: { form: Form<Draft> }) {
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
