import { changeText, moneyText } from "#src/components/amount-text.ts";
import type { Figure } from "#src/costing/figure.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { CostEffect } from "#src/server/bring-in/cost-effect.ts";
import { Change } from "./Change.tsx";

interface CostChangeProps {
  effect: CostEffect;
  /** When the two figures hold: "afterwards" and "now", or "now" and "with rev A". */
  when: { after: string; before: string };
}

/** What a change does to the cost of one kit: the new figure, the signed change, the old figure. */
export function CostChange({ effect: { kits, currency, before, after, change }, when }: CostChangeProps) {
  const written = (figure: Figure) =>
    figure.known ? moneyText(figure.value, currency) : `not known, ${needWords(figure.needs)}`;
  return (
    <p className="type-answer mb-2">
      {after.known ? (
        <>
          One kit of {kits} costs <b>{written(after)}</b> {when.after}
        </>
      ) : (
        `What one kit of ${kits} costs ${when.after} is ${written(after)}`
      )}
      {change !== null && (
        <>
          {" "}
          <Change amount={changeText(change, currency)} turn={turnOf(change)} />
        </>
      )}
      <span className="text-ink-2">
        ; {when.before} {written(before)}
      </span>
    </p>
  );
}

function turnOf(change: string) {
  if (!/[1-9]/.test(change)) return "neither";
  return change.startsWith("-") ? "better" : "worse";
}
