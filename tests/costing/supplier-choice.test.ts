import fc from "fast-check";
import { expect, test, vi } from "vitest";
import { preparePlan } from "#src/costing/prepare-plan.ts";
import type { PreparedPart } from "#src/costing/prepared-plan.ts";
import { better, chooseOffer, type WeighedOffer, weigh } from "#src/costing/supplier-choice.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { offer, part, plan, supplier } from "./plans.ts";
import { completePlan } from "./random-plans.ts";

vi.setConfig({ testTimeout: MANY_CASES });

/** Every offer weighed anew, nothing remembered. */
function plainChoice(part: PreparedPart, quantity: number): WeighedOffer | null {
  const weighed = part.usable.flatMap((offer) => weigh(offer, quantity) ?? []);
  return weighed.reduce<WeighedOffer | null>(
    (best, next) => (best === null || better(next, best) ? next : best),
    null,
  );
}

const seen = (choice: WeighedOffer | null) =>
  choice && { offer: choice.offer.offer.id, ...choice.order, alone: choice.alone };

test("what is remembered of earlier quantities never changes a choice, in whatever order they come", () => {
  fc.assert(
    fc.property(
      completePlan,
      fc.array(fc.oneof(fc.integer({ min: 1, max: 400 }), fc.integer({ min: 1, max: 40_000 })), {
        minLength: 1,
        maxLength: 60,
      }),
      fc.boolean(),
      (plan, quantities, ascending) => {
        const { parts } = preparePlan(plan, 25);
        const asked = ascending ? quantities.toSorted((a, b) => a - b) : quantities;
        for (const part of parts) {
          for (const quantity of asked) {
            expect(seen(chooseOffer(part, quantity, new Set()))).toEqual(seen(plainChoice(part, quantity)));
          }
        }
      },
    ),
    { numRuns: 400 },
  );
});

test("an offer whose goods reach free freight is seen again", () => {
  // 200 pieces: 20.00 with free freight against 24.00; at 100 it was 10.00 + 5.00 against 12.00.
  const { parts } = preparePlan(
    plan({
      suppliers: [
        supplier({ id: "dear", name: "Dear", freight: { model: "none" } }),
        supplier({
          id: "free",
          name: "Free",
          freight: { model: "flat", amount: "5" },
          freeFreightFrom: "20",
        }),
      ],
      parts: [
        part({
          id: "led",
          offers: [
            offer({ id: "at-12", supplier: "dear", breaks: [{ quantity: 1, price: "0.12" }] }),
            offer({ id: "at-10", supplier: "free", breaks: [{ quantity: 1, price: "0.10" }] }),
          ],
        }),
      ],
    }),
    400,
  );
  const chosen = (quantity: number) =>
    chooseOffer(parts[0] as PreparedPart, quantity, new Set())?.offer.offer.id;
  expect([100, 199, 200].map(chosen)).toEqual(["at-12", "at-12", "at-10"]);
});
