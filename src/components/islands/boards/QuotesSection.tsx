import { useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Later } from "#src/components/islands/parts/Later.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";
import { Pair } from "#src/components/islands/parts/Pair.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { editField } from "#src/components/islands/plan/edit-plan.ts";
import type { QuoteResult, RunResult } from "#src/costing/run-result.ts";
import type { BoardQuoteView } from "#src/server/board-changes.ts";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { BegunQuote, BoardsProps } from "./Boards.tsx";
import { blankQuote } from "./blank-quote.ts";
import { quoteName } from "./board-words.ts";
import type { EditedQuoteProps } from "./EditedQuote.tsx";
import type { QuoteFormProps } from "./QuoteForm.tsx";
import { QuoteNotes } from "./QuoteNotes.tsx";
import { type QuoteRow, QuoteTable } from "./QuoteTable.tsx";
import { addQuote } from "./quotes-store.ts";

const QuoteForm = laterPart<QuoteFormProps>(async () => (await import("./QuoteForm.tsx")).QuoteForm);
const EditedQuote = laterPart<EditedQuoteProps>(async () => (await import("./EditedQuote.tsx")).EditedQuote);

interface QuotesProps {
  props: BoardsProps;
  plan: Plan;
  run: RunResult;
  quotes: readonly BoardQuoteView[];
  /** A quote that is being written down, with what was known of it; null: none. */
  begun: BegunQuote | null;
  onBegin: (known: Partial<BoardQuoteFields> | null) => void;
}

/** The cheapest first; what cannot be used comes last. */
function rowsOf(run: RunResult, quotes: readonly BoardQuoteView[]): QuoteRow[] {
  const rows = run.boards.quotes.flatMap((result): QuoteRow[] => {
    const quote = quotes.find(({ id }) => id === result.id);
    return quote ? [{ quote, result }] : [];
  });
  const cost = ({ landed }: QuoteResult) => (landed.known ? Number(landed.value) : Number.POSITIVE_INFINITY);
  return rows.sort((a, b) => cost(a.result) - cost(b.result));
}

/** Board houses side by side, and the forms to add a quote or change one. */
export function QuotesSection({ props, plan, run, quotes, begun, onBegin }: QuotesProps) {
  const { address, today, canChange, canChoose } = props;
  const [open, setOpen] = useState<string | null>(null);
  const rows = rowsOf(run, quotes);
  const edited = begun ? undefined : quotes.find(({ id }) => id === open);
  const nameOf = (id: unknown) => {
    const found = run.boards.quotes.find((quote) => quote.id === id);
    return found && quoteName(found);
  };
  const choose = (quote: string | null) =>
    editField(address, {
      row: { kind: "run" },
      field: "chosenQuoteId",
      value: quote,
      name: () =>
        quote === null ? "Boards: the cheapest quote is taken." : `Boards: always from ${nameOf(quote)}.`,
    });
  const close = () => {
    setOpen(null);
    onBegin(null);
  };
  return (
    <Pair note={<QuoteNotes {...{ plan, run }} />}>
      <Section
        title={`Quotes for ${countText(run.boards.toOrder ?? run.boards.required)}`}
        aside="landed: with charges and freight, without VAT"
        id="quotes"
        actions={
          canChange && (
            <Button size="small" onClick={() => onBegin({})}>
              Add a quote
            </Button>
          )
        }
      >
        {begun && (
          <div className="mb-6 border-l-4 border-petrol pl-5">
            <Later
              key={begun.key}
              part={QuoteForm}
              give={{
                first: { ...blankQuote(plan.currency, today, props.width, props.height), ...begun.known },
                version: 0,
                action: "Add the quote",
                takesFocus: begun.key > 0,
                onLeave: quotes.length > 0 ? close : undefined,
                onSave: async (fields) => {
                  await addQuote(address, fields);
                  close();
                },
              }}
              what="A quote"
              rows={8}
            />
          </div>
        )}
        {edited && (
          <Later
            key={edited.id}
            part={EditedQuote}
            give={{ address, quote: edited, onDone: close }}
            what={`The quote of ${edited.boardHouse}`}
            rows={8}
          />
        )}
        {rows.length > 0 && (
          <QuoteTable
            {...{ rows, today, canChoose, canChange }}
            chosen={plan.boards.chosenQuote}
            reporting={plan.currency}
            onChoose={choose}
            onEdit={({ id }) => {
              close();
              setOpen(id);
            }}
          />
        )}
        {rows.length === 0 && !canChange && <p className="type-note py-3">Nobody has quoted yet.</p>}
      </Section>
    </Pair>
  );
}
