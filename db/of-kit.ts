import { id } from "./columns.ts";
import { ofWorkshop } from "./of-workshop.ts";
import { kits } from "./schema/kits.ts";

/** The columns by which a row belongs to a kit of a workshop, and goes with it. */
export function ofKit() {
  // A declared function, not a constant: kits.ts, which this file points back to, uses it while it loads.
  return {
    ...ofWorkshop(),
    kitId: id("kit_id")
      .notNull()
      .references(() => kits.id, { onDelete: "cascade" }),
  };
}
