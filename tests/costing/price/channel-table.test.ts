import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Figure } from "#src/costing/figure.ts";
import { grains, grainText } from "#src/costing/grains.ts";
import { type ChannelOrder, channelTable } from "#src/costing/price/channel-table.ts";
import { priceContext } from "#src/costing/price/price-context.ts";
import { yieldsAt } from "#src/costing/price/price-yields.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { channel, FOUR } from "./channels.ts";
import { D, plainAsked, plainKept } from "./plain-pricing.ts";
import { pricedPlan } from "./random-channels.ts";

/** A run of 120 that uses 1793.65, with 11 minutes to pack a kit. */
const made = plan({
  run: { kits: 120, sweepTo: 120 },
  editions: [edition({ price: "34.00" })],
  charges: [{ id: "all", name: "All", amount: "1793.65", spreadOver: null }],
  work: {
    ratePerHour: "0",
    learningSlope: "1",
    kitsMadeBefore: 0,
    tasks: [{ id: "pack", name: "Packing", editions: null, minutesPerKit: "11", setUpMinutes: "0" }],
  },
});

const value = (figure: Figure) => (figure.known ? figure.value : "not known");
const cents = (figure: Figure) => new D(value(figure)).toFixed(2);

describe("channel by channel", () => {
  const table = channelTable(priceContext({ ...made, channels: FOUR }), "kit");
  const line = (name: keyof ChannelOrder) => table.map((one) => cents(one[name] as Figure));

  test("four channels, by hand", () => {
    // 34 · 0.73 ÷ 1.21 = 20.512…
    expect(line("priceAsked")).toEqual(["34.00", "36.00", "34.00", "20.51"]);
    expect(line("charged")).toEqual(["38.95", "40.95", "34.00", "20.51"]);
    // 38.95 · 21/121 = 6.7599…; 40.95 · 21/121 = 7.1070…; 34 · 21/121 = 5.9008…; 20.51 · 0.21 = 4.3071.
    expect(line("taxInside")).toEqual(["6.76", "7.11", "5.90", "0.00"]);
    expect(line("taxOnTop")).toEqual(["0.00", "0.00", "0.00", "4.31"]);
    // 38.95 · 0.015 + 0.25 = 0.83425; 40.95 · 0.09 + 0.50 = 4.1855; 34 · 0.0175 = 0.595.
    expect(line("fee")).toEqual(["0.83", "4.19", "0.60", "0.00"]);
    expect(line("other")).toEqual(["0.00", "0.00", "1.80", "0.00"]);
    expect(line("comesIn")).toEqual(["26.31", "24.60", "25.70", "19.44"]);
    // Less 1793.65 ÷ 120 = 14.947083….
    expect(line("left")).toEqual(["11.36", "9.65", "10.75", "4.49"]);
    expect(line("minutes")).toEqual(["30.00", "28.00", "37.00", "18.00"]);
    // 11.3629… · 60 ÷ 30; 9.6529… · 60 ÷ 28; 10.7529… · 60 ÷ 37; 4.4929… · 60 ÷ 18.
    expect(line("perHour")).toEqual(["22.73", "20.68", "17.44", "14.98"]);
    expect(table.map(({ kits }) => kits)).toEqual([66, 24, 18, 12]);
  });

  test("all channels together, weighted exactly by 55, 20, 15 and 10", () => {
    const all = yieldsAt(priceContext({ ...made, channels: FOUR }), { edition: "kit", channel: null });
    // 0.55 · 26.31 + 0.20 · 24.60 + 0.15 · 25.70 + 0.10 · 19.44; minutes 11 + 18.45.
    expect([value(all.kept), value(all.minutes), cents(all.left), cents(all.perHour)]).toEqual([
      "25.1895",
      "29.45",
      "10.24",
      "20.87",
    ]);
    // 71 sold bring 1788.4545, 72 bring 1813.644.
    expect(value(all.evenAfter)).toBe("72");
    expect(value(all.profit)).toBe("1229.09");
  });

  test("own work at a rate is a cost where it sells as well as where it makes", () => {
    const paid = { ...made, work: { ...made.work, ratePerHour: "12" } };
    const [site] = channelTable(priceContext({ ...paid, channels: FOUR }), "kit");
    // 19 minutes at 12 are 3.80; 11 minutes are 2.20 more in the kit. An hour earns the same as before.
    expect([site && cents(site.timeCost), site && cents(site.left), site && cents(site.perHour)]).toEqual([
      "3.80",
      "5.36",
      "22.73",
    ]);
  });

  test("two kits in an order share what an order costs", () => {
    const two = [{ ...(FOUR[0] as (typeof FOUR)[number]), kitsPerOrder: "2" }];
    const [site] = channelTable(priceContext({ ...made, channels: two }), "kit");
    // 72.95 · 21/121 = 12.66; 72.95 · 0.015 + 0.25 = 1.34425; 72.95 − 12.66 − 1.34 − 4.10 − 0.95.
    expect(site && cents(site.comesIn)).toBe("53.90");
    expect(
      cents(yieldsAt(priceContext({ ...made, channels: two }), { edition: "kit", channel: null }).kept),
    ).toBe("26.95");
  });
});

