import type { ReactNode } from "react";
import { buttonLook } from "#src/components/button-look.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { RunBands } from "#src/components/islands/parts/Bands.tsx";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { pageLink } from "#src/components/islands/plan/page-links.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import { type AnswerFigures, type AnswerPiece, answerFigures, runAnswer } from "./answer-words.ts";

interface RunAnswerProps {
  address: KitAddress;
  run: RunResult;
  opens: ReturnType<typeof useOpens>;
}

/** The question, the run as a large figure with its bands, and the answer in a sentence or two. */
export function RunAnswer({ address, run, opens }: RunAnswerProps) {
  const { used } = run.perKit;
  const { known } = used;
  const begun = known || !used.needs.some(({ code }) => code === "no-parts");
  return (
    <AnswerHead address={address} kits={run.kits} pieces={runAnswer(answerFigures(run))}>
      {known && <Chip kind="good">{run.kits} is your chosen run</Chip>}
      {begun && (
        <a href="#runs" className={buttonLook("secondary", "small")}>
          Compare other runs
        </a>
      )}
      <a href="#inputs" className={buttonLook("secondary", "small")}>
        Change what it rests on
      </a>
      {known && <ShowWorking of="the cost per kit" onClick={opens("per-kit-used").onOpen} />}
    </AnswerHead>
  );
}

/** The same head from the figures that came with the page, before the plan is here. */
export function FirstAnswer({ address, figures }: { address: KitAddress; figures: AnswerFigures }) {
  return <AnswerHead address={address} kits={figures.kits} pieces={runAnswer(figures)} />;
}

interface HeadProps {
  address: KitAddress;
  kits: number;
  pieces: readonly AnswerPiece[];
  children?: ReactNode;
}

function AnswerHead({ address, kits, pieces, children }: HeadProps) {
  return (
    <header className="mb-11">
      <h1 className="type-h1">How many kits should we make?</h1>
      <div className="mt-4 flex gap-x-11 gap-y-4 max-tablet:flex-col tablet:mt-5 tablet:items-start">
        <RunFigure kits={kits} />
        <div className="min-w-0 tablet:pt-4">
          <p className="type-answer">
            <Pieces address={address} pieces={pieces} />
          </p>
          <div className="mt-3.5 flex min-h-9 flex-wrap items-center gap-3">{children}</div>
        </div>
      </div>
    </header>
  );
}

function RunFigure({ kits }: { kits: number }) {
  return (
    <div className="flex shrink-0 gap-x-6 max-tablet:items-center tablet:flex-col tablet:items-start">
      <p className="type-run">{kits}</p>
      <RunBands kits={kits} width={206} className="tablet:mt-3 max-tablet:max-w-[48vw]" />
    </div>
  );
}

/** Pieces of a sentence, the deciding figures bold. */
function Pieces({ address, pieces }: Pick<HeadProps, "address" | "pieces">) {
  return pieces.map(({ text, bold, page }) => {
    if (page)
      return (
        <a key={text} href={pageLink(address, page).href}>
          {text}
        </a>
      );
    return bold ? <b key={text}>{text}</b> : <span key={text}>{text}</span>;
  });
}
