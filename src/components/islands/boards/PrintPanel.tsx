import { useState } from "react";
import { createPortal, flushSync } from "react-dom";
import type { BoardPicture } from "#src/components/board-picture.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { PanelPieces } from "./PanelPieces.tsx";
import { paperFor } from "./panel-paper.ts";
import { boardsText, layoutWords, sizeText } from "./panel-words.ts";

interface PrintPanelProps {
  panel: Panel;
  picture: BoardPicture;
  /** Kit, revision and house, for the head of the sheet. */
  title: string;
}

/** Prints the panel at true scale with a bar to check; says so where it does not fit a sheet of A4. */
export function PrintPanel(props: PrintPanelProps) {
  const [printing, setPrinting] = useState(false);
  const paper = paperFor(props.panel.outer);
  function print() {
    if (!paper) return;
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
  return (
    <>
      <Button
        size="small"
        onClick={print}
        offBecause={
          paper
            ? undefined
            : `${sizeText(props.panel.outer)} do not fit on A4, so the panel cannot be printed at true scale.`
        }
      >
        Print 1:1
      </Button>
      {printing && createPortal(<Sheet {...props} />, document.body)}
    </>
  );
}

/** Scores reach past the panel's edge by so many millimetres. */
const EDGE = 3;
const BAR = 50;
const FOOT = 12;

function Sheet({ panel, picture, title }: PrintPanelProps) {
  const [width, height] = [panel.outer.width / 1000 + 2 * EDGE, panel.outer.height / 1000 + EDGE + FOOT];
  const bar = panel.outer.height / 1000 + 7;
  return (
    <div data-print-sheet>
      <p className="font-semibold">{title}</p>
      <p className="sheet-small mb-2">
        {`${boardsText(panel.arrangement.count)}, ${layoutWords(panel.arrangement)}, ${sizeText(panel.outer)}. Scale 1:1: print at 100\u00a0%; the bar must measure ${BAR}\u00a0mm.`}
      </p>
      <svg
        role="img"
        aria-label={`${title}, at true scale`}
        viewBox={`${-EDGE} ${-EDGE} ${width} ${height}`}
        style={{ width: `${width}mm`, height: `${height}mm` }}
        className="block max-w-none"
      >
        <PanelPieces {...{ panel, picture }} />
        <path
          d={`M0 ${bar}H${BAR}M0 ${bar - 1.5}v3M${BAR} ${bar - 1.5}v3M${BAR / 2} ${bar - 1}v2`}
          fill="none"
          strokeWidth={0.3}
          className="stroke-ink"
        />
        <text x={BAR + 2} y={bar + 1.2} fontSize={3.6} className="fill-ink">
          {`${BAR}\u00a0mm`}
        </text>
      </svg>
    </div>
  );
}
