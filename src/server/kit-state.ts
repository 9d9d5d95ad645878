import type { Db } from "#db/client.ts";
import { costRun } from "#src/costing/cost-run.ts";
import { toSettle } from "#src/costing/to-settle.ts";
import { lineFaults } from "#src/partslist/line-faults.ts";
import { partsListOf } from "./parts-list.ts";
import { planOf } from "./plan.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";
import type { KitState } from "./trail.ts";

/** How many lines of the list somebody must see to, whatever they cost. */
function linesToSettle(db: Db, kit: KitRow): number {
  const lines = partsListOf(db, kit).lines.map(({ line, quantities }) => ({ ...line, quantities }));
  return lineFaults(lines).size;
}

/** Reckons a kit as it stands on the day `asOf`: its plan, the run's figures, and what is open in its list. */
export function kitState(db: Db, workshop: WorkshopRow, kit: KitRow, asOf: string): KitState {
  const plan = planOf(db, workshop, kit, asOf);
  const result = costRun(plan);
  return {
    plan,
    result,
    open: toSettle(plan, result),
    linesToSettle: linesToSettle(db, kit),
  };
}
