import { countText, moneyText } from "#src/components/amount-text.ts";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { QuoteResult, RunResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { quoteName } from "./board-words.ts";

/** What the chosen quote is made of, and what the reckoning has to say about the others. */
export function QuoteNotes({ plan, run }: { plan: Plan; run: RunResult }) {
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
  const { currency, pieces, boardsPerPiece, boards, engineering, stencil, freight } = chosen;
  const charges = [
    ["engineering", engineering],
    ["stencil", stencil],
    ["freight", freight ?? "0"],
  ] as const;
  const charged = charges.filter(([, amount]) => /[1-9]/.test(amount));
  const words = charged.map(([name, amount]) => `${name} ${moneyText(amount, currency)}`);
  return (
    <MarginNote title={`${quoteName(chosen)}, landed`}>
      <p>
        {[
          `${countText(pieces ?? 0)} ${boardsPerPiece > 1 ? "panels" : "boards"} ${moneyText(boards ?? "0", currency)}`,
          ...words,
        ].join(", ")}
        {freight === null ? "; freight is not known" : ""}.
      </p>
      <ShowWorking
        of={`the quote of ${quoteName(chosen)}`}
        open={open}
        onClick={onOpen}
        aria-controls={open ? controls : undefined}
      />
    </MarginNote>
  );
}
