import { expect, it } from "vitest";
import { howItComes } from "#src/components/islands/offers/how-it-comes.ts";
import type { PartOrder } from "#src/costing/run-result.ts";

const order = (over: Partial<PartOrder>) => ({ quantity: 800, boughtUp: null, ...over }) as PartOrder;

it("says the steps of DESIGN's picture of the offers", () => {
  const words = howItComes({
    line: { need: 720, spare: 15, fromStock: 0, orders: [order({})] },
    part: { quantities: [{ edition: "full", perKit: 6 }], spareRate: "0.02" },
    editions: [{ id: "full", kits: 120 }],
    orderMultiple: 100,
  });
  expect(words).toBe(
    "6 in each kit, 120 kits: 720. 2 in a hundred spare: 15. Sold in multiples of 100, so 800.",
  );
});

it("tells editions apart, and names what would do before more is bought", () => {
  const words = howItComes({
    line: {
      need: 680,
      spare: 0,
      fromStock: 30,
      orders: [order({ quantity: 1000, boughtUp: { insteadOf: 700 } as PartOrder["boughtUp"] })],
    },
    part: {
      quantities: [
        { edition: "full", perKit: 6 },
        { edition: "small", perKit: 2 },
        { edition: "bare", perKit: 0 },
      ],
      spareRate: "0",
    },
    editions: [
      { id: "bare", kits: 10 },
      { id: "full", kits: 110 },
      { id: "small", kits: 10 },
    ],
    orderMultiple: 100,
  });
  expect(words).toBe(
    "6 in each of 110 kits and 2 in each of 10: 680. From the shelf: 30. Sold in multiples of 100, so 700.",
  );
});
