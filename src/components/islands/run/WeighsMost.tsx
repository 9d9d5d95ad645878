import { useDeferredValue, useMemo } from "react";
import { moneyText, shareText } from "#src/components/amount-text.ts";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import type { HeadId, RunResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

const NAMES: Record<HeadId, [name: string, verb: "is" | "are"]> = {
  boards: ["Boards", "are"],
  parts: ["Parts", "are"],
  freight: ["Freight and duty", "are"],
  packing: ["Packing", "is"],
  work: ["Work", "is"],
  "one-off": ["Once-only costs", "are"],
  replacements: ["Replacements", "are"],
};

/** The head that makes up most of a kit; and what a second run, without once-only costs, would cost. */
export function WeighsMost({ plan, run }: { plan: Plan; run: RunResult }) {
  // A reckoning of its own: the figures and charts of an edit do not wait for it.
  const [latePlan, kits] = [useDeferredValue(plan), useDeferredValue(run.kits)];
  const again = useMemo(
    () => (latePlan.charges.length > 0 ? runOf({ ...latePlan, charges: [] }, kits) : null),
    [latePlan, kits],
  );
  const largest = run.heads
    .flatMap(({ id, share }) => (share.known ? [{ id, share: share.value }] : []))
    .reduce<{ id: HeadId; share: string } | null>(
      (most, head) => (!most || Number(head.share) > Number(most.share) ? head : most),
      null,
    );
  if (!largest) return null;
  const [name, verb] = NAMES[largest.id];
  return (
    <MarginNote title="What weighs most">
      <p>
        {name} {verb} {shareText(largest.share)} of a kit.
        {again?.perKit.used.known && (
          <>
            {" "}
            A second run of {kits} would not carry the once-only costs:{" "}
            {moneyText(again.perKit.used.value, run.currency)} a kit.
          </>
        )}
      </p>
      {run.earnedPerHour.known && (
        <p>
          Your work comes to {moneyText(run.earnedPerHour.value, run.currency)} an hour if all are sold,
          whatever you count an hour at.
        </p>
      )}
    </MarginNote>
  );
}
