import type { Db } from "#db/client.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { planOf } from "./plan.ts";
import { channelsOf } from "./store/channel.ts";
import { editionsOf } from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { partChoicesOf } from "./store/part.ts";
import { chargesOf, packingItemsOf, runPlanOf, tasksOf } from "./store/run-plan.ts";

/** A kit's plan for its page, with the version of every row a person can change there. */
export interface KitPlan {
  plan: Plan;
  /** The run's spare rate, and the parts that have one of their own. */
  spare: { rate: string; own: string[] };
  versions: {
    /** Of the run plan itself. */
    run: number;
    workshop: number;
    /** Of editions, channels, tasks, packing items and charges, by id. */
    rows: Record<string, number>;
  };
}

/** The plan of a kit as it stands on the day `asOf`. */
export function kitPlan(db: Db, workshop: WorkshopRow, kit: KitRow, asOf: string): KitPlan {
  const rows = [
    ...editionsOf(db, kit.id),
    ...channelsOf(db, kit.id).map(({ channel }) => channel),
    ...tasksOf(db, kit.id),
    ...packingItemsOf(db, kit.id),
    ...chargesOf(db, kit.id),
  ];
  const run = runPlanOf(db, kit.id);
  const own = partChoicesOf(db, kit.id).filter(({ spareRate }) => spareRate !== null);
  return {
    plan: planOf(db, workshop, kit, asOf),
    spare: { rate: run.spareRate, own: own.map(({ partId }) => partId) },
    versions: {
      run: run.version,
      workshop: workshop.version,
      rows: Object.fromEntries(rows.map(({ id, version }) => [id, version])),
    },
  };
}

/** The plan as a file: what `POST /api/costing` takes. */
export function planFile(plan: Plan): Response {
  const name = plan.kit.replace(/[^\p{L}\p{N}]+/gu, "-").replace(/^-|-$/g, "") || "kit";
  return new Response(`${JSON.stringify(plan, null, 2)}\n`, {
    headers: {
      "content-type": "application/json",
      "cache-control": "no-store",
      "content-disposition": `attachment; filename="plan.json"; filename*=UTF-8''${encodeURIComponent(`${name}-plan.json`)}`,
    },
  });
}
