import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { costRun } from "#src/costing/cost-run.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { plainOrder } from "./plain-reckoning.ts";
import { offer, part, plan, supplier } from "./plans.ts";

vi.setConfig({ testTimeout: MANY_CASES });

/** Two or three offers with little stock, each from a supplier with flat freight. */
const shortOffers = fc.array(
  fc.record({
    stock: fc.integer({ min: 1, max: 25 }),
    price: fc.integer({ min: 1, max: 90 }),
    bulk: fc.integer({ min: 1, max: 90 }),
    bulkFrom: fc.integer({ min: 2, max: 20 }),
    minimumOrder: fc.integer({ min: 1, max: 6 }),
    orderMultiple: fc.constantFrom(1, 1, 3, 5),
    freight: fc.integer({ min: 0, max: 300 }),
  }),
  { minLength: 2, maxLength: 3 },
);

function planOf(
  list: readonly {
    stock: number;
    price: number;
    bulk: number;
    bulkFrom: number;
    minimumOrder: number;
    orderMultiple: number;
    freight: number;
  }[],
  need: number,
) {
  return plan({
    run: { kits: need, sweepTo: need },
    suppliers: list.map(({ freight }, index) =>
      supplier({
        id: `s${index}`,
        name: `S${index}`,
        freight: { model: "flat", amount: (freight / 100).toFixed(2) },
      }),
    ),
    parts: [
      part({
        onlyFromStock: true,
        offers: list.map(({ stock, price, bulk, bulkFrom, minimumOrder, orderMultiple }, index) =>
          offer({
            id: `o${index}`,
            supplier: `s${index}`,
            stockShown: stock,
            minimumOrder,
            orderMultiple,
            breaks: [
              { quantity: 1, price: (price / 1000).toFixed(3) },
              { quantity: bulkFrom, price: (bulk / 1000).toFixed(3) },
            ],
          }),
        ),
      }),
    ],
  });
}

/** Every permitted quantity of every offer, all together: least goods and freight, then least held. */
function bruteSplit(made: ReturnType<typeof planOf>, need: number): { value: number; held: number } | null {
  const offers = made.parts[0]?.offers ?? [];
  let best: { value: number; held: number } | null = null;
  const walk = (index: number, held: number, value: number): void => {
    if (index === offers.length) {
      const better = best === null || value < best.value || (value === best.value && held < best.held);
      if (held >= need && better) best = { value, held };
      return;
    }
    walk(index + 1, held, value);
    const one = offers[index];
    if (one === undefined) return;
    const terms = made.suppliers[index]?.freight;
    const freight = terms?.model === "flat" ? Math.round(Number(terms.amount) * 100) : 0;
    for (let quantity = one.minimumOrder; quantity <= (one.stockShown ?? 0); quantity += 1) {
      if (quantity % one.orderMultiple !== 0) continue;
      const cost = plainOrder(
        { ...one, breaks: one.breaks.filter((step) => step.quantity <= quantity), minimumOrder: quantity },
        quantity,
      ).cost;
      walk(index + 1, held + quantity, value + cost.times(100).toNumber() + freight);
    }
  };
  walk(0, 0, 0);
  return best;
}

describe("an order that no single offer covers", () => {
  test("is split the cheapest way: brute force over every quantity of every offer", () => {
    fc.assert(
      fc.property(shortOffers, fc.integer({ min: 2, max: 60 }), (list, need) => {
        const single = list.some(({ stock, orderMultiple, minimumOrder }) => {
          const most = stock - (stock % orderMultiple);
          return most >= need && most >= minimumOrder;
        });
        fc.pre(!single);
        const made = planOf(list, need);
        const line = costRun(made, need).parts[0];
        const best = bruteSplit(made, need);
        if (best === null) {
          expect(line?.state).toBe("short");
          const most = list.map(({ stock, orderMultiple, minimumOrder }) => {
            const whole = stock - (stock % orderMultiple);
            return whole >= minimumOrder ? whole : 0;
          });
          expect(line?.shortBy).toBe(need - most.reduce((a, b) => a + b, 0));
          return;
        }
        const freights = (line?.orders ?? []).map(
          ({ supplier: id }) => list[Number(id.slice(1))]?.freight ?? 0,
        );
        const goods = (line?.orders ?? []).map(({ extended }) => Math.round(Number(extended) * 100));
        expect({
          value: [...goods, ...freights].reduce((a, b) => a + b, 0),
          held: line?.ordered,
        }).toEqual(best);
      }),
      { numRuns: 80 },
    );
  });

  test("is short by so many when all offers together do not reach, and the figures say so", () => {
    const made = planOf(
      [{ stock: 30, price: 10, bulk: 10, bulkFrom: 2, minimumOrder: 1, orderMultiple: 1, freight: 0 }],
      125,
    );
    const run = costRun(made, 125);
    expect(run.parts[0]?.shortBy).toBe(95);
    expect(run.problems[0]).toEqual({ code: "short-part", at: { part: "part" }, facts: { by: 95 } });
    expect(run.used).toMatchObject({ known: false, without: "0" });
  });

  test("from two suppliers in two currencies is weighed by worth", () => {
    const made = plan({
      rates: [{ currency: "USD", perForeignUnit: "0.5", dated: "2026-03-01" }],
      suppliers: [
        supplier({ id: "a", name: "A" }),
        supplier({ id: "b", name: "B", currency: "USD" }),
        supplier({ id: "c", name: "C" }),
      ],
      parts: [
        part({
          onlyFromStock: true,
          offers: [
            offer({ id: "a", supplier: "a", stockShown: 7, breaks: [{ quantity: 1, price: "0.10" }] }),
            offer({
              id: "b",
              supplier: "b",
              currency: "USD",
              stockShown: 7,
              breaks: [{ quantity: 1, price: "0.18" }],
            }),
            offer({ id: "c", supplier: "c", stockShown: 7, breaks: [{ quantity: 1, price: "0.11" }] }),
          ],
        }),
      ],
    });
    const orders = costRun(made, 10).parts[0]?.orders.map(({ offer: id, quantity, extended }) => [
      id,
      quantity,
      extended,
    ]);
    expect(orders).toEqual([
      ["a", 3, "0.30"],
      ["b", 7, "1.26"],
    ]);
  });
});
