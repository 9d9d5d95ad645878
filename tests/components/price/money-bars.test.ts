import { describe, expect, it } from "vitest";
import { moneyBars } from "#src/components/islands/price/money-bars.ts";
import { channelTable } from "#src/costing/price/channel-table.ts";
import { priceContext } from "#src/costing/price/price-context.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { channel, FOUR } from "#tests/costing/price/channels.ts";

/** One kit that costs 14.95 and nothing else, sold at 34.00; an hour at nothing. */
function made(channels = FOUR, price = "34.00") {
  return plan({
    run: { kits: 1, sweepTo: 10 },
    editions: [edition({ price })],
    charges: [{ id: "c", name: "All", amount: "14.95", spreadOver: null }],
    work: { ratePerHour: "0", learningSlope: "1", kitsMadeBefore: 0, tasks: [] },
    channels,
  });
}

const bars = (of: ReturnType<typeof made>) => moneyBars(channelTable(priceContext(of), "kit"));

describe("where the buyer's money goes", () => {
  it("is drawn to one scale: the 40.95 of the marketplace fill it, the stall's 34.00 do not", () => {
    const [site, market, stall] = bars(made());
    const width = (bar: typeof site) => bar?.parts?.reduce((sum, part) => sum + part.width, 0) ?? 0;
    expect(width(market)).toBeCloseTo(100, 8);
    expect(width(stall)).toBeCloseTo((34 / 40.95) * 100, 8);
    // 38.95 − 6.76 − 0.83 − 5.05 − 14.95 = 11.36.
    expect(site?.parts?.map(({ segment, money }) => [segment, money])).toEqual([
      ["tax", "6.76"],
      ["fees", "0.83"],
      ["selling", "5.05"],
      ["cost", "14.95"],
      ["left", "11.36"],
    ]);
  });

  it("is of one kit where an order has several", () => {
    const [shop] = bars(made([channel({ kitsPerOrder: "4", postagePaid: "8" })], "20"));
    expect(shop?.parts?.map(({ segment, money }) => [segment, money])).toEqual([
      ["selling", "2"],
      ["cost", "14.95"],
      ["left", "3.05"],
    ]);
  });

  it("says what is lost, and draws nothing where something is not known", () => {
    const [losing] = bars(made([channel()], "10"));
    expect([losing?.lost, losing?.parts?.map(({ segment }) => segment)]).toEqual(["4.95", ["cost"]]);
    const [unknown] = bars(made([channel({ feeRate: null })]));
    expect(unknown?.parts).toBeNull();
  });
});
