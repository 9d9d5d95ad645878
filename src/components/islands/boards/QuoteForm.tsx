import { FormFaults } from "#src/components/islands/forms/FormFaults.tsx";
import { useFirstFocus } from "#src/components/islands/forms/first-focus.ts";
import { useForm } from "#src/components/islands/forms/use-form.ts";
import { LadderEditor } from "#src/components/islands/offers/LadderEditor.tsx";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";
import { FormulaFields, PieceFields } from "./PieceFields.tsx";
import { BoardFields, ChargeFields, WhoFields } from "./QuoteFields.tsx";
import { quoteDraft, quoteFields } from "./quote-draft.ts";

export interface QuoteFormProps {
  first: BoardQuoteFields;
  version: number;
  action: string;
  onSave: (fields: BoardQuoteFields, version: number) => Promise<void>;
  onLeave?: () => void;
  /** Opened by a press: focus goes to its first field. */
  takesFocus?: boolean;
}

/** A board house's quote: singly or in panels, lots, breaks or formula, charges, freight, and the board it is for. */
export function QuoteForm({ first, version, action, onSave, onLeave, takesFocus }: QuoteFormProps) {
  const form = useForm(quoteDraft(first), version, (draft, seen) => onSave(quoteFields(draft), seen));
  const box = useFirstFocus(takesFocus === true);
  return (
    <form ref={box} onSubmit={form.submit} noValidate className="flex flex-col gap-6">
      <FormFaults form={form} title="The quote is not saved" />
      <WhoFields form={form} />
      <PieceFields form={form} />
      {form.fields.priceModel === "formula" ? (
        <FormulaFields form={form} />
      ) : (
        <LadderEditor form={form} things={form.fields.boardsPerPanel === null ? undefined : "panels"} />
      )}
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
