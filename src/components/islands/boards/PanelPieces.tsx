import { useId } from "react";
import type { BoardPicture } from "#src/components/board-picture.ts";
import { BoardShape } from "#src/components/islands/parts/Board.tsx";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import type { Rect } from "#src/costing/panels/micrometres.ts";
import type { PlacedBoard } from "#src/costing/panels/place-boards.ts";
import type { Rail } from "#src/costing/panels/rails.ts";

const MM = 1000;

/** A rectangle of the layout in millimetres. */
function inMm({ x, y, width, height }: Rect) {
  return { x: x / MM, y: y / MM, width: width / MM, height: height / MM };
}

/** Boards, rails, breaking tabs and scores of a panel, in millimetres from its upper left corner. */
export function PanelPieces({ panel, picture }: { panel: Panel; picture: BoardPicture }) {
  const id = useId();
  const { outer, boards, rails, tabs, scores, measures } = panel;
  return (
    <g>
      <defs>
        <g id={`${id}-board`}>
          <BoardShape board={picture} />
        </g>
        <pattern
          id={`${id}-rail`}
          width={3.2}
          height={3.2}
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width={3.2} height={3.2} className="fill-tin" />
          <path d="M0 0V3.2" strokeWidth={0.5} className="stroke-tin-metal" />
        </pattern>
      </defs>
      {!measures.routed && <rect width={outer.width / MM} height={outer.height / MM} className="fill-tin" />}
      {rails.map((rail) => (
        <RailShape key={`${rail.x},${rail.y}`} rail={rail} fill={`url(#${id}-rail)`} />
      ))}
      {tabs.map((tab) => (
        <TabShape key={`${tab.x},${tab.y}`} tab={tab} />
      ))}
      {boards.map((board) => (
        <use key={`${board.x},${board.y}`} href={`#${id}-board`} transform={placeOf(board)} />
      ))}
      <Scores x={scores.x} y={scores.y} outer={outer} />
    </g>
  );
}

/** A turned board's own left edge lies at the top. */
function placeOf({ x, y, width, turned }: PlacedBoard): string {
  return turned ? `translate(${(x + width) / MM} ${y / MM}) rotate(90)` : `translate(${x / MM} ${y / MM})`;
}

function RailShape({ rail, fill }: { rail: Rail; fill: string }) {
  return (
    <g>
      <rect {...inMm(rail)} fill={fill} strokeWidth={0.35} className="stroke-ink" />
      {rail.holes.map(({ x, y, across }) => (
        <circle
          key={`${x},${y}`}
          cx={x / MM}
          cy={y / MM}
          r={across / MM / 2}
          strokeWidth={0.35}
          className="fill-paper stroke-ink"
        />
      ))}
    </g>
  );
}

/** A bridge with a row of small holes, where it breaks. */
function TabShape({ tab }: { tab: Rect }) {
  const { x, y, width, height } = inMm(tab);
  const lying = width >= height;
  const row = lying
    ? `M${x + 0.5} ${y + height / 2}H${x + width - 0.4}`
    : `M${x + width / 2} ${y + 0.5}V${y + height - 0.4}`;
  return (
    <g>
      <rect x={x} y={y} width={width} height={height} className="fill-mask" />
      <path
        d={row}
        strokeWidth={0.5}
        strokeDasharray="0.01 1"
        strokeLinecap="round"
        className="stroke-silk"
      />
    </g>
  );
}

/** How far a score is drawn beyond the panel's edge. */
const BEYOND = 2;

function Scores({ x, y, outer }: { x: readonly number[]; y: readonly number[]; outer: Panel["outer"] }) {
  const [width, height] = [outer.width / MM, outer.height / MM];
  const lines = [
    ...x.map((at) => `M${at / MM} ${-BEYOND}V${height + BEYOND}`),
    ...y.map((at) => `M${-BEYOND} ${at / MM}H${width + BEYOND}`),
  ];
  if (lines.length === 0) return null;
  const d = lines.join("");
  return (
    <g fill="none">
      <path d={d} strokeWidth={0.9} className="stroke-paper" />
      <path d={d} strokeWidth={0.35} strokeDasharray="3 1 0.8 1" className="stroke-ink" />
    </g>
  );
}
