import { z } from "zod";
import { Millimetres, Side } from "./decimal-text.ts";
import { Name, Version } from "./field.ts";
import * as limits from "./limits.ts";

/** What a person may set of a board house's panel terms; lengths in millimetres. */
export const PanelTermsFields = z.strictObject({
  boardHouse: Name,
  largestWidth: Side,
  largestHeight: Side,
  /** `null`: no least size is stated. */
  leastWidth: Side.nullable(),
  leastHeight: Side.nullable(),
  separation: z.enum(limits.SEPARATIONS),
  gap: Millimetres,
  railSides: z.enum(limits.RAIL_SIDES),
  railWidth: Millimetres,
});
export type PanelTermsFields = z.infer<typeof PanelTermsFields>;

/** Refuses half a least size. */
function checkLeast({ leastWidth, leastHeight }: PanelTermsFields, context: z.RefinementCtx): void {
  const message = "Write both sides of the least panel, or neither.";
  if (leastWidth !== null && leastHeight === null)
    context.addIssue({ code: "custom", path: ["leastHeight"], message });
  if (leastWidth === null && leastHeight !== null)
    context.addIssue({ code: "custom", path: ["leastWidth"], message });
}

/** Whole panel terms; whether a panel can be made so is the core's to say. */
export const PanelTermsOfHouse = PanelTermsFields.superRefine(checkLeast);

export const NewPanelTerms = PanelTermsFields;
export const PanelTermsChange = PanelTermsFields.partial().extend({ version: Version });
