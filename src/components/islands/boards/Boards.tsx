import { countText } from "#src/components/amount-text.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import { usePlan } from "#src/components/islands/plan/use-plan.ts";
import { PAIRS } from "#src/components/page-look.ts";
import type { BoardsView } from "#src/server/board-changes.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import { BoardsByRun } from "./BoardsByRun.tsx";
import { boardsAnswer } from "./board-words.ts";
import { HowManyBoards } from "./HowManyBoards.tsx";
import { NextLots } from "./NextLots.tsx";
import { QuotesSection } from "./QuotesSection.tsx";
import { useQuotes } from "./quotes-store.ts";

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
        <QuotesSection {...{ props, plan, run, quotes }} />
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
          <Pair note={<ByRunNote />}>
            <Section title={AT_ANY_RUN} aside="landed, for each board in a kit">
              <BoardsByRun plan={plan} name={AT_ANY_RUN} />
            </Section>
          </Pair>
        )}
      </div>
    </>
  );
}

const AT_ANY_RUN = "A board at any run";

function ByRunNote() {
  return (
    <MarginNote title="Why it steps">
      <p>
        A lot is paid for whole. The last kit that a lot reaches to carries the least of it; the next one
        opens another lot, or another house becomes the cheapest.
      </p>
    </MarginNote>
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
