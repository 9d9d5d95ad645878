import { type BoardPicture, boardInWords, PX_PER_MM } from "#src/components/board-picture.ts";

/** A board as a drawing of its own, at 2.05 px to the millimetre; null is a dashed frame that says so. */
export function Board({ board }: { board: BoardPicture | null }) {
  if (board === null)
    return (
      <span className="type-ruler inline-flex h-[62px] w-[82px] items-center justify-center rounded-control border-[1.5px] border-dashed border-rule-2 text-ink-2">
        not drawn
      </span>
    );
  const { widthMm, heightMm } = board;
  return (
    <svg
      role="img"
      aria-label={`Board, ${boardInWords(board)}`}
      data-real-object
      viewBox={`-0.5 -0.5 ${widthMm + 1} ${heightMm + 1}`}
      width={(widthMm + 1) * PX_PER_MM}
      height={(heightMm + 1) * PX_PER_MM}
      className="block max-w-full"
    >
      <BoardShape board={board} />
    </svg>
  );
}

/** The board as part of a larger drawing in millimetres, at its upper left corner. */
export function BoardShape({ board }: { board: BoardPicture }) {
  const { shape, widthMm, heightMm, marks = {} } = board;
  const outline = { strokeWidth: 0.35, className: "fill-mask stroke-edge" };
  return (
    <g>
      {marks.outline ? (
        <path d={marks.outline} {...outline} />
      ) : shape === "round" ? (
        <ellipse cx={widthMm / 2} cy={heightMm / 2} rx={widthMm / 2} ry={heightMm / 2} {...outline} />
      ) : (
        <rect width={widthMm} height={heightMm} rx={Math.min(4, widthMm / 8, heightMm / 8)} {...outline} />
      )}
      {marks.copper && (
        <path
          d={marks.copper}
          fill="none"
          strokeWidth={1.1}
          strokeLinecap="square"
          className="stroke-copper-metal"
        />
      )}
      {marks.silk && <path d={marks.silk} fill="none" strokeWidth={0.25} className="stroke-silk" />}
      {marks.holes?.map(([x, y, across]) => (
        <circle
          key={`${x},${y}`}
          cx={x}
          cy={y}
          r={across * 0.38}
          strokeWidth={across * 0.24}
          className="fill-paper stroke-copper-metal"
        />
      ))}
      {marks.pads?.map(([x, y]) => (
        <circle
          key={`${x},${y}`}
          cx={x}
          cy={y}
          r={0.62}
          strokeWidth={0.5}
          className="fill-paper stroke-copper-metal"
        />
      ))}
    </g>
  );
}

/** Fifty millimetres with a tick at each ten, and what it is for. */
export function ScaleBar({ words = "50\u00a0mm. All boards at one scale." }: { words?: string }) {
  const width = 50 * PX_PER_MM;
  return (
    <p className="type-note flex items-center gap-3 text-ink-2">
      <svg
        width={width + 2}
        height={10}
        viewBox={`-1 0 ${width + 2} 10`}
        aria-hidden="true"
        focusable="false"
      >
        <path d={`M0 5H${width}`} strokeWidth={1.5} className="stroke-ink" />
        {[0, 1, 2, 3, 4, 5].map((ten) => (
          <path
            key={ten}
            d={`M${ten * 10 * PX_PER_MM} ${ten % 5 === 0 ? 0 : 3}V${ten % 5 === 0 ? 10 : 7}`}
            strokeWidth={1.5}
            className="stroke-ink"
          />
        ))}
      </svg>
      {words}
    </p>
  );
}
