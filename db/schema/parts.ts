import { index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { amount, amountText, id, moment, oneOf, version, wholeNumber } from "#db/columns.ts";
import { ofKit } from "#db/of-kit.ts";
import { ofWorkshop } from "#db/of-workshop.ts";
import { LINE_MARKS, PART_CLASSES, VALUE_UNITS } from "#src/shapes/limits.ts";
import { editions } from "./kits.ts";

/** What is bought and kept in a drawer. A part belongs to the workshop; several kits may use it. */
export const parts = sqliteTable(
  "parts",
  {
    id: id("id").primaryKey(),
    ...ofWorkshop(),
    class: text("class", { enum: PART_CLASSES }).notNull(),
    /** What people call it: "10 kΩ", "NPN transistor". */
    name: text("name").notNull(),
    /** The rest of the description: "5 %, 0.25 W". */
    spec: text("spec").notNull(),
    /** Value in SI units as exact decimal text, with its unit; both null where a part has no such value. */
    value: text("value"),
    unit: text("unit", { enum: VALUE_UNITS }),
    tolerance: text("tolerance"),
    power: text("power"),
    voltage: text("voltage"),
    /** Body and holes as people write them: "axial, 10 mm", "DIP-14". */
    package: text("package").notNull(),
    /** Hole spacing in millimetres. */
    holeSpacing: amount("hole_spacing"),
    manufacturer: text("manufacturer").notNull(),
    manufacturerPartNumber: text("manufacturer_part_number").notNull(),
    datasheet: text("datasheet").notNull(),
    drawer: text("drawer").notNull(),
    note: text("note").notNull(),
    /** Pieces on the shelf that are not promised elsewhere, and what one cost in reporting currency. */
    freeStock: integer("free_stock").notNull().default(0),
    stockCost: amount("stock_cost"),
    createdAt: moment("created_at").notNull(),
    version: version(),
  },
  (t) => [
    index("parts_workshop").on(t.workshopId, t.class),
    index("parts_number").on(t.workshopId, t.manufacturerPartNumber),
    oneOf(t.class, PART_CLASSES),
    oneOf(t.unit, VALUE_UNITS),
    wholeNumber(t.freeStock),
    amountText(t.stockCost),
    amountText(t.holeSpacing),
  ],
);

/** A line of a kit's parts list. */
export const lines = sqliteTable(
  "lines",
  {
    id: id("id").primaryKey(),
    ...ofKit(),
    partId: id("part_id")
      .notNull()
      .references(() => parts.id),
    position: integer("position").notNull(),
    /** Expanded, naturally sorted, one space after each comma: "R1, R2". Empty for a screw or a box. */
    designators: text("designators").notNull(),
    mark: text("mark", { enum: LINE_MARKS }).notNull(),
    note: text("note").notNull(),
    version: version(),
  },
  (t) => [
    index("lines_kit").on(t.kitId, t.position),
    index("lines_part").on(t.partId),
    oneOf(t.mark, LINE_MARKS),
    wholeNumber(t.position),
  ],
);

/** How many of a line go into one kit of an edition. */
export const lineQuantities = sqliteTable(
  "line_quantities",
  {
    ...ofWorkshop(),
    lineId: id("line_id")
      .notNull()
      .references(() => lines.id, { onDelete: "cascade" }),
    editionId: id("edition_id")
      .notNull()
      .references(() => editions.id, { onDelete: "cascade" }),
    perKit: integer("per_kit").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.lineId, t.editionId] }),
    index("line_quantities_edition").on(t.editionId),
    wholeNumber(t.perKit),
  ],
);

/** How one kit buys one part: pinned offer, spares, what is left over. Absent: the kit's own settings. */
export const partChoices = sqliteTable(
  "part_choices",
  {
    ...ofKit(),
    partId: id("part_id")
      .notNull()
      .references(() => parts.id, { onDelete: "cascade" }),
    /** No foreign key: an offer that is gone leaves a pin that the reckoning names. */
    pinnedOfferId: id("pinned_offer_id"),
    onlyFromStock: integer("only_from_stock", { mode: "boolean" }).notNull().default(false),
    spareRate: text("spare_rate"),
    leastSpare: integer("least_spare").notNull().default(0),
    keepShare: text("keep_share"),
    version: version(),
  },
  (t) => [
    primaryKey({ columns: [t.kitId, t.partId] }),
    index("part_choices_part").on(t.partId),
    wholeNumber(t.leastSpare),
    amountText(t.spareRate),
    amountText(t.keepShare),
  ],
);
