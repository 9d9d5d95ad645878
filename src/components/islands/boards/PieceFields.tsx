import { currencySign } from "#src/components/amount-text.ts";
import type { Form } from "#src/components/islands/forms/use-form.ts";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import type { BoardPriceModel } from "#src/shapes/limits.ts";
import type { QuoteDraft } from "./quote-draft.ts";

const ROW = "grid gap-x-6 gap-y-5 tablet:grid-cols-2 desktop:grid-cols-4";

const COME = [
  { value: "singly", label: "Singly" },
  { value: "panels", label: "In panels" },
] as const;

/** How a house prices what it makes. */
const MODELS: readonly { value: BoardPriceModel; label: string }[] = [
  { value: "lots", label: "In lots" },
  { value: "whole-order", label: "Each, by breaks" },
  { value: "formula", label: "By formula" },
];

/** Whether boards come singly or in panels, of how many and what size, and how they are priced. */
export function PieceFields({ form: { fields, set, words } }: { form: Form<QuoteDraft> }) {
  const panelled = fields.boardsPerPanel !== null;
  const side = (field: "panelWidth" | "panelHeight", label: string) => (
    <MeasureField
      label={label}
      {...words(field)}
      unit="mm"
      value={fields[field] ?? ""}
      onMeasure={(value) => set({ [field]: value || null })}
      hint={fields.priceModel === "formula" ? "Its area is priced." : "As quoted. Empty: not stated."}
    />
  );
  return (
    <div className={ROW}>
      <ChoiceField
        label="Boards come"
        choices={COME}
        value={panelled ? "panels" : "singly"}
        onChange={(change) => set({ boardsPerPanel: change.currentTarget.value === "panels" ? "" : null })}
      />
      <ChoiceField
        label="Sold"
        {...words("priceModel")}
        choices={MODELS}
        value={fields.priceModel}
        onChange={(change) => set({ priceModel: change.currentTarget.value as BoardPriceModel })}
      />
      {panelled && (
        <>
          <MeasureField
            label="On a panel"
            {...words("boardsPerPanel")}
            unit="boards"
            value={fields.boardsPerPanel ?? ""}
            onMeasure={(boardsPerPanel) => set({ boardsPerPanel })}
          />
          <MoneyField
            label="Depanelling"
            {...words("depanelling")}
            currency={currencySign(fields.currency)}
            unit="a board"
            places={4}
            value={fields.depanelling}
            onMoney={(amount) => set({ depanelling: amount || "0" })}
            hint="0 if you break them out yourself."
          />
          {side("panelWidth", "Panel, one side")}
          {side("panelHeight", "Panel, other side")}
        </>
      )}
    </div>
  );
}

const UNITS = [
  { value: "dm2", label: "dm², 100 cm²" },
  { value: "m2", label: "m²" },
] as const;

/** The terms of a formula: once, for the area, and for every board. */
export function FormulaFields({ form: { fields, set, words } }: { form: Form<QuoteDraft> }) {
  const currency = currencySign(fields.currency);
  return (
    <div className={ROW}>
      <MoneyField
        label="Set-up, once"
        {...{ currency }}
        {...words("setUp")}
        value={fields.setUp ?? ""}
        onMoney={(amount) => set({ setUp: amount || null })}
      />
      <MoneyField
        label="Rate for the area"
        {...{ currency }}
        {...words("areaRate")}
        places={4}
        value={fields.areaRate ?? ""}
        onMoney={(amount) => set({ areaRate: amount || null })}
      />
      <ChoiceField
        label="The rate is for a"
        {...words("areaUnit")}
        choices={UNITS}
        value={fields.areaUnit ?? "dm2"}
        onChange={(change) => set({ areaUnit: change.currentTarget.value === "m2" ? "m2" : "dm2" })}
      />
      <MoneyField
        label="For every board"
        {...{ currency }}
        {...words("perBoard")}
        places={4}
        value={fields.perBoard ?? ""}
        onMoney={(amount) => set({ perBoard: amount || null })}
      />
    </div>
  );
}
