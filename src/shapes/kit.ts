import { z } from "zod";
import { Millimetres } from "./decimal-text.ts";
import { Name, ShortText, Version } from "./field.ts";
import { BOARD_SHAPES } from "./limits.ts";

const BOARD_MOST_MM = 1000;

/** A side or diameter of a board in millimetres; null while it is not drawn. */
const Side = Millimetres.refine((text) => Number(text) > 0, "A board is wider than 0 mm.")
  .refine((text) => Number(text) <= BOARD_MOST_MM, `Write at most ${BOARD_MOST_MM} mm.`)
  .nullable();

const fields = {
  name: Name,
  summary: ShortText,
  boardNeeded: z.boolean(),
  boardShape: z.enum(BOARD_SHAPES),
  boardWidth: Side,
  boardHeight: Side,
};

/** A kit that is begun: a name is enough. */
export const KitEntry = z.strictObject({ ...fields, summary: ShortText.default("") }).partial({
  boardNeeded: true,
  boardShape: true,
  boardWidth: true,
  boardHeight: true,
});
export type KitEntry = z.output<typeof KitEntry>;

/** What is changed of a kit; fields left out stay. A closed kit is kept and no longer among the current ones. */
export const KitChange = z
  .strictObject({ ...fields, closed: z.boolean() })
  .partial()
  .extend({ version: Version });
export type KitChange = z.infer<typeof KitChange>;

/** A kit made from another: everything is copied but its name. */
export const KitCopy = z.strictObject({ name: Name });
