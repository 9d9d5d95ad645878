import { useEffect, useId, useRef, useState } from "react";
import { type Paper, paperAsText } from "#src/components/working-paper.ts";
import { Button } from "./Button.tsx";
import { focusToReturn, holdFocus } from "./held-focus.ts";
import { BusyIcon } from "./Icons.tsx";
import { usePhone } from "./phone.ts";
import { WorkingPaper } from "./WorkingPaper.tsx";

export type WorkingPanelProps = {
  /** Null while it is being worked out. */
  paper: Paper | null;
  onClose: () => void;
  id?: string;
};

/**
 * The arithmetic of a figure on squared paper. On the desktop it stands at the right below the tally and the page stays
 * usable; on a phone it is a modal sheet. Mount it while a figure is open: focus comes here and goes back when it is
 * closed by its button or Escape.
 */
export function WorkingPanel({ paper, onClose, id }: WorkingPanelProps) {
  const titleId = useId();
  const box = useRef<HTMLDialogElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const phone = usePhone();
  const top = useTallyFoot();

  useEffect(() => {
    const dialog = box.current;
    if (!dialog) return;
    const giveBack = focusToReturn();
    if (phone) dialog.showModal();
    else dialog.show();
    heading.current?.focus({ preventScroll: true });
    return () => {
      dialog.close();
      giveBack();
    };
  }, [phone]);
  useEscape(onClose);

  return (
    <dialog
      ref={box}
      id={id}
      data-working
      aria-labelledby={titleId}
      onCancel={(cancel) => cancel.preventDefault()}
      onKeyDown={phone ? holdFocus : undefined}
      style={phone ? undefined : { top }}
      className="fixed inset-x-0 top-[60px] bottom-0 z-30 m-0 hidden h-auto max-h-none w-full max-w-none animate-panel flex-col border-t-2 border-ink bg-paper text-ink open:flex tablet:right-0 tablet:left-auto tablet:w-[min(588px,100vw)] tablet:border-t-0 tablet:border-l-2"
    >
      <div className="rule-section flex items-start justify-between gap-4 border-t-0! border-b-2! border-ink px-6 py-3 max-tablet:px-4">
        <div>
          <h2 id={titleId} ref={heading} tabIndex={-1} className="type-h2 outline-none">
            The working
          </h2>
          <p className="type-note text-ink-2">{paper?.of ?? "Working out"}</p>
        </div>
        <Button size="small" onClick={onClose} data-screen-only>
          Close
        </Button>
      </div>
      {paper === null ? <WorkingOut /> : <WorkingPaper paper={paper} />}
      {paper && <WorkingFoot paper={paper} />}
    </dialog>
  );
}

function WorkingOut() {
  return (
    <p role="status" className="squared-paper flex grow items-start gap-2 p-7">
      <BusyIcon /> Working out
    </p>
  );
}

function WorkingFoot({ paper }: { paper: Paper }) {
  const [copied, setCopied] = useState(false);
  async function copy() {
    await navigator.clipboard.writeText(paperAsText(paper));
    setCopied(true);
  }
  return (
    <div className="flex flex-wrap items-center justify-between gap-3 border-t border-ink px-6 py-3 max-tablet:px-4">
      <p className="type-label text-ink-2">{paper.foot}</p>
      <div className="flex gap-3" data-screen-only>
        <Button size="small" onClick={copy}>
          {copied ? "Copied" : "Copy as text"}
        </Button>
        <Button size="small" onClick={printWorking}>
          Print
        </Button>
      </div>
    </div>
  );
}

/** Prints the open working alone: `data-printing` hides the rest of the page. */
function printWorking(): void {
  const root = document.documentElement;
  root.dataset.printing = "working";
  addEventListener("afterprint", () => delete root.dataset.printing, { once: true });
  print();
}

/** The lower edge of the tally in the window, so that the panel begins below it wherever the page is scrolled. */
function useTallyFoot(): number {
  const [top, setTop] = useState(0);
  useEffect(() => {
    const tally = document.querySelector("[data-tally]");
    if (!tally) return;
    const measure = () => setTop(Math.max(0, Math.round(tally.getBoundingClientRect().bottom)));
    measure();
    addEventListener("scroll", measure, { passive: true });
    addEventListener("resize", measure);
    const sized = new ResizeObserver(measure);
    sized.observe(tally);
    return () => {
      removeEventListener("scroll", measure);
      removeEventListener("resize", measure);
      sized.disconnect();
    };
  }, []);
  return top;
}

/** Escape closes from anywhere on the page, unless something nearer took it. */
function useEscape(close: () => void): void {
  const latest = useRef(close);
  latest.current = close;
  useEffect(() => {
    const onKey = (press: globalThis.KeyboardEvent) => {
      if (press.key === "Escape" && !press.defaultPrevented) latest.current();
    };
    addEventListener("keydown", onKey);
    return () => removeEventListener("keydown", onKey);
  }, []);
}
