import { index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, oneOf, version, wholeNumber } from "#db/columns.ts";
import { ofKit } from "#db/of-kit.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { BOARD_PRICE_MODELS } from "#src/shapes/limits.ts";

/** A board house's quote for one kit's board. */
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
    layers: integer("layers"),
    finish: text("finish").notNull(),
    colour: text("colour").notNull(),
    priceModel: text("price_model", { enum: BOARD_PRICE_MODELS }).notNull(),
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
    amountText(t.width),
    amountText(t.height),
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
