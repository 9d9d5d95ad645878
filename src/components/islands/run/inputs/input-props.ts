import type { KitAddress } from "#src/components/islands/kit-address.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";

/** What every group of entries is handed. */
export interface InputProps {
  address: KitAddress;
  held: KitPlan;
  run: RunResult;
  may: { changeRun: boolean; changePrice: boolean };
}
