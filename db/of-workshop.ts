import { id } from "./columns.ts";
import { workshops } from "./schema/workshops.ts";

/** The column by which a row belongs to a workshop, and goes with it. */
export const ofWorkshop = () => ({
  workshopId: id("workshop_id")
    .notNull()
    .references(() => workshops.id, { onDelete: "cascade" }),
});