test("what the fee is taken on: postage and tax, or neither", () => {
  const base = {
    taxRate: "0.21",
    feeRate: "0.1",
    feeFixed: "0",
    postageCharged: "4.95",
    ownPrices: [{ edition: "kit", price: "34.00" }],
  };
  const fee = (over: Partial<Parameters<typeof channel>[0]>) =>
    channelTable(priceContext({ ...made, channels: [channel({ ...base, ...over })] }), "kit").map((one) =>
      value(one.fee),
    )[0];
  expect(fee({})).toBe("3.9");
  expect(fee({ feeOnPostage: false })).toBe("3.4");
  // 38.95 − 6.76 = 32.19; 34.00 − 5.90 = 28.10.
  expect(fee({ feeOnTax: false })).toBe("3.22");
  expect(fee({ feeOnTax: false, feeOnPostage: false })).toBe("2.81");
  // Stated without tax: 38.95 + 8.18 = 47.13; 34.00 + 7.14 = 41.14.
  expect(fee({ taxStated: "on-top" })).toBe("4.71");
  expect(fee({ taxStated: "on-top", feeOnPostage: false })).toBe("4.11");
  expect(fee({ taxStated: "on-top", feeOnTax: false })).toBe("3.9");
});

test("against plain decimals, and the lines add up to the last digit", () => {
  fc.assert(
    fc.property(pricedPlan, ({ made: any, channels, places }) => {
      for (const [index, one] of channelTable(priceContext({ ...any, channels }), "full").entries()) {
        const terms = channels[index] as (typeof channels)[number];
        const asked = plainAsked(terms, "full", new D(any.editions[0]?.price ?? 0), places);
        expect(new D(value(one.priceAsked)).eq(asked)).toBe(true);
        expect(
          new D(value(one.comesIn))
            .minus(plainKept(terms, asked, places))
            .abs()
            .lt("1e-23"),
        ).toBe(true);
        const less = (from: Figure, ...off: Figure[]) =>
          grainText(off.reduce((left, figure) => left - grains(value(figure)), grains(value(from))));
        expect(less(one.charged, one.taxInside, one.fee, one.postagePaid, one.packing, one.other)).toBe(
          value(one.comesIn),
        );
        expect(less(one.comesIn, one.cost, one.timeCost)).toBe(value(one.left));
        expect(less(one.charged, one.goods)).toBe(value(one.postageCharged));
      }
      const together = yieldsAt(priceContext({ ...any, channels }), { edition: "full", channel: null });
      expect(
        grains(value(together.kept)) - grains(value(together.cost)) - grains(value(together.timeCost)),
      ).toBe(grains(value(together.left)));
    }),
    { numRuns: 300 },
  );
});

test("a line that can be said is said, and the others name what they need", () => {
  const gaps = channel({ taxRate: null, postagePaid: null, ownPrices: [{ edition: "kit", price: "20" }] });
  const [one] = channelTable(priceContext({ ...made, channels: [gaps] }), "kit");
  expect(one && [value(one.charged), value(one.fee), value(one.taxInside)]).toEqual(["20", "0", "not known"]);
  expect(one?.comesIn).toEqual({
    known: false,
    without: null,
    needs: ["no-tax-rate", "no-postage-paid"].map((code) => ({
      code,
      at: [{ channel: "site" }],
      page: "price",
    })),
  });
});

test("prices without tax need the tax rate only to follow a list that has it inside", () => {
  const shop = channel({ taxRate: null, taxStated: "on-top", feeOnTax: false });
  const needs = [{ code: "no-tax-rate", at: [{ channel: "site" }], page: "price" }];
  const scopes = [null, "site"].map((only) => ({ edition: "kit", channel: only }));
  const follows = priceContext({ ...made, channels: [shop] });
  for (const scope of scopes) expect(yieldsAt(follows, scope).kept).toMatchObject({ known: false, needs });
  expect(channelTable(follows, "kit")[0]?.priceAsked).toMatchObject({ needs });
  const own = priceContext({
    ...made,
    channels: [{ ...shop, ownPrices: [{ edition: "kit", price: "20.50" }] }],
  });
  for (const scope of scopes) expect(value(yieldsAt(own, scope).kept)).toBe("20.5");
  expect(
    channelTable(own, "kit").map(({ taxInside, comesIn }) => [value(taxInside), value(comesIn)]),
  ).toEqual([["0", "20.5"]]);
});
