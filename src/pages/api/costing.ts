import { z } from "zod";
import { reckon } from "#src/server/reckon.ts";
import { route } from "#src/server/route.ts";
import { PLAN_BYTES, RUN_LEAST, RUN_MOST } from "#src/shapes/limits.ts";
import { PlanFile } from "#src/shapes/plan-file.ts";

/**
 * Reckons a plan and keeps nothing: the run, with `sweep=1` every run size, and how the figures come about.
 * `kits` overrides the plan's run; `working` is "main" (the usual), "all", figures by name, or empty for none.
 */
export const POST = route({
  may: "signed-in",
  query: z.strictObject({
    kits: z.coerce.number().int().min(RUN_LEAST).max(RUN_MOST).optional(),
    sweep: z.literal("1").optional(),
    working: z.string().max(4000).optional(),
  }),
  input: PlanFile,
  limit: PLAN_BYTES,
  run: ({ input, query }) => reckon(input, query),
});
