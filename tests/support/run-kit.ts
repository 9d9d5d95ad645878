import { editions } from "#db/schema/kits.ts";
import { lineQuantities, lines, parts } from "#db/schema/parts.ts";
import { charges, packingItems, runPlans, tasks } from "#db/schema/runs.ts";
import { offerBreaks, offers, suppliers } from "#db/schema/supply.ts";
import { addChannel } from "#src/server/store/channel.ts";
import type { KitRow } from "#src/server/store/kit.ts";
import type { WorkshopRow } from "#src/server/store/membership.ts";
import type { App } from "#tests/support/app.ts";

/** The price of one part in the kit below; no reply to a role that may not see money holds it. */
export const TELLTALE_PRICE = "0.773911";

/** A way to sell that takes nothing. */
const FREE_CHANNEL = {
  name: "Own site",
  position: 0,
  weight: 1,
  editions: null,
  discount: "0",
  taxRate: "0",
  taxStated: "inside",
  feeRate: "0",
  feeFixed: "0",
  feeOnPostage: true,
  feeOnTax: true,
  postageCharged: "0",
  postagePaid: "0",
  packingCost: "0",
  otherName: "",
  otherAmount: "0",
  otherSharedOver: 1,
  minutesPerOrder: "0",
  kitsPerOrder: "1",
} as const;

/**
 * A small kit with a run of 40 that can be reckoned by hand: no board, one part (two in a kit), one supplier
 * with flat freight, one task, one packing item, one once-only charge, one edition at 12.00, one channel
 * that takes nothing.
 */
export function runKit(
  app: App,
  workshop: WorkshopRow,
  name = "Gate Bell",
): KitRow & { edition: string; task: string; site: string } {
  const { db } = app;
  const kit = app.kit(workshop, { name, boardNeeded: false });
  const at = { workshopId: workshop.id, kitId: kit.id };
  const of = (name: string) => `${name}-${kit.id}`;
  db.insert(runPlans)
    .values({
      ...at,
      kits: 40,
      sweepTo: 200,
      spareRate: "0",
      boardYield: "1",
      boardConfidence: "0.95",
      learningSlope: "1",
      kitsMadeBefore: 0,
      replacementShare: "0",
    })
    .run();
  const site = of("site");
  addChannel(db, { ...at, ...FREE_CHANNEL, id: site }, []);
  const edition = of("edition");
  db.insert(editions)
    .values({ ...at, id: edition, position: 1, name: "Kit", weight: 1, boardsPerKit: 0, price: "12.00" })
    .run();
  addPart(app, at, edition);
  const task = of("task");
  db.insert(tasks)
    .values({ ...at, id: task, position: 1, name: "Bagging", minutesPerKit: "6", setUpMinutes: "30" })
    .run();
  db.insert(packingItems)
    .values({ ...at, id: of("bag"), position: 1, name: "Bag", costPerKit: "0.25" })
    .run();
  db.insert(charges)
    .values({ ...at, id: of("stencil"), position: 1, name: "Photographs", amount: "60" })
    .run();
  return { ...kit, edition, task, site };
}

function addPart(app: App, at: { workshopId: string; kitId: string }, edition: string): void {
  const { db } = app;
  const { workshopId } = at;
  const of = (name: string) => `${name}-${at.kitId}`;
  const part = of("part");
  const text = { spec: "", package: "", manufacturer: "", manufacturerPartNumber: "", datasheet: "" };
  db.insert(parts)
    .values({
      ...text,
      id: part,
      workshopId,
      class: "resistor",
      name: "10 kΩ",
      drawer: "",
      note: "",
      createdAt: app.now,
    })
    .run();
  const line = of("line");
  db.insert(lines)
    .values({ ...at, id: line, partId: part, position: 1, designators: "R1, R2", mark: "in-kit", note: "" })
    .run();
  db.insert(lineQuantities).values({ workshopId, lineId: line, editionId: edition, perKit: 2 }).run();
  const supplier = of("supplier");
  db.insert(suppliers)
    .values({
      id: supplier,
      workshopId,
      name: `Weir Parts ${at.kitId}`,
      currency: "EUR",
      freightTerm: "flat",
      freightAmount: "5",
      handlingFee: "0",
      smallOrderTerm: "none",
      note: "",
    })
    .run();
  const offer = of("offer");
  db.insert(offers)
    .values({
      id: offer,
      workshopId,
      partId: part,
      supplierId: supplier,
      orderCode: "WP-10K",
      currency: "EUR",
      priceModel: "whole-order",
      minimumOrder: 1,
      orderMultiple: 1,
      note: "",
    })
    .run();
  db.insert(offerBreaks).values({ workshopId, offerId: offer, quantity: 1, price: TELLTALE_PRICE }).run();
}
