import { z } from "zod";
import { Amount, Rate, RateBelowOne, Share } from "./decimal-text.ts";
import * as limits from "./limits.ts";
import { Plan, PlanCharge, PlanEdition, PlanPacking, PlanTask } from "./plan.ts";

/** What people change of a kit's run: fields left out stay; the version is the one they have seen. */

const Version = z.int().min(1);
const RunSize = Plan.shape.run.shape.kits;

/** Run size, spares, yield, learning, replacements. */
export const RunChange = z
  .strictObject({
    kits: RunSize,
    sweepTo: RunSize,
    spareRate: Rate,
    boardYield: Share,
    boardConfidence: RateBelowOne,
    chosenQuoteId: z.string().min(1).max(64).nullable(),
    learningSlope: Share,
    kitsMadeBefore: z.int().min(0).max(limits.QUANTITY_MOST),
    replacementShare: Share,
    replacementCost: Amount.nullable(),
  })
  .partial()
  .extend({ version: Version });
export type RunChange = z.infer<typeof RunChange>;

export const PriceChange = z.strictObject({ version: Version, price: PlanEdition.shape.price });
export const WeightChange = z.strictObject({ version: Version, weight: PlanEdition.shape.weight });
export const HourRateChange = z.strictObject({ version: Version, ratePerHour: Amount.nullable() });

const Position = z.int().min(0).max(1_000_000).optional();

/** A new row of work, packing or once-only charges; without a position it comes last. */
export const TaskEntry = PlanTask.omit({ id: true }).extend({ position: Position });
export const PackingEntry = PlanPacking.omit({ id: true }).extend({ position: Position });
export const ChargeEntry = PlanCharge.omit({ id: true }).extend({ position: Position });
export type TaskEntry = z.infer<typeof TaskEntry>;
export type PackingEntry = z.infer<typeof PackingEntry>;
export type ChargeEntry = z.infer<typeof ChargeEntry>;

export const TaskChange = PlanTask.omit({ id: true }).partial().extend({ version: Version });
export const PackingChange = PlanPacking.omit({ id: true }).partial().extend({ version: Version });
export const ChargeChange = PlanCharge.omit({ id: true }).partial().extend({ version: Version });

/** A row is removed by somebody who has seen it as it is now. */
export const SeenVersion = z.strictObject({ version: z.coerce.number().int().min(1) });
