import type { BoardPicture } from "#src/components/board-picture.ts";
import { buttonLook } from "#src/components/button-look.ts";
import type { StopState } from "#src/components/trail-states.ts";
import { BandEdge } from "./Bands.tsx";
import { Board } from "./Board.tsx";
import { Chip, type ChipKind } from "./Chip.tsx";
import { SmallTrail } from "./Trail.tsx";

export type KitLabelProps = {
  name: string;
  href: string;
  /** "A garden night-light that glows when dew falls". */
  about: string;
  run: number | null;
  board: BoardPicture | null;
  stops: readonly StopState[];
  chip: { kind: ChipKind; words: string };
  /** The one next step. At most one label of a page has the primary one. */
  step: { label: string; href: string; primary?: boolean };
  /** Four figures as written; what is not known says so. None for who may not see money. */
  figures: readonly { label: string; value: string }[];
};

/** A kit on the home page: run and bands, board to scale, name, steps, what waits, the next step, four figures. */
export function KitLabel({ name, href, about, run, board, stops, chip, step, figures }: KitLabelProps) {
  return (
    <article className="relative flex min-h-[165px] overflow-hidden rounded-control border-[1.5px] border-rule-2 bg-sheet pl-[38px]">
      <BandEdge kits={run} className="absolute inset-y-0 left-0" />
      <div className="grid min-w-0 grow grid-cols-[auto_1fr] items-center gap-x-4 px-4 py-4 desktop:grid-cols-[76px_150px_minmax(0,1fr)]">
        <RunOf run={run} />
        <div className="justify-self-end desktop:justify-self-center">
          <Board board={board} />
        </div>
        <div className="col-span-full max-desktop:row-start-1 desktop:col-auto desktop:pl-3">
          <h2 className="type-h2">
            <a href={href} className="text-ink no-underline hover:underline">
              {name}
            </a>
          </h2>
          <p className="type-note text-ink-2">{about}</p>
          <div className="my-2 flex flex-wrap items-center gap-x-4 gap-y-2">
            <SmallTrail states={stops} />
            <Chip kind={chip.kind}>{chip.words}</Chip>
          </div>
          <Step {...step} className="max-tablet:hidden" />
        </div>
        <Figures figures={figures} className="col-span-full mt-3 desktop:hidden" />
        <Step {...step} className="col-span-full mt-4 w-full tablet:hidden" />
      </div>
      <Figures
        figures={figures}
        className="w-[268px] shrink-0 self-stretch border-l border-rule px-[18px] max-desktop:hidden"
      />
    </article>
  );
}

function RunOf({ run }: { run: number | null }) {
  return (
    <p className="type-label text-ink-2">
      {run === null ? "No run" : "Run of"}
      <span className="block text-[2rem] leading-9 font-bold tracking-[-0.02em] text-ink">{run ?? "–"}</span>
    </p>
  );
}

function Step({ label, href, primary, className }: KitLabelProps["step"] & { className: string }) {
  return (
    <a href={href} className={`${buttonLook(primary ? "primary" : "secondary", "row")} ${className}`}>
      {label}
    </a>
  );
}

function Figures({ figures, className }: { figures: KitLabelProps["figures"]; className: string }) {
  if (figures.length === 0) return null;
  return (
    <dl className={`type-note flex flex-col justify-center ${className}`}>
      {figures.map((figure) => (
        <div
          key={figure.label}
          className="hairline-b flex min-h-[31px] items-center justify-between gap-3 last:border-b-0"
        >
          <dt className="text-ink-2">{figure.label}</dt>
          <dd className="font-semibold">{figure.value}</dd>
        </div>
      ))}
    </dl>
  );
}
