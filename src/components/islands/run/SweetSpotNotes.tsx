import { moneyText } from "#src/components/amount-text.ts";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { asSentence, changesInWords } from "./change-words.ts";

/** Those nearest in ratio to the run, smallest first. */
function nearest<T extends { kits: number }>(all: readonly T[], run: number, most: number): T[] {
  const away = ({ kits }: T) => Math.abs(Math.log(kits / run));
  return [...all]
    .sort((one, other) => away(one) - away(other))
    .slice(0, most)
    .sort((one, other) => one.kits - other.kits);
}

/** Sweet spots near the run, each with what the next kit costs, and the step-downs. */
export function SweetSpotNotes({ plan, sweep, run }: { plan: Plan; sweep: SweepResult; run: number }) {
  const spots = nearest(sweep.sweetSpots, run, 4);
  const steps = nearest(sweep.stepDowns, run, 3);
  return (
    <>
      <MarginNote title="Sweet spots">
        {spots.length === 0 ? (
          <p>No run up to {sweep.to} is one: each kit more makes all of them cheaper.</p>
        ) : (
          <>
            <p>
              A ring marks the last kit before cost per kit goes up. No smaller run is cheaper, and none up to
              a tenth larger.
            </p>
            <ul>
              {spots.map(({ kits, perKit, nextKit, changes }) => (
                <li key={kits} className="hairline-b py-1.5 last:border-b-0">
                  <b>{kits}</b> at {moneyText(perKit, sweep.currency)}
                  <span className="block text-ink-2">
                    the next kit costs {moneyText(nextKit, sweep.currency)}
                    {changes.length > 0 && `: ${changesInWords(plan, changes)}`}
                  </span>
                </li>
              ))}
            </ul>
          </>
        )}
      </MarginNote>
      {steps.length > 0 && (
        <MarginNote title="Where it falls in a step">
          <ul>
            {steps.map(({ kits, perKit, fellBy, changes }) => (
              <li key={kits} className="hairline-b py-1.5 last:border-b-0">
                <b>From {kits}</b> at {moneyText(perKit, sweep.currency)}, {moneyText(fellBy, sweep.currency)}{" "}
                less
                <span className="block text-ink-2">{asSentence(changesInWords(plan, changes))}</span>
              </li>
            ))}
          </ul>
        </MarginNote>
      )}
    </>
  );
}
