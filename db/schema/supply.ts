import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, moment, oneOf, version, wholeNumber } from "#db/columns.ts";
import { ofKit } from "#db/of-kit.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { FREIGHT_TERMS, PRICE_MODELS, SMALL_ORDER_TERMS } from "#src/shapes/limits.ts";
import { parts } from "./parts.ts";

/** Who sells parts, with terms in the supplier's own currency. */
export const suppliers = sqliteTable(
  "suppliers",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    name: text("name").notNull(),
    currency: text("currency").notNull(),
    freightTerm: text("freight_term", { enum: FREIGHT_TERMS }).notNull(),
    freightAmount: amount("freight_amount"),
    freeFreightFrom: amount("free_freight_from"),
    handlingFee: amount("handling_fee").notNull(),
    minimumOrderValue: amount("minimum_order_value"),
    smallOrderTerm: text("small_order_term", { enum: SMALL_ORDER_TERMS }).notNull(),
    smallOrderFee: amount("small_order_fee"),
    leadTimeDays: integer("lead_time_days"),
    note: text("note").notNull(),
    version: version(),
  },
  (t) => [
    uniqueIndex("suppliers_name").on(t.workshopId, t.name),
    oneOf(t.freightTerm, FREIGHT_TERMS),
    oneOf(t.smallOrderTerm, SMALL_ORDER_TERMS),
    amountText(t.freightAmount),
    amountText(t.freeFreightFrom),
    amountText(t.handlingFee),
    amountText(t.minimumOrderValue),
    amountText(t.smallOrderFee),
    wholeNumber(t.leadTimeDays),
  ],
);

/** One supplier's price for one part. */
export const offers = sqliteTable(
  "offers",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    partId: id("part_id")
      .notNull()
      .references(() => parts.id, { onDelete: "cascade" }),
    supplierId: id("supplier_id")
      .notNull()
      .references(() => suppliers.id, { onDelete: "cascade" }),
    orderCode: text("order_code").notNull(),
    currency: text("currency").notNull(),
    priceModel: text("price_model", { enum: PRICE_MODELS }).notNull(),
    minimumOrder: integer("minimum_order").notNull(),
    orderMultiple: integer("order_multiple").notNull(),
    /** What the supplier showed; null: not shown. */
    stockShown: integer("stock_shown"),
    /** Null: the supplier's usual lead time. */
    leadTimeDays: integer("lead_time_days"),
    pricedOn: text("priced_on"),
    validUntil: text("valid_until"),
    note: text("note").notNull(),
    version: version(),
  },
  (t) => [
    uniqueIndex("offers_code").on(t.partId, t.supplierId, t.orderCode),
    index("offers_supplier").on(t.supplierId),
    oneOf(t.priceModel, PRICE_MODELS),
    wholeNumber(t.minimumOrder, 1),
    wholeNumber(t.orderMultiple, 1),
    wholeNumber(t.stockShown),
    wholeNumber(t.leadTimeDays),
  ],
);

/** A rung of an offer's ladder: per piece, or per lot where the offer is in lots. */
export const offerBreaks = sqliteTable(
  "offer_breaks",
  {
    ...ofWorkshop(),
    offerId: id("offer_id")
      .notNull()
      .references(() => offers.id, { onDelete: "cascade" }),
    quantity: integer("quantity").notNull(),
    price: amount("price").notNull(),
  },
  (t) => [primaryKey({ columns: [t.offerId, t.quantity] }), wholeNumber(t.quantity, 1), amountText(t.price)],
);

/** Suppliers a kit does without. */
export const shutOutSuppliers = sqliteTable(
  "shut_out_suppliers",
  {
    ...ofKit(),
    supplierId: id("supplier_id")
      .notNull()
      .references(() => suppliers.id, { onDelete: "cascade" }),
  },
  (t) => [primaryKey({ columns: [t.kitId, t.supplierId] })],
);

/** Reporting units per one foreign unit from a day on, by hand or from a file of rates. */
export const currencyRates = sqliteTable(
  "currency_rates",
  {
    ...ofWorkshop(),
    currency: text("currency").notNull(),
    perForeignUnit: amount("per_foreign_unit").notNull(),
    dated: text("dated").notNull(),
    setAt: moment("set_at").notNull(),
    version: version(),
  },
  (t) => [primaryKey({ columns: [t.workshopId, t.currency, t.dated] }), amountText(t.perForeignUnit)],
);
