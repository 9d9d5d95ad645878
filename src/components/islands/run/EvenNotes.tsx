import { shareText } from "#src/components/amount-text.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { breakEvenWords, crossingWords } from "./crossing-words.ts";

interface EvenNotesProps {
  plan: Plan;
  sweep: SweepResult;
  run: number;
  opens: ReturnType<typeof useOpens>;
}

/** Every crossing by its letter, first and safe break-even, and how many sold pay for the run. */
export function EvenNotes({ plan, sweep, run, opens }: EvenNotesProps) {
  const { breakEven, columns } = sweep;
  const crossings = crossingWords(plan, breakEven);
  const sold = columns.soldToPay[run - 1] ?? null;
  const margin = breakEven.marginOfSafety;
  return (
    <MarginNote title="Where the lines cross">
      <p>{breakEvenWords(breakEven)}</p>
      {crossings.length > 0 && (
        <ul>
          {crossings.map(({ letter, kits, words }) => (
            <li key={letter} className="hairline-b grid grid-cols-[34px_1fr] py-1.5 last:border-b-0">
              <b>{letter}</b>
              <span>
                <Figure
                  label="Crossing"
                  value={`${kits} kits.`}
                  {...opens(`crossing:${kits}`)}
                  className="font-bold"
                />{" "}
                {words}
              </span>
            </li>
          ))}
        </ul>
      )}
      {sold !== null && (
        <p>
          Once {run} are made, you are even after{" "}
          <Figure label="Even after" value={String(sold)} {...opens("even-after")} className="font-bold" />{" "}
          sold. The dashed line shows it.
        </p>
      )}
      {breakEven.known && sold === null && (
        <p>Once {run} are made, even all of them sold do not pay for it.</p>
      )}
      {margin !== null && !margin.startsWith("-") && (
        <p className="text-ink-2">
          The run could be {shareText(margin)} smaller and still pay for itself: its margin of safety.
        </p>
      )}
    </MarginNote>
  );
}
