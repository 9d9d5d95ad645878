import { type ReactNode, useRef } from "react";
import { Button } from "./Button.tsx";
import { CellFigure } from "./CellFigure.tsx";
import { Change } from "./Change.tsx";
import { holdFocus, useModal } from "./held-focus.ts";
import { TallyNoteLine } from "./TallyNoteLine.tsx";
import type { TallyCell, TallyStripProps } from "./TallyStrip.tsx";

export type FiguresSheetProps = Pick<TallyStripProps, "cells" | "note" | "run"> & { onClose: () => void };

/** The phone's sheet with all figures, from the bar upward. */
export function FiguresSheet({ onClose, cells, note, run }: FiguresSheetProps) {
  const closeKey = useRef<HTMLButtonElement>(null);
  const box = useModal(true, closeKey);
  return (
    <dialog
      ref={box}
      aria-label={`All figures for a run of ${run}`}
      onKeyDown={holdFocus}
      onCancel={(cancel) => {
        cancel.preventDefault();
        onClose();
      }}
      className="mx-0 mt-auto mb-0 w-full max-w-none border-t-4 border-double border-ink bg-paper px-4 pt-4 pb-6 text-ink"
    >
      <div className="flex items-center justify-between gap-3">
        <h2 className="type-h2">A run of {run}</h2>
        <Button ref={closeKey} size="small" onClick={onClose}>
          Close
        </Button>
      </div>
      <dl className="mt-3">
        {cells.map((cell) => (
          <SheetRow key={cell.key} cell={cell} onOpen={cell.onOpen && (() => openFrom(cell, onClose))} />
        ))}
      </dl>
      {note && <TallyNoteLine note={note} className="mt-3 py-2 [&>p]:px-3" />}
    </dialog>
  );
}

function openFrom(cell: TallyCell, close: () => void): void {
  close();
  cell.onOpen?.();
}

function SheetRow({ cell, onOpen }: { cell: TallyCell; onOpen?: () => void }): ReactNode {
  return (
    <div className="hairline-b flex min-h-12 items-center justify-between gap-3">
      <dt className="text-ink-2">{cell.label}</dt>
      <dd className="flex flex-wrap items-center justify-end gap-2">
        {cell.change && <Change {...cell.change} />}
        <CellFigure cell={{ ...cell, onOpen }} />
      </dd>
    </div>
  );
}
