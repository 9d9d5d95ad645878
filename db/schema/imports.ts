import { index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { id, moment, oneOf, version, wholeNumber } from "#db/columns.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { IMPORT_KINDS, IMPORT_STATES } from "#src/shapes/limits.ts";
import { kits } from "./kits.ts";

/** A list being read: a draft until it is taken, kept afterwards so that it can be taken back. */
export const imports = sqliteTable(
  "imports",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    /** Null for a price list, which belongs to the workshop. */
    kitId: id("kit_id").references(() => kits.id, { onDelete: "cascade" }),
    kind: text("kind", { enum: IMPORT_KINDS }).notNull(),
    state: text("state", { enum: IMPORT_STATES }).notNull(),
    fileName: text("file_name").notNull(),
    byteLength: integer("byte_length").notNull(),
    /** Name of the text encoding it was read in, or of the kind of workbook. */
    encoding: text("encoding").notNull(),
    /** Of a workbook: the sheet that was taken, and the others that hold something, as JSON. */
    sheets: text("sheets", { mode: "json" }).$type<{ taken: string; others: string[] }>(),
    /** SHA-256 of the bytes: the same file twice is recognised. */
    contentHash: text("content_hash").notNull(),
    /** The decoded text itself; of a workbook the cells of its sheet, set out with tabs. */
    content: text("content").notNull(),
    /** Records of the text, blank ones too, for naming a list without reading it again. */
    rowCount: integer("row_count").notNull(),
    /** Of its heading as first guessed: lists of one shape share it, and what was settled for one holds for the next. */
    fingerprint: text("fingerprint").notNull().default(""),
    /** Whose the prices are where no column says: one of the workshop's suppliers, or the name of a new one. */
    supplierId: id("supplier_id"),
    supplierName: text("supplier_name"),
    /** The person's own choices: column meanings, and answers by row and question, as JSON. */
    mapping: text("mapping", { mode: "json" }).$type<unknown>(),
    answers: text("answers", { mode: "json" }).notNull().$type<unknown>(),
    createdBy: id("created_by"),
    createdAt: moment("created_at").notNull(),
    takenAt: moment("taken_at"),
    takenBy: id("taken_by"),
    /** What taking it did, in numbers, for the list of what was brought in. */
    outcome: text("outcome", { mode: "json" }).$type<unknown>(),
    /** What stood before it was taken, and what it left, for taking it back. */
    before: text("before", { mode: "json" }).$type<unknown>(),
    version: version(),
  },
  (t) => [
    index("imports_workshop").on(t.workshopId, t.createdAt),
    index("imports_kit").on(t.kitId, t.createdAt),
    oneOf(t.kind, IMPORT_KINDS),
    oneOf(t.state, IMPORT_STATES),
    wholeNumber(t.byteLength),
    wholeNumber(t.rowCount),
  ],
);

/** What the columns of a heading meant the last time, by the heading's fingerprint. */
export const columnMemories = sqliteTable(
  "column_memories",
  {
    ...ofWorkshop(),
    kind: text("kind", { enum: IMPORT_KINDS }).notNull(),
    fingerprint: text("fingerprint").notNull(),
    mapping: text("mapping", { mode: "json" }).notNull().$type<unknown>(),
    usedAt: moment("used_at").notNull(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.kind, t.fingerprint] }), oneOf(t.kind, IMPORT_KINDS)],
);
