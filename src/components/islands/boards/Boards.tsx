import { useState } from "react";
import { countText, moneyText } from "#src/components/amount-text.ts";
import { CallFailed } from "#src/components/islands/call.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Dialog } from "#src/components/islands/parts/Dialog.tsx";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { editField } from "#src/components/islands/plan/edit-plan.ts";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import { usePlan } from "#src/components/islands/plan/use-plan.ts";
import { PAIRS } from "#src/components/page-look.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { QuoteResult, RunResult } from "#src/costing/run-result.ts";
import type { BoardQuoteView, BoardsView } from "#src/server/board-changes.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { BoardsByRun } from "./BoardsByRun.tsx";
import { boardsAnswer } from "./board-words.ts";
import { HowManyBoards, NextLots } from "./HowManyBoards.tsx";
import { blankQuote, QuoteForm } from "./QuoteForm.tsx";
import { type QuoteRow, QuoteTable } from "./QuoteTable.tsx";
import { addQuote, changeQuote, removeQuote, useQuotes } from "./quotes-store.ts";

export interface BoardsProps {
  address: KitAddress;
  plan: KitPlan;
  boards: BoardsView;
  /** The kit's board in millimetres, for a new quote. */
  width: string | null;
  height: string | null;
  today: string;
  canChange: boolean;
  canChoose: boolean;
}

/** Who makes a kit's boards, how many are ordered, and what any other number would cost. */
export default function Boards(props: BoardsProps) {
  const { address, canChoose } = props;
  const { held } = usePlan(address);
  const { plan } = held ?? props.plan;
  const quotes = useQuotes(address, props.boards);
  const run = runOf(plan);
  if (!run.boards.needed)
    return <Question question="Who makes the boards?">This kit has no board of its own.</Question>;
  const { deciding, rest } = boardsAnswer(run.boards, plan.currency);
  return (
    <>
      <Question question="Who makes the boards, and how many?">
        <b>{deciding}</b> {rest}
      </Question>
      <div className={PAIRS}>
        <Quotes {...{ props, plan, run, quotes }} />
        <Pair note={<YieldNote />}>
          <Section title="How many to order" aside={`for ${countText(plan.run.kits)} kits`}>
            <HowManyBoards {...{ address, plan, canChoose }} boards={run.boards} />
          </Section>
        </Pair>
        {run.boards.chosen !== null && (
          <Pair>
            <Section title="The next lot" aside="what more boards would really add">
              <NextLots {...{ plan }} boards={run.boards} />
            </Section>
          </Pair>
        )}
        {quotes.length > 0 && (
          <Pair>
            <Section title="A board at any run" aside="landed, for each board in a kit">
              <BoardsByRun plan={plan} />
            </Section>
          </Pair>
        )}
      </div>
    </>
  );
}

function YieldNote() {
  return (
    <MarginNote title="Where faulty boards come from">
      <p>
        A scratch, a missed hole, a board lost while trying. If a house tests every board, 100 of a hundred is
        fair; otherwise count what your earlier runs had.
      </p>
    </MarginNote>
  );
}

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

function Quotes({ props, plan, run, quotes }: QuotesProps) {
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

/** What the chosen quote is made of, and what the reckoning has to say about the others. */
function QuoteNotes({ plan, run }: { plan: Plan; run: RunResult }) {
  const opens = useOpens();
  const chosen = run.boards.quotes.find(({ id }) => id === run.boards.chosen);
  const about = run.problems.filter(({ at }) => at.quote !== undefined);
  return (
    <>
      {chosen?.boards && <MadeOf chosen={chosen} {...opens(`quote:${chosen.id}`)} />}
      {about.length > 0 && (
        <MarginNote title="To settle">
          {about.map((problem) => (
            <p key={problem.code + problem.at.quote}>{problemSentence(problem, plan)}</p>
          ))}
        </MarginNote>
      )}
    </>
  );
}

interface MadeOfProps {
  chosen: QuoteResult;
  open: boolean;
  onOpen: () => void;
  controls: string;
}

function MadeOf({ chosen, open, onOpen, controls }: MadeOfProps) {
  const { currency, ordered, boards, engineering, stencil, freight } = chosen;
  const charges = [
    ["engineering", engineering],
    ["stencil", stencil],
    ["freight", freight ?? "0"],
  ] as const;
  const charged = charges.filter(([, amount]) => /[1-9]/.test(amount));
  const words = charged.map(([name, amount]) => `${name} ${moneyText(amount, currency)}`);
  return (
    <MarginNote title={`${chosen.boardHouse}, landed`}>
      <p>
        {[`${countText(ordered ?? 0)} boards ${moneyText(boards ?? "0", currency)}`, ...words].join(", ")}
        {freight === null ? "; freight is not known" : ""}.
      </p>
      <ShowWorking
        of={`the quote of ${chosen.boardHouse}`}
        open={open}
        onClick={onOpen}
        aria-controls={open ? controls : undefined}
      />
    </MarginNote>
  );
}

function EditedQuote({
  address,
  quote,
  onDone,
}: {
  address: KitAddress;
  quote: BoardQuoteView;
  onDone: () => void;
}) {
  const [asking, setAsking] = useState(false);
  const { id, version, ...first } = quote;
  async function remove() {
    try {
      await removeQuote(address, quote);
      onDone();
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      setAsking(false);
      showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
    }
  }
  return (
    <div className="mb-6 border-l-4 border-petrol pl-5">
      <QuoteForm
        first={first}
        version={version}
        action="Save the quote"
        onLeave={onDone}
        onSave={async (fields, seen) => {
          await changeQuote(address, { id, version: seen }, fields);
          onDone();
        }}
      />
      <Button kind="refuse" size="small" className="mt-4" onClick={() => setAsking(true)}>
        Remove the quote
      </Button>
      <Dialog
        open={asking}
        title={`Remove the quote of ${quote.boardHouse}?`}
        safe={{ label: "Keep it", run: () => setAsking(false) }}
        act={{ label: "Remove it", removes: true, run: () => void remove() }}
      >
        <p>Its lots and charges go with it. If it is chosen, the cheapest of the others is taken.</p>
      </Dialog>
    </div>
  );
}
