import { useEffect } from "react";
import type { Plan } from "#src/shapes/plan.ts";
import { useStore } from "./module-store.ts";
import { NO_SWEEP, type SweepState, sweepAtOnce, sweepAway, sweepState } from "./sweep-of.ts";

/** Every run size of a plan. While it is worked out the last figures stay, and the state says so. */
export function useSweep(plan: Plan | undefined): SweepState {
  const away = useStore(sweepState, NO_SWEEP);
  const sweep = plan ? sweepAtOnce(plan) : null;
  const slow = plan !== undefined && sweep === null;
  useEffect(() => {
    if (plan && slow) sweepAway(plan);
  }, [plan, slow]);
  return plan && sweep ? { plan, sweep, workingOut: false } : away;
}
