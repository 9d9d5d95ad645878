import { useEffect, useState } from "react";
import { Later } from "#src/components/islands/parts/Later.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";

const KeyDialog = laterPart<{ onClose: () => void }>(async () => (await import("./KeyDialog.tsx")).KeyDialog);
const OVERLAY =
  "fixed inset-x-0 top-24 z-30 mx-auto w-[min(560px,calc(100vw-2rem))] border-2 border-ink bg-paper p-6";

function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement && target.closest("input, textarea, select, [contenteditable]") !== null
  );
}

/** Lists the keys when somebody presses the question mark; single-letter keys can be turned off. */
export function KeyHelp({ on }: { on: boolean }) {
  const [open, setOpen] = useState(false);
  useEffect(() => {
    if (!on) return;
    const onKey = (press: KeyboardEvent) => {
      if (press.key !== "?" || press.ctrlKey || press.metaKey || press.altKey || isTyping(press.target))
        return;
      press.preventDefault();
      setOpen(true);
    };
    addEventListener("keydown", onKey);
    return () => removeEventListener("keydown", onKey);
  }, [on]);
  return open ? (
    <Later part={KeyDialog} give={{ onClose: () => setOpen(false) }} what="Keys" frame={OVERLAY} />
  ) : null;
}
