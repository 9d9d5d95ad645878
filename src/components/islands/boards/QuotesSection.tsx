import { useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Pair } from "#src/components/islands/parts/Pair.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { editField } from "#src/components/islands/plan/edit-plan.ts";
import type { QuoteResult, RunResult } from "#src/costing/run-result.ts";
import type { BoardQuoteView } from "#src/server/board-changes.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { BoardsProps } from "./Boards.tsx";
import { EditedQuote } from "./EditedQuote.tsx";
import { QuoteForm } from "./QuoteForm.tsx";
import { QuoteNotes } from "./QuoteNotes.tsx";
import { type QuoteRow, QuoteTable } from "./QuoteTable.tsx";
import { blankQuote } from "./quote-draft.ts";
import { addQuote } from "./quotes-store.ts";

interface QuotesProps {
  props: BoardsProps;
  plan: Plan;
  run: RunResult;
  quotes: readonly BoardQuoteView[];
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
export function QuotesSection({ props, plan, run, quotes }: QuotesProps) {
  const { address, today, canChange, canChoose } = props;
  const [open, setOpen] = useState<"new" | string | null>(quotes.length === 0 && canChange ? "new" : null);
  const rows = rowsOf(run, quotes);
  const edited = quotes.find(({ id }) => id === open);
  const nameOf = (id: unknown) => quotes.find((quote) => quote.id === id)?.boardHouse;
  const choose = (quote: string | null) =>
    editField(address, {
      row: { kind: "run" },
      field: "chosenQuoteId",
      value: quote,
      name: () =>
        quote === null ? "Boards: the cheapest quote is taken." : `Boards: always from ${nameOf(quote)}.`,
    });
  const close = () => setOpen(null);
  return (
    <Pair note={<QuoteNotes {...{ plan, run }} />}>
      <Section
        title={`Quotes for ${countText(run.boards.toOrder ?? run.boards.required)}`}
        aside="landed: with charges and freight, without VAT"
        id="quotes"
        actions={
          canChange && (
            <Button size="small" onClick={() => setOpen("new")}>
              Add a quote
            </Button>
          )
        }
      >
        {open === "new" && (
          <div className="mb-6 border-l-4 border-petrol pl-5">
            <QuoteForm
              first={blankQuote(plan.currency, today, props.width, props.height)}
              version={0}
              action="Add the quote"
              onLeave={quotes.length > 0 ? close : undefined}
              onSave={async (fields) => {
                await addQuote(address, fields);
                close();
              }}
            />
          </div>
        )}
        {edited && <EditedQuote key={edited.id} address={address} quote={edited} onDone={close} />}
        {rows.length > 0 && (
          <QuoteTable
            {...{ rows, today, canChoose, canChange }}
            chosen={plan.boards.chosenQuote}
            reporting={plan.currency}
            onChoose={choose}
            onEdit={({ id }) => setOpen(id)}
          />
        )}
        {rows.length === 0 && !canChange && <p className="type-note py-3">Nobody has quoted yet.</p>}
      </Section>
    </Pair>
  );
}
