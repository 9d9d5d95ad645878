import { useEffect, useRef, useState } from "react";
import { RULER_LEAST, RULER_MOST, RUN_LEAST, RUN_MOST } from "#src/shapes/limits.ts";
import { RunBands } from "./Bands.tsx";
import { CellFigure } from "./CellFigure.tsx";
import { Change, type ChangeProps } from "./Change.tsx";
import type { FiguresSheetProps } from "./FiguresSheet.tsx";
import { BusyIcon, UpIcon } from "./Icons.tsx";
import { Later } from "./Later.tsx";
import { laterPart } from "./later-part.ts";
import { Ruler } from "./Ruler.tsx";
import { Stepper } from "./Stepper.tsx";
import { TallyNoteLine } from "./TallyNoteLine.tsx";

export type TallyCell = {
  key: string;
  /** "Cost per kit". */
  label: string;
  /** As written: "€14.95". Null when not known; then `needs` says what is missing. */
  value: string | null;
  /** "needs parts", "not set". */
  needs?: string;
  /** Where it is entered. */
  needsHref?: string;
  /** A word after the figure: "sold". */
  after?: string;
  change?: ChangeProps;
  /** The page a figure leads to that does not open. */
  href?: string;
  onOpen?: () => void;
  open?: boolean;
  /** Stands in the phone's bar; the others are in its sheet. */
  onPhone?: boolean;
};

export type TallyNote = {
  /** The edit, in bold: "Run changed from 100 to 120." */
  edit: string;
  /** "Signed figures show the change." */
  text?: string;
  actions?: readonly { label: string; run: () => void }[];
};

export type TallyStripProps = {
  run: number;
  onRun: (kits: number) => void;
  /** Who may not change the run sees it without keys and ruler. */
  fixed?: boolean;
  sweetSpots?: readonly number[];
  cells: readonly TallyCell[];
  note?: TallyNote;
  /** Over 150 ms: figures stay, in grey, with a ring. */
  workingOut?: boolean;
  /** Said once, politely, after a change: "Cost per kit €14.95, €2.14 less." */
  announce?: string;
};

/** A phone fetches it when it is asked for, a wide screen never. */
const FiguresSheet = laterPart<FiguresSheetProps>(
  async () => (await import("./FiguresSheet.tsx")).FiguresSheet,
);

/** The answers of the chosen run, in view on every page of a kit: at the top, on a phone at the bottom. */
export function TallyStrip({
  run,
  onRun,
  fixed,
  sweetSpots,
  cells,
  note,
  workingOut,
  announce,
}: TallyStripProps) {
  const [sheet, setSheet] = useState(false);
  useRunKeys(fixed ? undefined : onRun, run);
  return (
    <section
      aria-label="The answers for this run"
      data-tally
      data-screen-only
      className="z-20 bg-tin tablet:sticky tablet:top-0 tablet:-mt-px tablet:border-t tablet:border-ink tablet:rule-result max-tablet:fixed max-tablet:inset-x-0 max-tablet:bottom-0 max-tablet:border-t-4 max-tablet:border-double max-tablet:border-ink [@media(max-height:419px)]:tablet:static"
    >
      <div className="gutters">
        {fixed ? (
          <div className="h-3 max-tablet:hidden" />
        ) : (
          <div className="max-tablet:hidden">
            <Ruler run={run} onRun={onRun} sweetSpots={sweetSpots} />
          </div>
        )}
        <div className="flex items-center max-tablet:min-h-[69px] max-tablet:gap-2.5 max-tablet:py-1.5 tablet:pb-2.5">
          <Run run={run} onRun={onRun} fixed={fixed} />
          <ul className="flex min-w-0 grow max-tablet:gap-2.5">
            {cells.map((cell) => (
              <Cell key={cell.key} cell={cell} workingOut={workingOut} />
            ))}
          </ul>
          <button
            type="button"
            aria-label="Show all figures"
            aria-expanded={sheet}
            onClick={() => setSheet(true)}
            onPointerDown={FiguresSheet.preload}
            onFocus={FiguresSheet.preload}
            className="-mr-2 flex h-11 w-8 shrink-0 items-center justify-center tablet:hidden"
          >
            {workingOut ? <BusyIcon /> : <UpIcon />}
          </button>
        </div>
      </div>
      {note && <TallyNoteLine note={note} className="max-tablet:hidden" />}
      <p role="status" className="heard-only">
        {announce}
      </p>
      {sheet && (
        <Later
          part={FiguresSheet}
          give={{ onClose: () => setSheet(false), cells, note, run }}
          what="All figures"
          frame="fixed inset-x-0 bottom-0 border-t-4 border-double border-ink bg-paper px-4 pt-4 pb-6"
        />
      )}
    </section>
  );
}

function Run({ run, onRun, fixed }: Pick<TallyStripProps, "run" | "onRun" | "fixed">) {
  if (fixed)
    return (
      <div className="flex items-center gap-3 tablet:pr-6">
        <span className="type-label text-ink-2">
          Run of <span className="type-tally block font-bold text-ink">{run}</span>
        </span>
        <RunBands kits={run} width={104} className="max-desktop:hidden" />
        <RunBands kits={run} width={52} className="desktop:hidden" />
      </div>
    );
  return (
    <div className="flex shrink-0 items-center gap-2.5">
      <Stepper
        label="Run of"
        value={run}
        onStep={onRun}
        least={RULER_LEAST}
        most={RULER_MOST}
        typedLeast={RUN_LEAST}
        typedMost={RUN_MOST}
        below={<RunBands kits={run} width={52} className="tablet:hidden" />}
      />
      <RunBands kits={run} width={104} className="max-desktop:hidden" />
    </div>
  );
}

function Cell({ cell, workingOut }: { cell: TallyCell; workingOut?: boolean }) {
  const shown = cell.onPhone ? "" : "max-tablet:hidden";
  return (
    <li
      className={`${shown} min-w-0 max-tablet:flex-1 max-[22.5rem]:not-first:hidden tablet:ml-4 tablet:min-h-[52px] tablet:flex-auto tablet:border-l tablet:border-rule-2 tablet:pl-3.5 desktop:ml-6 desktop:pl-6`}
    >
      <span className="type-ruler flex items-center gap-1.5 whitespace-nowrap text-ink-2 tablet:type-label">
        {cell.label}
        {workingOut && <BusyIcon className="size-3.5 max-tablet:hidden" />}
      </span>
      <span className="flex flex-wrap items-center gap-x-2 max-desktop:flex-col max-desktop:items-start">
        <CellFigure cell={cell} workingOut={workingOut} />
        {cell.change && <Change {...cell.change} />}
      </span>
    </li>
  );
}

/** Alt with + or − changes the run from anywhere on the page. */
function useRunKeys(onRun: ((kits: number) => void) | undefined, run: number): void {
  const latest = useRef({ onRun, run });
  latest.current = { onRun, run };
  useEffect(() => {
    const onKey = (press: KeyboardEvent) => {
      const by = press.key === "+" || press.key === "=" ? 1 : press.key === "-" || press.key === "−" ? -1 : 0;
      if (!press.altKey || press.ctrlKey || press.metaKey || by === 0 || !latest.current.onRun) return;
      press.preventDefault();
      const next = Math.min(Math.max(latest.current.run + by, RUN_LEAST), RUN_MOST);
      if (next !== latest.current.run) latest.current.onRun(next);
    };
    addEventListener("keydown", onKey);
    return () => removeEventListener("keydown", onKey);
  }, []);
}
