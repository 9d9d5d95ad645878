import { z } from "zod";
import { today } from "#src/server/clock.ts";
import { type KitPlan, kitPlan, planFile } from "#src/server/kit-plan.ts";
import { route } from "#src/server/route.ts";

/** The kit's plan with the versions of its rows; `?download=1` gives the plan alone, as a file. */
export const GET = route({
  may: "see-money",
  query: z.object({ download: z.literal("1").optional() }),
  run({ db, workshop, kit, query }): KitPlan {
    const found = kitPlan(db, workshop, kit, today());
    return query.download ? (planFile(found.plan) as never) : found;
  },
});
