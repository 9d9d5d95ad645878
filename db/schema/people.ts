import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { id, moment, oneOf, version, wholeNumber } from "#db/columns.ts";
import { ONE_TIME_PURPOSES } from "#src/shapes/limits.ts";

/** People; the only rows with sessions, one-time links and recovery codes that belong to no workshop. */
export const users = sqliteTable(
  "users",
  {
    id: id("id").primaryKey(),
    /** Lower case, as it is looked up. */
    email: text("email").notNull(),
    name: text("name").notNull(),
    /** Argon2id; null for a person who only signs in through an identity provider or a link. */
    passwordHash: text("password_hash"),
    emailConfirmedAt: moment("email_confirmed_at"),
    /** Encrypted with the server's own key; null while no second factor is set up. */
    totpSecret: text("totp_secret"),
    totpConfirmedAt: moment("totp_confirmed_at"),
    /** Last time step accepted, so that a code works once. */
    totpLastStep: integer("totp_last_step"),
    singleKeys: integer("single_keys", { mode: "boolean" }).notNull().default(true),
    /** The workshop they were in last, where signing in leads; null, or one they have left, leads to the first by name. */
    lastWorkshopId: id("last_workshop_id"),
    createdAt: moment("created_at").notNull(),
    version: version(),
  },
  (t) => [uniqueIndex("users_email").on(t.email)],
);

export const sessions = sqliteTable(
  "sessions",
  {
    /** SHA-256 of the token in the cookie; the token itself is stored nowhere. */
    tokenHash: text("token_hash").primaryKey(),
    userId: id("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    createdAt: moment("created_at").notNull(),
    expiresAt: moment("expires_at").notNull(),
    lastSeenAt: moment("last_seen_at").notNull(),
    /** False between the password and the second factor: such a session opens nothing else. */
    complete: integer("complete", { mode: "boolean" }).notNull(),
    /** The browser's own words, shortened, so that a person can tell their sessions apart. */
    browser: text("browser").notNull(),
  },
  (t) => [index("sessions_user").on(t.userId), index("sessions_expiry").on(t.expiresAt)],
);

export const oneTimeTokens = sqliteTable(
  "one_time_tokens",
  {
    tokenHash: text("token_hash").primaryKey(),
    purpose: text("purpose", { enum: ONE_TIME_PURPOSES }).notNull(),
    userId: id("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    /** The address the letter went to: a link confirms that address and no later one. */
    email: text("email").notNull(),
    expiresAt: moment("expires_at").notNull(),
  },
  (t) => [index("one_time_tokens_user").on(t.userId), oneOf(t.purpose, ONE_TIME_PURPOSES)],
);

export const recoveryCodes = sqliteTable(
  "recovery_codes",
  {
    userId: id("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    codeHash: text("code_hash").notNull(),
    usedAt: moment("used_at"),
  },
  (t) => [primaryKey({ columns: [t.userId, t.codeHash] })],
);

export const identities = sqliteTable(
  "identities",
  {
    issuer: text("issuer").notNull(),
    subject: text("subject").notNull(),
    userId: id("user_id")
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [primaryKey({ columns: [t.issuer, t.subject] }), index("identities_user").on(t.userId)],
);

/** How often something limited was tried in the current window, by a hashed key. */
export const attemptCounts = sqliteTable(
  "attempt_counts",
  {
    key: text("key").primaryKey(),
    count: integer("count").notNull(),
    windowEndsAt: moment("window_ends_at").notNull(),
  },
  (t) => [wholeNumber(t.count)],
);
