export interface DimensionLineProps {
  /** Ends of the measured length in px, along x or, for an upright line, along y. */
  from: number;
  to: number;
  /** Where the line stands on the other axis, and from where its extension lines come. */
  at: number;
  edge: number;
  upright?: boolean;
  words: string;
}

const ARROW = 10.5;
const HALF = 2.8;
/** Extension lines reach so far past the line. */
const PAST = 5;

/** A measured length: line, slim arrowheads, extension lines, its figure above the line. */
export function DimensionLine({ from, to, at, edge, upright, words }: DimensionLineProps) {
  const arrow = Math.min(ARROW, (to - from) / 3);
  const middle = (from + to) / 2;
  return (
    <g transform={upright ? `matrix(0 1 1 0 0 0)` : undefined}>
      <path
        d={`M${from} ${edge}V${at - PAST}M${to} ${edge}V${at - PAST}M${from} ${at}H${to}`}
        fill="none"
        strokeWidth={1.1}
        className="stroke-ink"
      />
      <path
        d={`M${from} ${at}l${arrow} ${-HALF}v${2 * HALF}ZM${to} ${at}l${-arrow} ${-HALF}v${2 * HALF}Z`}
        className="fill-ink"
      />
      <text
        transform={
          upright ? `matrix(0 1 1 0 ${middle} ${at - 6}) rotate(-90)` : `translate(${middle} ${at - 6})`
        }
        textAnchor="middle"
        className="halo fill-ink type-label font-semibold"
      >
        {words}
      </text>
    </g>
  );
}
