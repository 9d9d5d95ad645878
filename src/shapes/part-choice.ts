import { z } from "zod";
import { RowId } from "./field.ts";
import { PlanPart } from "./plan.ts";

/** How one kit buys one part; null takes the kit's own setting. Fields left out stay. */
export const PartChoice = z
  .strictObject({
    /** null: the cheapest. */
    pinnedOfferId: RowId.nullable(),
    onlyFromStock: z.boolean(),
    spareRate: PlanPart.shape.spareRate.nullable(),
    leastSpare: PlanPart.shape.leastSpare,
    keepShare: PlanPart.shape.keepShare.nullable(),
  })
  .partial();
export type PartChoice = z.infer<typeof PartChoice>;

/** 0: the person has seen that nothing is chosen yet. */
export const ChoiceVersion = z.int().min(0);

export const PartChoiceChange = z.strictObject({ version: ChoiceVersion, set: PartChoice });
export type PartChoiceChange = z.infer<typeof PartChoiceChange>;
