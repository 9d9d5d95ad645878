import { moneyText } from "#src/components/amount-text.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { SweepColumns, SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { changesInWords } from "./change-words.ts";

interface WhyProps {
  plan: Plan;
  run: RunResult;
  sweep: SweepResult;
  columns: SweepColumns;
  opens: ReturnType<typeof useOpens>;
}

/** Where the chosen run stands among its neighbours, and what one kit more costs. */
export function WhyThisRun({ plan, run, sweep, columns, opens }: WhyProps) {
  const { kits, currency } = run;
  const spot = sweep.sweetSpots.find((one) => one.kits === kits);
  const next = sweep.sweetSpots.find((one) => one.kits > kits);
  const nextKit = columns.nextKitUsed[kits - 1] ?? null;
  return (
    <MarginNote title={`Why ${kits}`}>
      {spot ? (
        <p>
          It is a sweet spot: no smaller run is cheaper a kit, and none up to a tenth larger. With the next
          kit {changesInWords(plan, spot.changes) || "the cost of each goes up"}.
        </p>
      ) : (
        <p>
          It is no sweet spot.
          {next && ` The next is ${next.kits}, at ${moneyText(next.perKit, currency)} a kit.`}
          {next && next.changes.length > 0 && ` With one more ${changesInWords(plan, next.changes)}.`}
        </p>
      )}
      {nextKit !== null && (
        <p>
          One kit more costs{" "}
          <Figure label="One kit more costs" value={moneyText(nextKit, currency)} {...opens("next-kit")} />.
        </p>
      )}
    </MarginNote>
  );
}
