import { RunBands } from "./Bands.tsx";

/** Nine drawers with the run's bands above them: shown where a kit has no parts yet. */
export function DrawersPicture({ kits }: { kits: number }) {
  return (
    <div className="flex shrink-0 flex-col items-center gap-4 self-start tablet:self-center">
      <RunBands kits={kits} width={92} />
      <svg width={176} height={92} viewBox="0 0 176 92" aria-hidden="true" focusable="false">
        {[0, 1, 2].flatMap((row) =>
          [0, 1, 2].map((column) => (
            <g key={`${row}${column}`} transform={`translate(${1 + column * 58} ${1 + row * 30})`}>
              <rect width={58} height={30} strokeWidth={2} className="fill-paper stroke-ink" />
              <rect
                x={11.5}
                y={7.5}
                width={36}
                height={11}
                strokeWidth={1.5}
                className="fill-sheet stroke-ink"
              />
              <circle cx={29.5} cy={25} r={2.2} className="fill-copper-metal" />
            </g>
          )),
        )}
      </svg>
    </div>
  );
}
