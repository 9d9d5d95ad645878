import { index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, version, wholeNumber } from "#db/columns.ts";
import { ofKit } from "#db/of-kit.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { kits } from "./kits.ts";

/** One kit's run: how many, with which yield, spares and work. Null: not decided. */
export const runPlans = sqliteTable(
  "run_plans",
  {
    kitId: id("kit_id")
      .primaryKey()
      .references(() => kits.id, { onDelete: "cascade" }),
    ...ofWorkshop(),
    kits: integer("kits").notNull(),
    sweepTo: integer("sweep_to").notNull(),
    spareRate: amount("spare_rate").notNull(),
    boardYield: amount("board_yield").notNull(),
    boardConfidence: amount("board_confidence").notNull(),
    /** No foreign key: a quote that is gone leaves a choice that the reckoning names. */
    chosenQuoteId: id("chosen_quote_id"),
    learningSlope: amount("learning_slope").notNull(),
    kitsMadeBefore: integer("kits_made_before").notNull(),
    replacementShare: amount("replacement_share").notNull(),
    replacementCost: amount("replacement_cost"),
    version: version(),
  },
  (t) => [
    index("run_plans_workshop").on(t.workshopId),
    wholeNumber(t.kits, 1),
    wholeNumber(t.sweepTo, 1),
    wholeNumber(t.kitsMadeBefore),
    amountText(t.spareRate),
    amountText(t.boardYield),
    amountText(t.boardConfidence),
    amountText(t.learningSlope),
    amountText(t.replacementShare),
    amountText(t.replacementCost),
  ],
);

/** Work at the kitchen table. */
export const tasks = sqliteTable(
  "tasks",
  {
    id: id("id").primaryKey(),
    ...ofKit(),
    position: integer("position").notNull(),
    name: text("name").notNull(),
    /** Edition ids as JSON; null: every edition. */
    editions: text("editions", { mode: "json" }).$type<string[] | null>(),
    minutesPerKit: amount("minutes_per_kit").notNull(),
    setUpMinutes: amount("set_up_minutes").notNull(),
    version: version(),
  },
  (t) => [
    index("tasks_kit").on(t.kitId, t.position),
    amountText(t.minutesPerKit),
    amountText(t.setUpMinutes),
  ],
);

/** What goes round the parts: bags, box, sheet. */
export const packingItems = sqliteTable(
  "packing_items",
  {
    id: id("id").primaryKey(),
    ...ofKit(),
    position: integer("position").notNull(),
    name: text("name").notNull(),
    editions: text("editions", { mode: "json" }).$type<string[] | null>(),
    /** Reporting currency; null: not known yet. */
    costPerKit: amount("cost_per_kit"),
    version: version(),
  },
  (t) => [index("packing_items_kit").on(t.kitId, t.position), amountText(t.costPerKit)],
);

/** Charges paid once: prototypes, stencil, photographs, tests. */
export const charges = sqliteTable(
  "charges",
  {
    id: id("id").primaryKey(),
    ...ofKit(),
    position: integer("position").notNull(),
    name: text("name").notNull(),
    amount: amount("amount").notNull(),
    spreadOver: integer("spread_over"),
    version: version(),
  },
  (t) => [index("charges_kit").on(t.kitId, t.position), amountText(t.amount), wholeNumber(t.spreadOver, 1)],
);
