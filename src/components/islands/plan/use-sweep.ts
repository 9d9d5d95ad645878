import { useEffect } from "react";
import type { Plan } from "#src/shapes/plan.ts";
import { useStore } from "./module-store.ts";
import { NO_SWEEP, orderSweep, type SweepState, sweepState } from "./sweep-of.ts";

/** Every run size of a plan. While it is worked out the last figures stay, and the state says so. */
export function useSweep(plan: Plan | undefined): SweepState {
  useEffect(() => {
    if (plan) orderSweep(plan);
  }, [plan]);
  return useStore(sweepState, NO_SWEEP);
}
