import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { channelTable } from "#src/costing/price/channel-table.ts";
import { priceContext } from "#src/costing/price/price-context.ts";
import { priceForAim } from "#src/costing/price/price-for-aim.ts";
import { aimWorking, priceFiguresOf, priceWorking } from "#src/costing/price/price-working.ts";
import { yieldsAt } from "#src/costing/price/price-yields.ts";
import type { WorkingTree } from "#src/costing/working-tree.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { redo } from "#tests/costing/redo-working.ts";
import { MANY_CASES } from "#tests/support/slow.ts";
import { channel, FOUR } from "./channels.ts";
import { aimIn, pricedPlan } from "./random-channels.ts";

vi.setConfig({ testTimeout: MANY_CASES });

function resultOf(tree: WorkingTree | null): unknown {
  const amount = tree?.lines.find(({ result }) => result)?.amount;
  return amount && "value" in amount ? amount.value : null;
}

describe("workings of pricing", () => {
  test("every one can be redone by hand from its lines", () => {
    fc.assert(
      fc.property(pricedPlan, ({ made, channels }) => {
        const context = priceContext({ ...made, channels });
        for (const figure of priceFiguresOf(context)) {
          const tree = priceWorking(context, figure);
          expect(tree, figure).not.toBeNull();
          if (tree) redo(tree);
        }
      }),
      { numRuns: 40 },
    );
  });

  test("of a solved price too, with both sides of it", () => {
    let redone = 0;
    fc.assert(
      fc.property(
        pricedPlan.chain((made) => fc.tuple(fc.constant(made), aimIn(made.places))),
        fc.constantFrom(null, "c0"),
        ([{ made, channels }, aim], only) => {
          const context = priceContext({ ...made, channels });
          const scope = { edition: "full", channel: only };
          const tree = aimWorking(context, scope, aim);
          const answer = priceForAim(context, scope, aim);
          expect(tree === null).toBe(!answer.found);
          if (tree === null || !answer.found) return;
          redone += redo(tree);
          const sides = tree.lines.filter(({ label }) => label === "Enough" || label === "Not enough");
          expect(sides.map(({ label }) => label)).toEqual(
            answer.before === null ? ["Enough"] : ["Not enough", "Enough"],
          );
          expect(resultOf(tree)).toBe(answer.price);
        },
      ),
      { numRuns: 150 },
    );
    expect(redone).toBeGreaterThan(300);
  });

  test("each ends in the very figure it explains", () => {
    fc.assert(
      fc.property(pricedPlan, ({ made, channels }) => {
        const context = priceContext({ ...made, channels });
        const last = (figure: Parameters<typeof priceWorking>[1]) => resultOf(priceWorking(context, figure));
        const known = (figure: { known: boolean; value?: string }) => (figure.known ? figure.value : null);
        const all = yieldsAt(context, { edition: "full", channel: null });
        expect(last("kit-kept:full")).toBe(known(all.kept));
        expect(last("kit-left:full")).toBe(known(all.left));
        expect(last("kit-hour:full")).toBe(known(all.perHour));
        expect(last("kit-margin:full")).toBe(known(all.margin));
        expect(last("kit-mark-up:full")).toBe(known(all.markUp));
        expect(last("kit-next:full")).toBe(known(all.nextKit));
        expect(last("kit-brings:full")).toBe(known(all.brings));
        for (const one of channelTable(context, "full")) {
          expect(last(`order:${one.channel}:full`)).toBe(known(one.comesIn));
          expect(last(`order-left:${one.channel}:full`)).toBe(known(one.left));
          expect(last(`order-hour:${one.channel}:full`)).toBe(known(one.perHour));
        }
      }),
      { numRuns: 60 },
    );
  });

  test("an order of the stall, line by line", () => {
    const made = plan({ editions: [edition({ price: "34.00" })] });
    const tree = priceWorking(priceContext({ ...made, channels: FOUR }), "order:stall:kit");
    const read = tree?.lines.map(({ sign, label, amount }) => [
      sign,
      label,
      amount && "value" in amount ? amount.value : null,
    ]);
    expect(read).toEqual([
      [null, "Price asked", "34"],
      ["+", "Postage charged", "0"],
      ["=", "The buyer pays", "34"],
      [null, "The buyer pays", "34"],
      ["×", "Tax rate", "0.21"],
      ["÷", "One and the tax rate", "1.21"],
      ["=", "Tax inside", "5.9"],
      [null, "The fee is taken on", "34"],
      ["×", "Fee rate", "0.0175"],
      ["+", "Fee per order", "0"],
      ["=", "Fee", "0.6"],
      [null, "Stall hire", "45.00"],
      ["÷", "Orders that share it", "25"],
      ["=", "Stall hire, of one order", "1.8"],
      [null, "The buyer pays", "34"],
      ["−", "Tax inside", "5.9"],
      ["−", "Fee", "0.6"],
      ["−", "Stall hire", "1.8"],
      ["=", "Comes in", "25.7"],
    ]);
  });

  test("what is not known is said, never written as nothing", () => {
    const made = plan({ editions: [edition({ price: "34.00" })] });
    const gaps = channel({
      taxRate: null,
      feeRate: null,
      postagePaid: null,
      minutesPerOrder: null,
      other: { name: "Hire", amount: null, sharedOver: 4 },
    });
    const context = priceContext({ ...made, channels: [gaps] });
    for (const figure of priceFiguresOf(context)) {
      const result = priceWorking(context, figure)?.lines.find((line) => line.result);
      expect(result?.amount?.kind, figure).toBe("not-known");
    }
    const order = priceWorking(context, "order:site:kit");
    const unknown = order?.lines
      .filter(({ amount }) => amount?.kind === "not-known")
      .map(({ label }) => label);
    expect(unknown).toEqual(
      expect.arrayContaining(["Tax rate", "Fee rate", "Hire", "Postage paid", "Comes in"]),
    );
  });

  test("no such figure, no working", () => {
    const context = priceContext({
      ...plan({ editions: [edition({ price: "34" })] }),
      channels: [channel({ editions: [] })],
    });
    expect(priceWorking(context, "order:site:kit")).toBeNull();
    expect(priceWorking(context, "kit-kept:nothing")).toBeNull();
    expect(aimWorking(context, { edition: "kit", channel: null }, { aim: "run-even" })).toBeNull();
  });
});
