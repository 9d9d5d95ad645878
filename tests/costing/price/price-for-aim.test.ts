import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import type { Aim } from "#src/costing/price/aims.ts";
import { priceContext } from "#src/costing/price/price-context.ts";
import { PRICE_ENDINGS, type PriceEnding } from "#src/costing/price/price-ending.ts";
import { priceForAim } from "#src/costing/price/price-for-aim.ts";
import { yieldsAt } from "#src/costing/price/price-yields.ts";
import { aimSentence } from "#src/costing/problem-words.ts";
import type { Plan, PlanChannel } from "#src/shapes/plan.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { channel, FOUR } from "./channels.ts";
import { D, plainGap } from "./plain-pricing.ts";
import { aimIn, pricedPlan } from "./random-channels.ts";

vi.setConfig({ testTimeout: MANY_CASES });

const scopes = fc.constantFrom(
  { edition: "full", channel: null },
  { edition: "full", channel: "c0" },
) as fc.Arbitrary<{ edition: string; channel: string | null }>;

const cases = pricedPlan.chain((made) =>
  fc.record({
    made: fc.constant(made),
    scope: scopes,
    aim: aimIn(made.places),
    ending: fc.constantFrom(...PRICE_ENDINGS),
  }),
);

/** Every price of the grid from nothing upward, as text. */
function* grid(ending: PriceEnding, places: number): Generator<string> {
  const step = ending === "none" ? new D(10).pow(-places) : new D(1);
  for (let price = new D(ending === "none" ? 0 : ending); ; price = price.plus(step)) yield price.toFixed();
}

