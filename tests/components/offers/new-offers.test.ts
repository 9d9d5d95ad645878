import { describe, expect, it } from "vitest";
import { newRows } from "#src/components/islands/cells/block.ts";
import { readNewOffers, refusedOffer } from "#src/components/islands/offers/new-offers.ts";
import { offerColumns } from "#src/components/islands/offers/offer-columns.ts";
import type { KitOffers } from "#src/server/kit-offers.ts";

const part = (id: string, name: string, designators: string) => ({
  id,
  name,
  spec: "",
  class: "other" as const,
  value: null,
  lines: [1],
  designators,
  choiceVersion: 0,
});

const SUPPLY = {
  parts: [
    part("led", "LED, red", "LED1, LED2"),
    part("cell", "Holder", "BT1"),
    part("also", "Holder", "BT2"),
  ],
  suppliers: [{ id: "lumen", name: "Lumenhof", currency: "EUR" }],
  offers: [
    {
      id: "o",
      partId: "led",
      supplierId: "lumen",
      orderCode: "LH-3R",
      breaks: [],
      priceModel: "whole-order",
    },
  ],
} as unknown as KitOffers;

const COLUMNS = offerColumns({
  ...SUPPLY,
  offers: [{ ...SUPPLY.offers[0], breaks: [{ quantity: 100, price: "1" }] }],
} as KitOffers);

const read = (rows: Record<string, string>[]) => readNewOffers(rows, SUPPLY, COLUMNS, "2026-03-09");

describe("a block pasted below the last row", () => {
  it("becomes rows by the columns it covers; empty lines are none", () => {
    expect(
      newRows(
        [
          ["LED1", "Lumenhof"],
          ["", ""],
          ["BT1", "", "x"],
        ],
        ["part", "supplier"],
        "part",
      ),
    ).toEqual([
      { part: "LED1", supplier: "Lumenhof" },
      { part: "BT1", supplier: "" },
    ]);
  });

  it("names parts by name, by a designator or by a known order code", () => {
    const rows = ["led, RED", "LED2", "LH-3R", "BT1"].map((name) => ({ part: name, supplier: "lumenhof" }));
    const { add, faults } = read(rows);
    expect(faults).toEqual([]);
    expect(add.map(({ partId }) => partId)).toEqual(["led", "led", "led", "cell"]);
    expect(add[0]).toMatchObject({ supplierId: "lumen", currency: "EUR", pricedOn: "2026-03-09" });
  });

  it("takes what else stands in the row", () => {
    const { add } = read([
      {
        part: "BT1",
        supplier: "Lumenhof",
        orderCode: "B",
        minimumOrder: "10",
        "break-100": "0,9",
        validUntil: "",
      },
    ]);
    expect(add[0]).toMatchObject({
      orderCode: "B",
      minimumOrder: 10,
      breaks: [{ quantity: 100, price: "0.9" }],
      validUntil: null,
    });
  });

  it("names the row and the cell of what cannot be read", () => {
    const { faults } = read([
      { part: "Holder", supplier: "Nobody" },
      { part: "X9", supplier: "", "break-100": "soon" },
    ]);
    expect(faults.map(({ row, column, entry }) => [row, column, entry])).toEqual([
      [1, "part", "Holder"],
      [1, "supplier", "Nobody"],
      [2, "part", "X9"],
      [2, "supplier", ""],
      [2, "break-100", "soon"],
    ]);
    expect(faults[0]?.sentence).toContain("More than one part");
  });

  it("finds the cell of what the server refuses", () => {
    const refused = { at: "add.1.orderCode", message: "It stands already." };
    expect(refusedOffer(refused, [{}, { orderCode: "LH-3R" }], COLUMNS)).toEqual({
      row: 2,
      column: "orderCode",
      entry: "LH-3R",
      sentence: "It stands already.",
    });
  });
});
