import { z } from "zod";
import { Name, RowId, Version } from "./field.ts";
import { EDITIONS_MOST } from "./limits.ts";
import { PlanEdition } from "./plan.ts";

const fields = {
  name: Name,
  weight: PlanEdition.shape.weight,
  boardsPerKit: PlanEdition.shape.boardsPerKit,
};

/** A new edition; `like` names one whose quantities it begins with, `null` begins without any. */
export const EditionEntry = z.strictObject({ ...fields, like: RowId.nullable() });
export type EditionEntry = z.infer<typeof EditionEntry>;

export const EditionChange = z.strictObject(fields).partial().extend({ version: Version });
export type EditionChange = z.infer<typeof EditionChange>;

/** Every edition of the kit, in the order they shall have. */
export const EditionOrder = z.strictObject({ editions: z.array(RowId).min(1).max(EDITIONS_MOST) });
