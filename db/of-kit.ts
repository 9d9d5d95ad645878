import { id } from "./columns.ts";
import { ofWorkshop } from "./of-workshop.ts";
import { kits } from "./schema/kits.ts";

/** The columns by which a row belongs to a kit of a workshop, and goes with it. */
export const ofKit = () => ({
  ...ofWorkshop(),
  kitId: id("kit_id")
    .notNull()
    .references(() => kits.id, { onDelete: "cascade" }),
});
