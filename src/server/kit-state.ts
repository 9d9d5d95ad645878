import type { Db } from "#db/client.ts";
import { costRun } from "#src/costing/cost-run.ts";
import { planOf } from "./plan.ts";
import type { KitRow } from "./store/kit.ts";
import { lineQuantitiesOf, linesOf } from "./store/line.ts";
import type { WorkshopRow } from "./store/membership.ts";
import type { KitState } from "./trail.ts";

/** How many lines say another quantity than their designators count, in the edition that takes most of them. */
function linesAtOdds(db: Db, kitId: string): number {
  const most = new Map<string, number>();
  for (const { lineId, perKit } of lineQuantitiesOf(db, kitId))
    most.set(lineId, Math.max(most.get(lineId) ?? 0, perKit));
  return linesOf(db, kitId).filter(({ line }) => {
    const counted = line.designators === "" ? 0 : line.designators.split(",").length;
    return counted > 0 && most.get(line.id) !== counted;
  }).length;
}

/** Reckons a kit as it stands on the day `asOf`: its plan, the run's figures, and what is open in its list. */
export function kitState(db: Db, workshop: WorkshopRow, kit: KitRow, asOf: string): KitState {
  const plan = planOf(db, workshop, kit, asOf);
  return {
    plan,
    result: costRun(plan),
    lines: linesOf(db, kit.id).length,
    linesAtOdds: linesAtOdds(db, kit.id),
  };
}
