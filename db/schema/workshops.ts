import { index, primaryKey, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, moment, oneOf, version } from "#db/columns.ts";
import { ROLES } from "#src/shapes/limits.ts";
import { users } from "./people.ts";

export const workshops = sqliteTable(
  "workshops",
  {
    id: id("id").primaryKey(),
    name: text("name").notNull(),
    /** Reporting currency, ISO 4217. */
    currency: text("currency").notNull(),
    /** Cost of an hour's own work in reporting currency; null: not decided. */
    ratePerHour: amount("rate_per_hour"),
    createdAt: moment("created_at").notNull(),
    version: version(),
  },
  (t) => [amountText(t.ratePerHour)],
);

export const memberships = sqliteTable(
  "memberships",
  {
    workshopId: id("workshop_id")
      .notNull()
      .references(() => workshops.id, { onDelete: "cascade" }),
    userId: id("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    role: text("role", { enum: ROLES }).notNull(),
    createdAt: moment("created_at").notNull(),
    version: version(),
  },
  (t) => [
    primaryKey({ columns: [t.workshopId, t.userId] }),
    index("memberships_user").on(t.userId),
    oneOf(t.role, ROLES),
  ],
);

/** Personal access tokens for scripts: each speaks for one person in one workshop. */
export const accessTokens = sqliteTable(
  "access_tokens",
  {
    id: id("id").primaryKey(),
    workshopId: id("workshop_id")
      .notNull()
      .references(() => workshops.id, { onDelete: "cascade" }),
    userId: id("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    name: text("name").notNull(),
    tokenHash: text("token_hash").notNull(),
    createdAt: moment("created_at").notNull(),
    expiresAt: moment("expires_at").notNull(),
    lastUsedAt: moment("last_used_at"),
  },
  (t) => [uniqueIndex("access_tokens_hash").on(t.tokenHash), index("access_tokens_user").on(t.userId)],
);
