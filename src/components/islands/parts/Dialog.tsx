import { type ReactNode, useId, useRef } from "react";
import { Button } from "./Button.tsx";
import { holdFocus, useModal } from "./held-focus.ts";

export type DialogProps = {
  open: boolean;
  /** A question: "Take Tom off this kit?". */
  title: string;
  children: ReactNode;
  /** The choice that changes nothing; focus starts here and Escape means it. */
  safe: { label: string; run: () => void };
  /** The choice that removes or sends. `busy` while it is under way. */
  act: { label: string; run: () => void; removes?: boolean; busy?: boolean; busyWord?: string };
};

/** Asked only before removing or sending. */
export function Dialog({ open, title, children, safe, act }: DialogProps) {
  const titleId = useId();
  const safeKey = useRef<HTMLButtonElement>(null);
  const box = useModal(open, safeKey);

  return (
    <dialog
      ref={box}
      aria-labelledby={titleId}
      onKeyDown={holdFocus}
      onCancel={(cancel) => {
        cancel.preventDefault();
        safe.run();
      }}
      className="m-auto w-[min(500px,calc(100vw-2rem))] rounded-control border-2 border-ink bg-paper px-6 py-5 text-ink"
    >
      {open && (
        <>
          <h2 id={titleId} className="type-h2">
            {title}
          </h2>
          <div className="mt-1">{children}</div>
          <div className="mt-5 flex flex-wrap justify-end gap-3">
            <Button ref={safeKey} onClick={safe.run}>
              {safe.label}
            </Button>
            <Button
              kind={act.removes ? "refuse" : "primary"}
              onClick={act.run}
              busy={act.busy}
              busyWord={act.busyWord}
            >
              {act.label}
            </Button>
          </div>
        </>
      )}
    </dialog>
  );
}
