import { parts } from "#db/schema/parts.ts";
import { newId } from "#src/server/new-id.ts";
import type { WorkshopRow } from "#src/server/store/membership.ts";
import type { PartRow } from "#src/server/store/part.ts";
import type { App } from "./app.ts";

/** A part of a workshop, for offers to be made for. */
export function aPart(app: App, workshop: WorkshopRow, name = "LED, warm white"): PartRow {
  const words = { spec: "", package: "", manufacturer: "", manufacturerPartNumber: "", datasheet: "" };
  const row = { id: newId(), workshopId: workshop.id, class: "led" as const, name, ...words };
  return app.db
    .insert(parts)
    .values({ ...row, drawer: "", note: "", createdAt: app.now })
    .returning()
    .get();
}

/** A supplier whose terms are all settled; tests change what they are about. */
export const SUPPLIER = {
  name: "Lumenhof",
  currency: "EUR",
  freightTerm: "flat",
  freightAmount: "4.90",
  freeFreightFrom: null,
  handlingFee: "0",
  minimumOrderValue: null,
  smallOrderTerm: "none",
  smallOrderFee: null,
  leadTimeDays: 3,
  note: "",
} as const;

/** An offer for LEDs in bags of a hundred. */
export function anOffer(supplierId: string) {
  return {
    supplierId,
    orderCode: "LH-5WW-30",
    currency: "EUR",
    priceModel: "whole-order" as const,
    breaks: [
      { quantity: 100, price: "0.118" },
      { quantity: 500, price: "0.094" },
      { quantity: 1000, price: "0.062" },
    ],
    minimumOrder: 100,
    orderMultiple: 100,
    stockShown: 8400,
    leadTimeDays: null,
    pricedOn: "2026-03-07",
    validUntil: null,
    note: "",
  };
}

/** A board house's quote in two lots. */
export const QUOTE = {
  boardHouse: "Kilnside",
  currency: "EUR",
  width: "58",
  height: "42",
  boardsPerPanel: null,
  panelWidth: null,
  panelHeight: null,
  depanelling: "0",
  layers: 2,
  finish: "lead-free tin",
  colour: "petrol",
  priceModel: "lots",
  breaks: [
    { quantity: 50, price: "90.00" },
    { quantity: 100, price: "140.00" },
  ],
  setUp: null,
  areaRate: null,
  areaUnit: null,
  perBoard: null,
  engineeringCharge: "25.00",
  stencilCharge: "0",
  freight: "12.50",
  leadTimeDays: 12,
  pricedOn: "2026-03-01",
  validUntil: "2026-04-01",
  note: "",
} as const;

/** A house that routes panels with 2 mm between boards and rails of 5 mm along the long sides. */
export const PANEL_TERMS = {
  boardHouse: "Kilnside",
  largestWidth: "250",
  largestHeight: "200",
  leastWidth: null,
  leastHeight: null,
  separation: "routed",
  gap: "2",
  railSides: "long",
  railWidth: "5",
} as const;
