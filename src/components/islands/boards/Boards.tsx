import { useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import type { BoardPicture } from "#src/components/board-picture.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import { usePlan } from "#src/components/islands/plan/use-plan.ts";
import { PAIRS } from "#src/components/page-look.ts";
import type { BoardsView } from "#src/server/board-changes.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";
import { BoardsByRun } from "./BoardsByRun.tsx";
import { boardsAnswer } from "./board-words.ts";
import { HowManyBoards } from "./HowManyBoards.tsx";
import { NextLots } from "./NextLots.tsx";
import { PanelSection } from "./PanelSection.tsx";
import { QuotesSection } from "./QuotesSection.tsx";
import { useBoards } from "./quotes-store.ts";
import { SinglyOrPanels } from "./SinglyOrPanels.tsx";

export interface BoardsProps {
  address: KitAddress;
  plan: KitPlan;
  boards: BoardsView;
  /** The kit's board in millimetres, for a new quote, and as it is drawn. */
  width: string | null;
  height: string | null;
  picture: BoardPicture | null;
  today: string;
  canChange: boolean;
  canChoose: boolean;
}

/** A quote begun elsewhere on the page, with what is known of it; another key is another beginning. */
export interface BegunQuote {
  key: number;
  known: Partial<BoardQuoteFields>;
}

/** Who makes a kit's boards, how many are ordered, and what any other number would cost. */
export default function Boards(props: BoardsProps) {
  const { address, canChoose } = props;
  const { held } = usePlan(address);
  const { plan } = held ?? props.plan;
  const { quotes, panelTerms } = useBoards(address, props.boards);
  const first = quotes.length === 0 && props.canChange ? { key: 0, known: {} } : null;
  const [begun, setBegun] = useState<BegunQuote | null>(first);
  const begin = (known: Partial<BoardQuoteFields> | null) =>
    setBegun((before) => known && { key: (before?.key ?? 0) + 1, known });
  const run = runOf(plan);
  if (!run.boards.needed)
    return <Question question="Who makes the boards?">This kit has no board of its own.</Question>;
  const { deciding, rest } = boardsAnswer(run.boards, plan.currency);
  const panelled = run.boards.quotes.some(({ boardsPerPiece }) => boardsPerPiece > 1);
  const inPanels = panelled || panelTerms.length > 0;
  return (
    <>
      <Question
        question={
          inPanels ? "Who makes the boards, and how many to a panel?" : "Who makes the boards, and how many?"
        }
      >
        <b>{deciding}</b> {rest}
      </Question>
      <div className={PAIRS}>
        <PanelSection
          {...{ address, plan, run, canChange: props.canChange, picture: props.picture }}
          terms={panelTerms}
          onQuote={begin}
        />
        <QuotesSection {...{ props, plan, run, quotes, begun }} onBegin={begin} />
        {panelled && (
          <Pair note={<PanelsPayNote />}>
            <Section title="Singly or in panels" aside={`for ${countText(plan.run.kits)} kits, landed`}>
              <SinglyOrPanels {...{ plan, run }} />
            </Section>
          </Pair>
        )}
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

function PanelsPayNote() {
  return (
    <MarginNote title="Why it can change back">
      <p>
        Panels are paid for whole: with the first board of another panel they cost more by a panel, single
        boards by a board. Setting up is paid once, so the larger the run, the less it weighs.
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
