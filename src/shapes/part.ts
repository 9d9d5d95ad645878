import { z } from "zod";
import { Amount } from "./decimal-text.ts";
import { Name, Note, Pieces, ShortText, Version } from "./field.ts";
import { PART_CLASSES, TEXT_LENGTH, VALUE_UNITS } from "./limits.ts";

/** A value in SI units: as exact as picofarads need it. */
const SiValue = z
  .string()
  .regex(/^\d{1,12}(\.\d{1,18})?$/, "Write the value in its SI unit, digits with a point.")
  .nullable();

const Property = ShortText.nullable();

const fields = {
  class: z.enum(PART_CLASSES),
  name: Name,
  spec: z.string().trim().max(TEXT_LENGTH, `Write at most ${TEXT_LENGTH} characters.`),
  value: SiValue,
  unit: z.enum(VALUE_UNITS).nullable(),
  tolerance: Property,
  power: Property,
  voltage: Property,
  package: ShortText,
  holeSpacing: Amount.nullable(),
  manufacturer: ShortText,
  manufacturerPartNumber: ShortText,
  datasheet: z.string().trim().max(TEXT_LENGTH, `Write at most ${TEXT_LENGTH} characters.`),
  drawer: ShortText,
  note: Note,
  freeStock: Pieces,
  stockCost: Amount.nullable(),
};

/** A value has a unit, and a unit a value. */
function checkValue(part: { value?: string | null; unit?: string | null }, context: z.RefinementCtx): void {
  if ((part.value ?? null) === null && (part.unit ?? null) === null) return;
  if (part.value == null)
    context.addIssue({ code: "custom", path: ["value"], message: "A unit needs its value." });
  if (part.unit == null)
    context.addIssue({ code: "custom", path: ["unit"], message: "A value needs its unit." });
}

/** Fields of a part that are changed; those left out stay. Value and unit change together. */
export const PartFields = z.strictObject(fields).partial().superRefine(checkValue);
export type PartFields = z.infer<typeof PartFields>;

/** A new part: kind and name are enough. */
export const PartEntry = z
  .strictObject(fields)
  .partial()
  .required({ class: true, name: true })
  .superRefine(checkValue);
export type PartEntry = z.infer<typeof PartEntry>;

/** A change of a part in every kit that uses it. */
export const PartChange = z.strictObject({ version: Version, set: PartFields });
export type PartChange = z.infer<typeof PartChange>;
