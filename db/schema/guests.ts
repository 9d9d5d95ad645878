import { index, primaryKey, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { id, moment, oneOf } from "#db/columns.ts";
import { ofKit } from "#db/of-kit.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { ROLES } from "#src/shapes/limits.ts";
import { kits } from "./kits.ts";
import { users } from "./people.ts";

/** The kits a co-builder was asked to; other roles see every kit and have no rows here. */
export const kitGuests = sqliteTable(
  "kit_guests",
  {
    ...ofKit(),
    userId: id("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
  },
  (t) => [primaryKey({ columns: [t.kitId, t.userId] }), index("kit_guests_user").on(t.userId)],
);

export const invitations = sqliteTable(
  "invitations",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    email: text("email").notNull(),
    role: text("role", { enum: ROLES }).notNull(),
    /** For a co-builder: the kit they are asked to. */
    kitId: id("kit_id").references(() => kits.id, { onDelete: "cascade" }),
    tokenHash: text("token_hash").notNull(),
    invitedBy: id("invited_by").references(() => users.id, { onDelete: "set null" }),
    createdAt: moment("created_at").notNull(),
    expiresAt: moment("expires_at").notNull(),
    acceptedAt: moment("accepted_at"),
  },
  (t) => [
    uniqueIndex("invitations_token").on(t.tokenHash),
    index("invitations_workshop").on(t.workshopId),
    oneOf(t.role, ROLES),
  ],
);
