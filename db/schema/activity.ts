import { index, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { id, moment } from "#db/columns.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { kits } from "./kits.ts";
import { users } from "./people.ts";

/** Who changed what, when: written in the same transaction as the change. */
export const activity = sqliteTable(
  "activity",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    kitId: id("kit_id").references(() => kits.id, { onDelete: "set null" }),
    userId: id("user_id").references(() => users.id, { onDelete: "set null" }),
    at: moment("at").notNull(),
    /** What was done, such as "line.change"; the sentence is made where it is shown. */
    action: text("action").notNull(),
    subjectId: text("subject_id").notNull(),
    /** What the subject was called then, for reading after it is gone. */
    subjectName: text("subject_name").notNull(),
    /** Fields before and after, as JSON. Never passwords or tokens. */
    detail: text("detail", { mode: "json" }).notNull().$type<Record<string, unknown>>(),
  },
  (t) => [index("activity_workshop").on(t.workshopId, t.at), index("activity_kit").on(t.kitId, t.at)],
);
