import { expect, test } from "vitest";
import { working } from "#src/costing/working.ts";
import { offer, part, plan, supplier } from "./plans.ts";

test("an offer that is not taken shows what it charges, and what decides against it", () => {
  const made = plan({
    run: { kits: 84, sweepTo: 100 },
    rates: [{ currency: "USD", perForeignUnit: "0.5", dated: "2026-03-06" }],
    suppliers: [
      supplier(),
      supplier({ id: "far", name: "Far", currency: "USD", freight: { model: "flat", amount: "4" } }),
    ],
    parts: [
      part({
        offers: [
          offer({ id: "near", breaks: [{ quantity: 1, price: "0.01" }] }),
          offer({
            id: "far:1",
            supplier: "far",
            currency: "USD",
            breaks: [
              { quantity: 1, price: "0.12" },
              { quantity: 100, price: "0.08" },
            ],
          }),
          offer({ id: "short", breaks: [] }),
        ],
      }),
    ],
  });
  // 84 at 0.12 are 10.08, 100 at 0.08 are 8.00; with freight 12.00 dollars, at 0.5 6.00, against 0.84.
  const tree = working(made, 84, "offer:part:far:1");
  expect(tree?.title).toBe("Part from Far, for a run of 84");
  const written = tree?.lines.map(({ sign, label, amount, result }) => [
    sign,
    label,
    amount && "value" in amount ? amount.value : null,
    result,
  ]);
  expect(written).toEqual([
    [null, "To buy", "84", false],
    [null, "Ordered from Far", "100", false],
    ["×", "Price each from 100", "0.08", false],
    ["=", "Far charges", "8.00", true],
    ["+", "Freight, as though the part came alone", "4.00", false],
    ["=", "Alone", "12.00", false],
    ["×", "Rate of 6 March 2026", "0.5", false],
    ["=", "Converted", "6", false],
    [null, "84 would cost", "10.08", false],
    ["−", "100 cost less by", "2.08", false],
    ["=", "100 cost; 16 stay on the shelf", "8.00", false],
  ]);
  expect(tree?.notes.at(-1)).toBe("Not taken in this run: the part is bought from Tamsin.");
  expect(working(made, 84, "offer:part:near")?.notes.at(-1)).toBe("This offer is taken.");
  expect(working(made, 84, "offer:part:short")).toBeNull();
  expect(working(made, 84, "offer:part:nobody")).toBeNull();
  const opens = working(made, 84, "part:part")?.lines.flatMap(({ opens }) => opens ?? []);
  expect(opens).toContain("offer:part:far:1");
});
