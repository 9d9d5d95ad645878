import { index, integer, primaryKey, sqliteTable, text, unique } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, oneOf, version, wholeNumber } from "#db/columns.ts";
import { ofKit } from "#db/of-kit.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { AREA_UNITS, BOARD_PRICE_MODELS, RAIL_SIDES, SEPARATIONS } from "#src/shapes/limits.ts";

/** A board house's quote for one kit's board, singly or in panels. */
export const boardQuotes = sqliteTable(
  "board_quotes",
  {
    id: id("id").primaryKey(),
    ...ofKit(),
    boardHouse: text("board_house").notNull(),
    currency: text("currency").notNull(),
    /** Millimetres, as quoted; null: not stated. */
    width: amount("width"),
    height: amount("height"),
    /** Null: the boards come singly. */
    boardsPerPanel: integer("boards_per_panel"),
    /** Outer size of the panel quoted for, in millimetres; null: not stated, or single boards. */
    panelWidth: amount("panel_width"),
    panelHeight: amount("panel_height"),
    /** For breaking a board out of its panel. */
    depanelling: amount("depanelling").notNull().default("0"),
    layers: integer("layers"),
    finish: text("finish").notNull(),
    colour: text("colour").notNull(),
    priceModel: text("price_model", { enum: BOARD_PRICE_MODELS }).notNull(),
    /** The next four: the terms of a formula; null for the other models. */
    setUp: amount("set_up"),
    areaRate: amount("area_rate"),
    areaUnit: text("area_unit", { enum: AREA_UNITS }),
    perBoard: amount("per_board"),
    engineeringCharge: amount("engineering_charge").notNull(),
    stencilCharge: amount("stencil_charge").notNull(),
    /** Null: not known yet. */
    freight: amount("freight"),
    leadTimeDays: integer("lead_time_days"),
    pricedOn: text("priced_on"),
    validUntil: text("valid_until"),
    note: text("note").notNull(),
    version: version(),
  },
  (t) => [
    index("board_quotes_kit").on(t.kitId),
    oneOf(t.priceModel, BOARD_PRICE_MODELS),
    oneOf(t.areaUnit, AREA_UNITS),
    amountText(t.width),
    amountText(t.height),
    amountText(t.panelWidth),
    amountText(t.panelHeight),
    amountText(t.depanelling),
    amountText(t.setUp),
    amountText(t.areaRate),
    amountText(t.perBoard),
    wholeNumber(t.boardsPerPanel, 2),
    amountText(t.engineeringCharge),
    amountText(t.stencilCharge),
    amountText(t.freight),
    wholeNumber(t.layers, 1),
    wholeNumber(t.leadTimeDays),
  ],
);

export const boardQuoteBreaks = sqliteTable(
  "board_quote_breaks",
  {
    ...ofWorkshop(),
    quoteId: id("quote_id")
      .notNull()
      .references(() => boardQuotes.id, { onDelete: "cascade" }),
    quantity: integer("quantity").notNull(),
    price: amount("price").notNull(),
  },
  (t) => [primaryKey({ columns: [t.quoteId, t.quantity] }), wholeNumber(t.quantity, 1), amountText(t.price)],
);

/** What a board house makes panels of a kit's board like; all its quotes for the kit share it. In millimetres. */
export const panelTerms = sqliteTable(
  "panel_terms",
  {
    id: id("id").primaryKey(),
    ...ofKit(),
    boardHouse: text("board_house").notNull(),
    /** Outer sizes, rails included, either way round. */
    largestWidth: amount("largest_width").notNull(),
    largestHeight: amount("largest_height").notNull(),
    /** Null: no least size is stated. */
    leastWidth: amount("least_width"),
    leastHeight: amount("least_height"),
    separation: text("separation", { enum: SEPARATIONS }).notNull(),
    /** Between boards and towards a rail; 0 where boards are scored. */
    gap: amount("gap").notNull(),
    railSides: text("rail_sides", { enum: RAIL_SIDES }).notNull(),
    railWidth: amount("rail_width").notNull(),
    version: version(),
  },
  (t) => [
    unique("panel_terms_house").on(t.kitId, t.boardHouse),
    oneOf(t.separation, SEPARATIONS),
    oneOf(t.railSides, RAIL_SIDES),
    amountText(t.largestWidth),
    amountText(t.largestHeight),
    amountText(t.leastWidth),
    amountText(t.leastHeight),
    amountText(t.gap),
    amountText(t.railWidth),
  ],
);
