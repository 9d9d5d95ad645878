import { useMemo, useState } from "react";
import { type BoardPicture, boardInWords } from "#src/components/board-picture.ts";
import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { FilterGroup } from "#src/components/islands/parts/FilterGroup.tsx";
import { Later } from "#src/components/islands/parts/Later.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";
import { Pair } from "#src/components/islands/parts/Pair.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import type { RunResult } from "#src/costing/run-result.ts";
import type { PanelTermsView } from "#src/server/panel-terms-changes.ts";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { EditedPanelTermsProps } from "./EditedPanelTerms.tsx";
import { PanelNotes } from "./PanelNotes.tsx";
import { firstHouse, panelView } from "./panel-view.ts";
import { ShownPanels } from "./ShownPanels.tsx";
import type { WhyNoPanelProps } from "./WhyNoPanel.tsx";

const EditedPanelTerms = laterPart<EditedPanelTermsProps>(
  async () => (await import("./EditedPanelTerms.tsx")).EditedPanelTerms,
);

const WhyNoPanel = laterPart<WhyNoPanelProps>(async () => (await import("./WhyNoPanel.tsx")).WhyNoPanel);

export interface PanelSectionProps {
  address: KitAddress;
  plan: Plan;
  run: RunResult;
  terms: readonly PanelTermsView[];
  picture: BoardPicture | null;
  canChange: boolean;
  /** Begins a quote with what is known of it. */
  onQuote: (known: Partial<BoardQuoteFields>) => void;
}

/** Which house's panels are shown, which of them is drawn, and whether their form is open. */
function usePanelState(plan: Plan, run: RunResult) {
  const [asked, setAsked] = useState<string | null>(null);
  const [open, setOpen] = useState<"new" | "change" | null>(null);
  const [count, setCount] = useState<number | null>(null);
  const there = plan.boards.panelTerms.some(({ boardHouse }) => boardHouse === asked);
  const house = there ? asked : firstHouse(plan, run);
  const view = useMemo(
    () => (house === null ? null : panelView(plan, run, house, count)),
    [plan, run, house, count],
  );
  const show = (boardHouse: string) => {
    setAsked(boardHouse);
    setCount(null);
    setOpen(null);
  };
  return { house, view, open, setOpen, setCount, show };
}

/** The panel to scale: what fits on a house's panels, drawn, with the measures and how much of it is board. */
export function PanelSection(props: PanelSectionProps) {
  const { address, plan, run, terms, canChange } = props;
  const { house, view, open, setOpen, setCount, show } = usePanelState(plan, run);
  return (
    <Pair note={view && open === null && <PanelNotes {...{ plan, view }} />}>
      <Section
        title="The panel, to scale"
        aside={asideOf(plan, house)}
        id="panel"
        actions={canChange && house !== null && open === null && <Ways house={house} onOpen={setOpen} />}
      >
        {open !== null && (
          <div className="mb-6 border-l-4 border-petrol pl-5">
            <Later
              key={`${open} ${house}`}
              part={EditedPanelTerms}
              give={{
                address,
                terms: open === "change" ? (terms.find((one) => one.boardHouse === house) ?? null) : null,
                boardHouse: houseWithout(plan),
                onLeave: () => setOpen(null),
                onSaved: show,
              }}
              what="The panels"
              rows={6}
            />
          </div>
        )}
        {house !== null && <Houses {...{ plan, house, onChoose: show }} />}
        {house === null && open === null && <NoTerms canChange={canChange} onBegin={() => setOpen("new")} />}
        {plan.boards.size === null && <NoSize address={address} />}
        {house !== null && view === null && plan.boards.size !== null && (
          <Later part={WhyNoPanel} give={{ plan, house }} what="Why no panel can be made" rows={1} />
        )}
        {view && <ShownPanels {...props} view={view} onCount={setCount} />}
      </Section>
    </Pair>
  );
}

/** "board 58 × 42 mm, largest panel at Kilnside 250 × 200 mm". */
function asideOf({ boards: { size, panelTerms } }: Plan, house: string | null): string {
  const of = panelTerms.find(({ boardHouse }) => boardHouse === house);
  const words = [
    size
      ? `board ${boardInWords({ shape: size.shape, widthMm: Number(size.width), heightMm: Number(size.height) })}`
      : "",
    of ? `largest panel at ${of.boardHouse} ${of.largest.width} × ${of.largest.height}\u00a0mm` : "",
  ];
  return words.filter(Boolean).join(", ");
}

function Houses({
  plan: {
    boards: { panelTerms },
  },
  house,
  onChoose,
}: {
  plan: Plan;
  house: string;
  onChoose: (house: string) => void;
}) {
  if (panelTerms.length < 2) return null;
  const choices = panelTerms.map(({ boardHouse }) => ({ value: boardHouse, label: boardHouse }));
  return (
    <div className="mb-4">
      <FilterGroup label="Panels of" value={house} {...{ choices, onChoose }} />
    </div>
  );
}

function Ways({ house, onOpen }: { house: string; onOpen: (open: "new" | "change") => void }) {
  return (
    <span data-screen-only className="flex flex-wrap items-center gap-x-5">
      <QuietButton onClick={() => onOpen("change")} aria-label={`Change the panels of ${house}`}>
        Change
      </QuietButton>
      <QuietButton onClick={() => onOpen("new")}>Add another house's</QuietButton>
    </span>
  );
}

/** A house that quotes and whose panels are not written down; else none. */
function houseWithout({ boards: { quotes, panelTerms } }: Plan): string {
  const known = new Set(panelTerms.map(({ boardHouse }) => boardHouse));
  const first = quotes.find(
    ({ boardsPerPanel, boardHouse }) => boardsPerPanel !== null && !known.has(boardHouse),
  );
  return (first ?? quotes.find(({ boardHouse }) => !known.has(boardHouse)))?.boardHouse ?? "";
}

function NoTerms({ canChange, onBegin }: { canChange: boolean; onBegin: () => void }) {
  return (
    <div className="py-2">
      <p>
        Nothing yet. Write down what a board house makes panels like, and how many boards fit is laid out
        here.
      </p>
      {canChange && (
        <Button size="small" className="mt-3" onClick={onBegin}>
          Write down a house's panels
        </Button>
      )}
    </div>
  );
}

function NoSize({ address }: { address: KitAddress }) {
  return (
    <p className="py-2">
      A panel can be laid out when the board's size is known.{" "}
      <a href={kitPath(address, "/details")}>Write the board's size</a>
    </p>
  );
}
