import { z } from "zod";
import { Note, RowId, Version } from "./field.ts";
import { LINE_MARKS, PARTS_MOST, QUANTITY_PER_KIT_MOST, TEXT_LENGTH } from "./limits.ts";
import { PartEntry, PartFields } from "./part.ts";
import { ChoiceVersion, PartChoice } from "./part-choice.ts";

/** Pieces in one kit, by edition; editions left out stay as they are. */
export const Quantities = z.record(
  RowId,
  z
    .int("Write a whole number.")
    .min(0, "A quantity is not negative.")
    .max(QUANTITY_PER_KIT_MOST, `Write at most ${QUANTITY_PER_KIT_MOST}.`),
);

const Designators = z.string().trim().max(TEXT_LENGTH, `Write at most ${TEXT_LENGTH} characters.`);

const line = {
  designators: Designators,
  mark: z.enum(LINE_MARKS),
  note: Note,
  quantities: Quantities,
};

/** Place in the list, counted from 0. */
const Place = z.int().min(0).max(PARTS_MOST);

/** One step of a change to a parts list. Each names the version it has seen of what it changes. */
export const PartsChange = z.discriminatedUnion("do", [
  z.strictObject({
    do: z.literal("change-line"),
    line: RowId,
    version: Version,
    /** `part` takes another part of the workshop instead. */
    set: z.strictObject({ ...line, part: RowId }).partial(),
  }),
  z.strictObject({
    do: z.literal("change-part"),
    part: RowId,
    version: Version,
    set: PartFields,
  }),
  z.strictObject({
    /** Gives the line a part of its own, like the one it has but for `set`; without that one's offers. */
    do: z.literal("own-part"),
    line: RowId,
    version: Version,
    set: PartFields,
  }),
  z.strictObject({
    do: z.literal("choose"),
    part: RowId,
    version: ChoiceVersion,
    set: PartChoice,
  }),
  z.strictObject({
    do: z.literal("add-line"),
    /** An id of its own, so that a line that was removed can come back as the same line. */
    line: RowId.optional(),
    /** Last, where it is left out. */
    at: Place.optional(),
    ...line,
    part: z.union([RowId, PartEntry]),
  }),
  z.strictObject({ do: z.literal("remove-line"), line: RowId, version: Version }),
  z.strictObject({ do: z.literal("move-line"), line: RowId, to: Place }),
]);
export type PartsChange = z.infer<typeof PartsChange>;

/** Steps that are taken together or not at all. */
export const PartsChanges = z.strictObject({
  changes: z
    .array(PartsChange)
    .min(1)
    .max(4 * PARTS_MOST),
});
export type PartsChanges = z.infer<typeof PartsChanges>;
