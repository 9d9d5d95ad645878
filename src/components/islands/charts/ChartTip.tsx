import { TOOLTIP_LOOK } from "#src/components/islands/chart-theme.ts";
import { RunBands } from "#src/components/islands/parts/Bands.tsx";

export interface TipLine {
  name: string;
  figure: string;
}

/** What Recharts hands to the content of a tooltip, as far as it is used here. */
export interface TipProps<Point> {
  active?: boolean;
  payload?: readonly { payload?: Point }[];
}

/** The figures of the run size under the cursor; it follows the arrow keys too and is read out. */
export function ChartTip<Point extends { kits: number }>({
  active,
  payload,
  lines,
}: TipProps<Point> & { lines: (point: Point) => readonly TipLine[] }) {
  const point = payload?.[0]?.payload;
  if (!active || !point) return null;
  return (
    <div role="status" className={TOOLTIP_LOOK}>
      <p className="mb-1 flex items-center gap-2 font-semibold">
        <RunBands kits={point.kits} width={52} /> {point.kits} {point.kits === 1 ? "kit" : "kits"}
      </p>
      <dl className="grid grid-cols-[auto_auto] gap-x-4">
        {lines(point).map(({ name, figure }) => (
          <div key={name} className="contents">
            <dt className="text-ink-2">{name}</dt>
            <dd className="text-right font-semibold">{figure}</dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
