import { z } from "zod";
import { LINE_MARKS, PART_CLASSES, VALUE_UNITS } from "./limits.ts";

/** A part as it read when a revision ended; without stock and cost, which are no part of a revision. */
const SnapshotPart = z.strictObject({
  id: z.string(),
  class: z.enum(PART_CLASSES),
  name: z.string(),
  spec: z.string(),
  value: z.string().nullable(),
  unit: z.enum(VALUE_UNITS).nullable(),
  tolerance: z.string().nullable(),
  power: z.string().nullable(),
  voltage: z.string().nullable(),
  package: z.string(),
  holeSpacing: z.string().nullable(),
  manufacturer: z.string(),
  manufacturerPartNumber: z.string(),
  datasheet: z.string(),
  drawer: z.string(),
  note: z.string(),
});

/** A parts list as it stood at one moment: what `revisions.snapshot` holds. */
export const PartsSnapshot = z.strictObject({
  editions: z.array(z.strictObject({ id: z.string(), name: z.string() })),
  lines: z.array(
    z.strictObject({
      id: z.string(),
      position: z.int(),
      designators: z.string(),
      mark: z.enum(LINE_MARKS),
      note: z.string(),
      part: SnapshotPart,
      quantities: z.array(z.strictObject({ edition: z.string(), perKit: z.int() })),
    }),
  ),
});
export type PartsSnapshot = z.infer<typeof PartsSnapshot>;
export type SnapshotPart = z.infer<typeof SnapshotPart>;
