import { index, integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, moment, oneOf, version, wholeNumber } from "#db/columns.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import type { BoardMarks } from "#src/drawings/board-marks.ts";
import { BOARD_SHAPES } from "#src/shapes/limits.ts";

export const kits = sqliteTable(
  "kits",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    name: text("name").notNull(),
    /** One line that says what it does. */
    summary: text("summary").notNull(),
    /** Number of the current revision of the parts list: 1 is A, 2 is B. */
    revision: integer("revision").notNull().default(1),
    boardNeeded: integer("board_needed", { mode: "boolean" }).notNull().default(true),
    boardShape: text("board_shape", { enum: BOARD_SHAPES }).notNull().default("rectangle"),
    /** Millimetres; null: not drawn yet. A round board's diameter is its width. */
    boardWidth: amount("board_width"),
    boardHeight: amount("board_height"),
    /** What is drawn on the board, as JSON; null: the plain shape. Goes when the board gets another shape or size. */
    boardMarks: text("board_marks", { mode: "json" }).$type<BoardMarks>(),
    createdAt: moment("created_at").notNull(),
    closedAt: moment("closed_at"),
    version: version(),
  },
  (t) => [
    uniqueIndex("kits_name").on(t.workshopId, t.name),
    oneOf(t.boardShape, BOARD_SHAPES),
    wholeNumber(t.revision, 1),
    amountText(t.boardWidth),
    amountText(t.boardHeight),
  ],
);

export const editions = sqliteTable(
  "editions",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    kitId: id("kit_id")
      .notNull()
      .references(() => kits.id, { onDelete: "cascade" }),
    position: integer("position").notNull(),
    name: text("name").notNull(),
    /** Share of the run as a weight. */
    weight: integer("weight").notNull(),
    boardsPerKit: integer("boards_per_kit").notNull(),
    /** What the buyer pays, tax included, in reporting currency; null: not decided. */
    price: amount("price"),
    version: version(),
  },
  (t) => [
    index("editions_kit").on(t.kitId, t.position),
    uniqueIndex("editions_name").on(t.kitId, t.name),
    wholeNumber(t.position),
    wholeNumber(t.weight),
    wholeNumber(t.boardsPerKit),
    amountText(t.price),
  ],
);

/** The parts list as it stood when a revision ended, for comparing and for taking an import back. */
export const revisions = sqliteTable(
  "revisions",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    kitId: id("kit_id")
      .notNull()
      .references(() => kits.id, { onDelete: "cascade" }),
    number: integer("number").notNull(),
    endedAt: moment("ended_at").notNull(),
    endedBy: id("ended_by"),
    /** Lines, parts and quantities of the revision that ended, as JSON. */
    snapshot: text("snapshot", { mode: "json" }).notNull().$type<unknown>(),
  },
  (t) => [index("revisions_kit").on(t.kitId, t.number), wholeNumber(t.number, 1)],
);
