import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type CalendarInput,
  type CalendarOrder,
  orderCalendar,
} from "#src/costing/calendar/order-calendar.ts";

const order = (name: string, leadDays: number | null, cost: string | null): CalendarOrder => ({
  ...{ id: name.toLowerCase(), name, leadDays, cost },
});

const plan = (orders: CalendarOrder[], over: Partial<CalendarInput> = {}): CalendarInput => ({
  ...{ today: "2026-03-09", packingDay: "2026-04-03", spareDays: 4, orders, ...over },
});

describe("the order calendar", () => {
  // Packing on Friday 3 April, four days to count in: all must be there on Monday 30 March. Reckoned on a calendar.
  it("works back from the packing day", () => {
    const { orders, weeks, mostOut, soonestPacking } = orderCalendar(
      plan([order("Tamsin", 4, "71.55"), order("Kilnside", 12, "270.50"), order("Ebbing", 35, "43.80")]),
    );
    expect(orders.map(({ name, orderBy, daysLeft }) => [name, orderBy, daysLeft])).toEqual([
      ["Ebbing", "2026-02-23", -14],
      ["Kilnside", "2026-03-18", 9],
      ["Tamsin", "2026-03-26", 17],
    ]);
    expect(orders.every(({ arrivesBy }) => arrivesBy === "2026-03-30")).toBe(true);
    // What is late is paid this week, that of 9 March.
    expect(weeks).toEqual([
      { monday: "2026-03-09", out: "43.8", outSoFar: "43.8" },
      { monday: "2026-03-16", out: "270.5", outSoFar: "314.3" },
      { monday: "2026-03-23", out: "71.55", outSoFar: "385.85" },
    ]);
    expect(mostOut).toEqual({ amount: "385.85", from: "2026-03-26" });
    // Ebbing's 35 days from 9 March are 13 April, and four days more.
    expect(soonestPacking).toBe("2026-04-17");
  });

  it("says what it cannot know, and dates the rest", () => {
    const { orders, weeks, mostOut, soonestPacking } = orderCalendar(
      plan([order("Nordhafen", null, "10"), order("Tamsin", 4, "71.55")]),
    );
    expect(orders.map(({ name, orderBy }) => [name, orderBy])).toEqual([
      ["Tamsin", "2026-03-26"],
      ["Nordhafen", null],
    ]);
    expect([weeks, mostOut, soonestPacking]).toEqual([null, null, null]);
  });

  it("never reckons a cost that is not known as nothing", () => {
    const { weeks, orders } = orderCalendar(plan([order("Tamsin", 4, null), order("Ebbing", 4, "5")]));
    expect(weeks).toBeNull();
    expect(orders.find(({ name }) => name === "Tamsin")?.cost).toBeNull();
  });

  it("has nothing to say of no orders", () => {
    expect(orderCalendar(plan([]))).toEqual({ orders: [], weeks: [], mostOut: null, soonestPacking: null });
  });

  it("spends in the weeks exactly what the orders cost, and packing on its soonest day is never late", () => {
    const cents = fc.integer({ min: 1, max: 100_000 });
    const some = fc.array(fc.tuple(fc.integer({ min: 0, max: 120 }), cents), { minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(some, fc.integer({ min: 0, max: 20 }), (leads, spareDays) => {
        const orders = leads.map(([days, sum], at) => order(`S${at}`, days, (sum / 100).toFixed(2)));
        const { weeks, soonestPacking } = orderCalendar(plan(orders, { spareDays }));
        const total = leads.reduce((all, [, sum]) => all + sum, 0);
        expect(Math.round(Number(weeks?.at(-1)?.outSoFar) * 100)).toBe(total);
        const soonest = orderCalendar(plan(orders, { spareDays, packingDay: soonestPacking ?? "" }));
        expect(Math.min(...soonest.orders.map(({ daysLeft }) => daysLeft ?? -1))).toBe(0);
      }),
    );
  });
});
