import { useState } from "react";
import { createPortal, flushSync } from "react-dom";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import type { PrintSheetProps } from "./PrintSheet.tsx";
import { paperFor } from "./panel-paper.ts";
import { sizeText } from "./panel-words.ts";

const Sheet = laterPart<PrintSheetProps>(async () => (await import("./PrintSheet.tsx")).PrintSheet);

/** Prints the panel at true scale with a bar to check; says so where it does not fit a sheet of A4. */
export function PrintPanel(props: PrintSheetProps) {
  const [printing, setPrinting] = useState(false);
  const paper = paperFor(props.panel.outer);
  async function print() {
    if (!paper) return;
    try {
      await Sheet.fetch();
    } catch {
      const text = "The sheet could not be fetched. Try again when you are connected.";
      showToast({ kind: "fault", text });
      return;
    }
    const root = document.documentElement;
    flushSync(() => setPrinting(true));
    root.dataset.printing = "panel";
    root.dataset.sheet = paper;
    addEventListener("afterprint", done, { once: true });
    window.print();
  }
  function done() {
    delete document.documentElement.dataset.printing;
    delete document.documentElement.dataset.sheet;
    setPrinting(false);
  }
  const Printed = Sheet.now();
  return (
    <>
      <Button
        size="small"
        onClick={() => void print()}
        onPointerEnter={Sheet.preload}
        onFocus={Sheet.preload}
        offBecause={
          paper
            ? undefined
            : `${sizeText(props.panel.outer)} do not fit on A4, so the panel cannot be printed at true scale.`
        }
      >
        Print 1:1
      </Button>
      {printing && Printed && createPortal(<Printed {...props} />, document.body)}
    </>
  );
}