describe("the least price for an aim", () => {
  test("is the one that trying every lower price finds", () => {
    let solved = 0;
    fc.assert(
      fc.property(cases, ({ made: { made, channels, places }, scope, aim, ending }) => {
        const context = priceContext({ ...made, channels });
        const answer = priceForAim(context, scope, aim, ending);
        if (!answer.found || Number(answer.price) * 10 ** places > 9000) return;
        const reaches = (price: string) =>
          !plainGap(made, channels, context.cost, scope, aim, new D(price), places).isNegative();
        let before: string | null = null;
        for (const price of grid(ending, places)) {
          if (reaches(price)) {
            expect([new D(answer.price).toFixed(), answer.before]).toEqual([price, before]);
            break;
          }
          expect(new D(price).lt(answer.price), `${price} fails, ${answer.price} was given`).toBe(true);
          before = price;
        }
        solved += 1;
      }),
      { numRuns: 400 },
    );
    expect(solved).toBeGreaterThan(250);
  });

  test("a higher fee never lowers it", () => {
    fc.assert(
      fc.property(cases, fc.integer({ min: 0, max: 500 }), ({ made, scope, aim, ending }, more) => {
        const dearer = made.channels.map((one) => ({
          ...one,
          feeRate: (Number(one.feeRate) + more / 10_000).toFixed(4),
        }));
        // The other editions keep their prices and pay the higher fee as well.
        const low = priceForAim(priceContext({ ...made.made, channels: made.channels }), scope, aim, ending);
        const high = priceForAim(priceContext({ ...made.made, channels: dearer }), scope, aim, ending);
        if (!low.found) expect(high.found).toBe(false);
        if (low.found && high.found) expect(new D(high.price).gte(low.price)).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  test("says what its price yields: no less than was aimed at, and less a step below", () => {
    fc.assert(
      fc.property(cases, ({ made: { made, channels }, scope, aim, ending }) => {
        const context = priceContext({ ...made, channels });
        const answer = priceForAim(context, scope, aim, ending);
        if (!answer.found) return;
        expect(reached(yieldsAt(context, scope, answer.price), aim)).not.toBe(false);
        if (answer.before !== null) {
          expect(reached(yieldsAt(context, scope, answer.before), aim)).not.toBe(true);
        }
      }),
      { numRuns: 300 },
    );
  });
});

/** Whether a price's yields reach an aim; null where they are the same to the last digit carried. */
function reached(yields: ReturnType<typeof yieldsAt>, aim: Aim): boolean | null {
  const [figure, target] = {
    "next-kit": () => [yields.nextKit, "0"] as const,
    "run-even": () => [yields.profit, "0"] as const,
    margin: () => [yields.margin, aim.aim === "margin" ? aim.rate : "0"] as const,
    "mark-up": () => [yields.markUp, aim.aim === "mark-up" ? aim.rate : "0"] as const,
    hour: () => [yields.perHour, aim.aim === "hour" ? aim.rate : "0"] as const,
    profit: () => {
      const [amount, rate] = aim.aim === "profit" ? [aim.amount, aim.taxRate ?? "0"] : ["0", "0"];
      return [yields.profit, new D(amount).div(new D(1).minus(rate)).toFixed(30)] as const;
    },
  }[aim.aim]();
  if (!figure.known) return null;
  const difference = new D(figure.value).minus(target);
  return difference.abs().lt("1e-20") ? null : difference.isPositive();
}

const SCOPE = { edition: "kit", channel: null };

function priced(made: Partial<Plan>, channels: PlanChannel[], aim: Aim, ending: PriceEnding = "none") {
  return priceForAim(priceContext({ ...plan(made), channels }), SCOPE, aim, ending);
}

const costing = (cost: string, kits = 1): Partial<Plan> => ({
  run: { kits, sweepTo: kits },
  editions: [edition()],
  charges: [{ id: "c", name: "C", amount: cost, spreadOver: null }],
});

describe("by hand", () => {
  test("14.95 kept with 21 % inside: 18.09, where 18.08 keeps 14.94", () => {
    // 18.09 · 21/121 = 3.1396 → 3.14, keeps 14.95; 18.08 · 21/121 = 3.1378 → 3.14, keeps 14.94.
    expect(priced(costing("14.95"), [channel({ taxRate: "0.21" })], { aim: "run-even" })).toEqual({
      found: true,
      price: "18.09",
      before: "18.08",
    });
  });

  test("a third of 10.00 each is paid exactly: three orders share a hire of 20.00 and a cost of 10.00", () => {
    const hire = channel({ other: { name: "Hire", amount: "20.00", sharedOver: 3 } });
    expect(priced(costing("10.00", 3), [hire], { aim: "run-even" })).toMatchObject({
      price: "10",
      before: "9.99",
    });
  });

  test("what is kept goes up in uneven steps: 0.12 does what 0.13 does not", () => {
    // Fee 45 %, tax 25 % inside. 0.12 pays 0.024 → 0.02 and 0.054 → 0.05, keeps 0.05; 0.13 pays 0.026 → 0.03
    // and 0.0585 → 0.06, keeps 0.04; 0.11 pays 0.02 and 0.05, keeps 0.04. Divided out it would be 0.05 ÷ 0.35.
    const uneven = channel({ taxRate: "0.25", feeRate: "0.45" });
    const context = priceContext({ ...plan(costing("0.05")), channels: [uneven] });
    expect(priceForAim(context, SCOPE, { aim: "run-even" })).toMatchObject({ price: "0.12", before: "0.11" });
    expect(yieldsAt(context, SCOPE, "0.13").left).toEqual({ known: true, value: "-0.01" });
  });

  test("up to an ending: the next price that ends so and does it", () => {
    const made = costing("14.95");
    const ends = (ending: PriceEnding) => {
      const answer = priced(made, [channel({ taxRate: "0.21" })], { aim: "run-even" }, ending);
      return answer.found ? [answer.before, answer.price] : null;
    };
    expect(PRICE_ENDINGS.map(ends)).toEqual([
      ["18.08", "18.09"],
      ["18", "19"],
      ["17.5", "18.5"],
      ["17.9", "18.9"],
      ["17.95", "18.95"],
      ["17.99", "18.99"],
    ]);
  });

  test("what costs nothing may be given away", () => {
    expect(priced(costing("0"), [channel()], { aim: "run-even" })).toEqual({
      found: true,
      price: "0",
      before: null,
    });
  });

  test("one channel, as though the edition were sold there alone", () => {
    const unpaid = { ...plan().work, ratePerHour: "0" };
    const context = priceContext({ ...plan({ ...costing("14.95"), work: unpaid }), channels: FOUR });
    const answer = priceForAim(context, { edition: "kit", channel: "shop" }, { aim: "run-even" });
    // 14.95 and 1.07 of postage paid.
    expect(answer).toMatchObject({ price: "16.02", before: "16.01" });
  });
});

describe("no price", () => {
  const sentence = (answer: ReturnType<typeof priceForAim>) =>
    answer.found || answer.problem === null
      ? null
      : [answer.problem.field, aimSentence(answer.problem, "Full kit", answer.problem.most)];

  test("tax and fees take all of a higher price", () => {
    const all = channel({ taxRate: "0.25", feeRate: "0.8" });
    expect(sentence(priced(costing("5"), [all], { aim: "run-even" }))).toEqual([
      "feeRate",
      "Tax and fees take what a higher price of Full kit brings, so no price reaches this. Lower the fee.",
    ]);
  });

  test("a margin above what tax and fees leave", () => {
    const fee = channel({ taxRate: "0.25", feeRate: "0.16" });
    // Of 1.25 a fee of 0.20 is paid and 0.25 of tax: 0.80 is kept of 1.00 without tax.
    expect(sentence(priced(costing("5"), [fee], { aim: "margin", rate: "0.8" }))).toEqual([
      "aim",
      "After tax and fees at most 0.8 of a higher price of Full kit is kept, so no price reaches this margin. Aim lower.",
    ]);
    expect(priced(costing("5"), [fee], { aim: "margin", rate: "0.79" })).toMatchObject({ found: true });
  });

  test("every channel has its own price", () => {
    const own = channel({ ownPrices: [{ edition: "kit", price: "3" }] });
    expect(sentence(priced(costing("5"), [own], { aim: "run-even" }))).toEqual([
      "ownPrices",
      "Every channel has its own price for Full kit, so its list price changes nothing. Clear one of them.",
    ]);
  });

  test("no yen end in .99", () => {
    const yen = priced({ ...costing("500"), currency: "JPY" }, [channel()], { aim: "run-even" }, ".99");
    expect(sentence(yen)).toEqual(["ending", "The currency has no amount with this ending. Choose another."]);
  });

  test("more than can be written", () => {
    const dear = costing("900000000000", 1);
    expect(sentence(priced(dear, [channel()], { aim: "mark-up", rate: "9" }))?.[1]).toContain(
      "too large to write",
    );
  });

  test("a term that is missing is named with its channel, and the price looked for is not asked for", () => {
    const gaps = channel({ taxRate: null, minutesPerOrder: null, feeOnTax: false });
    expect(priced(costing("5"), [gaps], { aim: "run-even" })).toEqual({
      found: false,
      problem: null,
      needs: [
        { code: "no-tax-rate", at: [{ channel: "site" }], page: "price" },
        { code: "no-order-minutes", at: [{ channel: "site" }], page: "price" },
      ],
    });
    expect(priced(costing("5"), [channel({ editions: [] })], { aim: "run-even" })).toMatchObject({
      needs: [{ code: "not-sold", at: [{ edition: "kit" }] }],
    });
  });
});
