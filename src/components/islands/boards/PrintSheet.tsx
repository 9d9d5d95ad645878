import type { BoardPicture } from "#src/components/board-picture.ts";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { PanelPieces } from "./PanelPieces.tsx";
import { boardsText, layoutWords, sizeText } from "./panel-words.ts";

export interface PrintSheetProps {
  panel: Panel;
  picture: BoardPicture;
  /** Kit, revision and house, for the head of the sheet. */
  title: string;
}

/** Scores reach past the panel's edge by so many millimetres. */
const EDGE = 3;
const BAR = 50;
const FOOT = 12;

/** A panel on paper at true scale, below its name, with a bar to check. */
export function PrintSheet({ panel, picture, title }: PrintSheetProps) {
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
