import { index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, oneOf, signedRate, version, wholeNumber } from "#db/columns.ts";
import { ofKit } from "#db/of-kit.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { TAX_STATED } from "#src/shapes/limits.ts";
import { editions } from "./kits.ts";

/** Ways to sell a kit, each with what it takes of a sale. Null: not known yet. */
export const channels = sqliteTable(
  "channels",
  {
    id: id("id").primaryKey(),
    ...ofKit(),
    position: integer("position").notNull(),
    name: text("name").notNull(),
    weight: integer("weight").notNull(),
    /** Edition ids as JSON; null: every edition. */
    editions: text("editions", { mode: "json" }).$type<string[] | null>(),
    discount: amount("discount").notNull(),
    taxRate: amount("tax_rate"),
    taxStated: text("tax_stated", { enum: TAX_STATED }).notNull(),
    feeRate: amount("fee_rate"),
    feeFixed: amount("fee_fixed"),
    feeOnPostage: integer("fee_on_postage", { mode: "boolean" }).notNull(),
    feeOnTax: integer("fee_on_tax", { mode: "boolean" }).notNull(),
    postageCharged: amount("postage_charged"),
    postagePaid: amount("postage_paid"),
    packingCost: amount("packing_cost"),
    otherName: text("other_name").notNull(),
    otherAmount: amount("other_amount"),
    otherSharedOver: integer("other_shared_over").notNull(),
    minutesPerOrder: amount("minutes_per_order"),
    kitsPerOrder: amount("kits_per_order").notNull(),
    version: version(),
  },
  (t) => [
    index("channels_kit").on(t.kitId, t.position),
    wholeNumber(t.weight),
    signedRate(t.discount),
    oneOf(t.taxStated, TAX_STATED),
    wholeNumber(t.otherSharedOver, 1),
    amountText(t.taxRate),
    amountText(t.feeRate),
    amountText(t.feeFixed),
    amountText(t.postageCharged),
    amountText(t.postagePaid),
    amountText(t.packingCost),
    amountText(t.otherAmount),
    amountText(t.minutesPerOrder),
    amountText(t.kitsPerOrder),
  ],
);

/** What a channel asks for an edition, whatever the list says. */
export const channelPrices = sqliteTable(
  "channel_prices",
  {
    ...ofWorkshop(),
    channelId: id("channel_id")
      .notNull()
      .references(() => channels.id, { onDelete: "cascade" }),
    editionId: id("edition_id")
      .notNull()
      .references(() => editions.id, { onDelete: "cascade" }),
    price: amount("price").notNull(),
  },
  (t) => [primaryKey({ columns: [t.channelId, t.editionId] }), amountText(t.price)],
);
