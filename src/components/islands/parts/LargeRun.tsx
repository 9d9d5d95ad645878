import { RunBands } from "./Bands.tsx";

/** The run as the answer of a page: the figure at 132 px (phone 96) with its bands below, on a phone beside it. */
export function LargeRun({ kits }: { kits: number }) {
  return (
    <div className="flex items-center gap-x-4 gap-y-2 tablet:flex-col tablet:items-start">
      <span className="type-run">{kits}</span>
      <RunBands kits={kits} width={206} className="min-w-0 shrink!" />
    </div>
  );
}
