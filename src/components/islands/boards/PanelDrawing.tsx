import type { BoardPicture } from "#src/components/board-picture.ts";
import { useWidth } from "#src/components/islands/parts/use-width.ts";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { millimetres } from "#src/costing/panels/micrometres.ts";
import { DimensionLine } from "./DimensionLine.tsx";
import { PanelPieces } from "./PanelPieces.tsx";
import { framePanel, LEADER_FOOT, type Leader, leadersOf, type PanelFrame } from "./panel-places.ts";
import { mmText, panelSentenceOf } from "./panel-words.ts";

export interface PanelDrawingProps {
  panel: Panel;
  /** The board as it is drawn elsewhere, in millimetres, not turned. */
  picture: BoardPicture;
}

/** Before the width is known, and where it cannot be. */
const USUAL_WIDTH = 640;
const LEVEL = 22;
const BAR_MM = 50;

/** A panel to scale, as wide as there is room: boards, rails, tabs or scores, measures, names and a bar of 50 mm. */
export function PanelDrawing({ panel, picture }: PanelDrawingProps) {
  const [box, measured] = useWidth<HTMLDivElement>();
  const frame = framePanel(panel, measured || USUAL_WIDTH);
  const leaders = frame.narrow ? [] : leadersOf(panel, frame);
  const levels = Math.max(-1, ...leaders.map(({ level }) => level)) + 1;
  const foot = frame.top + frame.panelHeight;
  const bar = foot + 26 + levels * LEVEL + (levels > 0 ? 8 : 0);
  const height = bar + 14;
  return (
    <div ref={box}>
      <svg
        role="img"
        aria-label={panelSentenceOf(panel)}
        data-real-object
        viewBox={`0 0 ${frame.width} ${height}`}
        width={frame.width}
        height={height}
        className="block h-auto max-w-full"
      >
        <g transform={`translate(${frame.left} ${frame.top}) scale(${frame.pxPerMm})`}>
          <PanelPieces panel={panel} picture={frame.narrow ? withoutSilk(picture) : picture} />
        </g>
        <Dimensions panel={panel} frame={frame} />
        {leaders.map((leader) => (
          <LeaderLine key={leader.words} leader={leader} foot={foot + 30} />
        ))}
        <ScaleLine x={frame.left} y={bar} pxPerMm={frame.pxPerMm} />
      </svg>
    </div>
  );
}

/** Printed lines are too fine for a small drawing. */
function withoutSilk({ marks, ...board }: BoardPicture): BoardPicture {
  if (!marks) return board;
  const { silk: _, ...kept } = marks;
  return { ...board, marks: kept };
}

/** The panel's outer measures, and in a wide drawing those of its first board. */
function Dimensions({ panel, frame }: { panel: Panel; frame: PanelFrame }) {
  const { outer, boards } = panel;
  const { left, top, panelWidth, panelHeight, pxPerMm, narrow } = frame;
  const first = boards[0];
  const px = (micrometres: number) => (micrometres / 1000) * pxPerMm;
  const far = narrow ? 12 : 52;
  return (
    <g>
      <DimensionLine
        from={left}
        to={left + panelWidth}
        at={top - far}
        edge={top}
        words={mmText(outer.width)}
      />
      <DimensionLine
        upright
        from={top}
        to={top + panelHeight}
        at={left - (narrow ? 11 : 54)}
        edge={left}
        words={mmText(outer.height)}
      />
      {!narrow && first && (
        <>
          <DimensionLine
            from={left + px(first.x)}
            to={left + px(first.x + first.width)}
            at={top - 16}
            edge={top + px(first.y)}
            words={millimetres(first.width)}
          />
          <DimensionLine
            upright
            from={top + px(first.y)}
            to={top + px(first.y + first.height)}
            at={left - 18}
            edge={left + px(first.x)}
            words={millimetres(first.height)}
          />
        </>
      )}
    </g>
  );
}

function LeaderLine({ leader, foot }: { leader: Leader; foot: number }) {
  const y = foot + leader.level * LEVEL;
  return (
    <g>
      <path
        d={`M${leader.x} ${leader.y}V${y}h${LEADER_FOOT - 4}`}
        fill="none"
        strokeWidth={1.1}
        className="stroke-ink"
      />
      <circle cx={leader.x} cy={leader.y} r={3.25} strokeWidth={1.25} className="fill-ink stroke-paper" />
      <text x={leader.x + LEADER_FOOT} y={y + 5} className="halo fill-ink type-label">
        {leader.words}
      </text>
    </g>
  );
}

/** Fifty millimetres in tens. */
function ScaleLine({ x, y, pxPerMm }: { x: number; y: number; pxPerMm: number }) {
  const ten = 10 * pxPerMm;
  return (
    <g>
      <path
        d={[0, 1, 2, 3, 4, 5].map((place) => `M${x + place * ten} ${y - 4}v8`).join("")}
        strokeWidth={1.1}
        className="stroke-ink"
      />
      <path d={`M${x} ${y}h${5 * ten}`} strokeWidth={1.1} className="stroke-ink" />
      <path
        d={[0, 2, 4].map((place) => `M${x + place * ten} ${y}h${ten}`).join("")}
        strokeWidth={3.5}
        className="stroke-ink"
      />
      <text x={x + 5 * ten + 10} y={y + 5} className="fill-ink type-label">
        {`${BAR_MM}\u00a0mm`}
      </text>
    </g>
  );
}
