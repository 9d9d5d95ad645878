import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { freePlace, labelsWithRoom } from "#src/components/islands/charts/label-room.ts";
import { axisTicks, roundStep, roundTicks } from "#src/components/islands/charts/round-ticks.ts";
import { buildUp } from "#src/components/islands/run/build-up-rows.ts";
import { ringNames } from "#src/components/islands/run/cost-names.ts";
import {
  type CostPoint,
  costPoints,
  spanAround,
  spanOfCrossings,
  unitCostRange,
} from "#src/components/islands/run/cost-points.ts";
import { crossingLetter, crowded, gainAreas, meeting } from "#src/components/islands/run/even-shapes.ts";
import { worthALook } from "#src/components/islands/run/worth-a-look.ts";
import { costRun } from "#src/costing/cost-run.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { smallPlan } from "#tests/support/small-plan.ts";

/** A point from totals alone. */
function point(kits: number, total: number | null, brings: number | null, breaksAfter = false): CostPoint {
  return {
    kits,
    perKit: null,
    total,
    brings,
    breaksAfter,
    exact: { perKit: null, total: null, brings: null },
  };
}

describe("round figures of an axis", () => {
  it("count in 1, 2, 5 and their tens", () => {
    expect(roundTicks(0, 100, 5)).toEqual([0, 20, 40, 60, 80, 100]);
    expect(roundTicks(48, 250, 9)).toEqual([50, 100, 150, 200, 250]);
    expect(axisTicks(8.4, 26.1, 6)).toEqual([5, 10, 15, 20, 25, 30]);
    expect(roundStep(0, 6)).toBe(1);
  });

  it("enclose what is drawn, in a number of ticks that can be read", () => {
    const spans = fc.tuple(fc.integer({ min: -1000, max: 1000 }), fc.integer({ min: 1, max: 100_000 }));
    fc.assert(
      fc.property(spans, ([low, width]) => {
        const ticks = axisTicks(low, low + width, 7);
        expect(ticks[0]).toBeLessThanOrEqual(low);
        expect(ticks.at(-1)).toBeGreaterThanOrEqual(low + width);
        expect(ticks.length).toBeLessThanOrEqual(8);
      }),
    );
  });
});

describe("points of a sweep", () => {
  const sweep = sweepRuns(smallPlan());

  it("are the sweep's own figures, one for every size of the span", () => {
    const points = costPoints(sweep.columns, "used", { from: 38, to: 42 });
    expect(points.map(({ kits }) => kits)).toEqual([38, 39, 40, 41, 42]);
    // By hand, see smallPlan: a run of 40 costs 217.91, a kit 5.44775, and brings 480.
    expect(points[2]).toMatchObject({
      total: 217.91,
      exact: { total: "217.91", perKit: "5.44775", brings: "480" },
      breaksAfter: false,
    });
  });

  it("break where the next kit costs far more than it usually does", () => {
    const columns = { ...sweep.columns, used: ["10", "12", "14", "100", "102", "104"] };
    const points = costPoints(columns, "used", { from: 1, to: 6 });
    expect(points.filter(({ breaksAfter }) => breaksAfter).map(({ kits }) => kits)).toEqual([3]);
    const dear = { ...sweep.columns, used: ["60", "120", "180", "240"] };
    expect(costPoints(dear, "used", { from: 1, to: 4 }).some(({ breaksAfter }) => breaksAfter)).toBe(false);
  });

  it("show the run in every span, and never a size beyond the sweep", () => {
    const run = fc.integer({ min: 1, max: 1000 });
    fc.assert(
      fc.property(run, run, fc.array(run, { maxLength: 5 }), (kits, end, crossings) => {
        const within = Math.min(kits, end);
        for (const { from, to } of [
          spanAround(within, end),
          spanOfCrossings(
            within,
            crossings.map((at) => Math.min(at, end)),
            end,
          ),
        ]) {
          expect(from).toBeGreaterThanOrEqual(1);
          expect(from).toBeLessThanOrEqual(within);
          expect(to).toBeGreaterThanOrEqual(within);
          expect(to).toBeLessThanOrEqual(end);
        }
      }),
    );
  });

  it("leave room for what a kit brings, and cut off the dearest few", () => {
    // 100, 50, 33.3 and 25 a kit: the axis ends at three times the last, and begins below it.
    const points = [1, 2, 3, 4].map((kits) => ({ ...point(kits, null, null), perKit: 100 / kits }));
    const { low, high, brings } = unitCostRange(points, 4, 30);
    expect({ high, brings }).toEqual({ high: 75, brings: "drawn" });
    expect(low).toBeLessThan(25);
  });

  it("leave out what a kit brings where it lies too far off", () => {
    // Costs from 10 to 12 are 2 apart: 15 is within two and a half times that above the cheapest, 16 is not.
    const points = [1, 2, 3].map((kits) => ({ ...point(kits, null, null), perKit: 13 - kits }));
    expect(unitCostRange(points, 3, 15).brings).toBe("drawn");
    expect(unitCostRange(points, 3, 16)).toMatchObject({ brings: "above", high: 12 });
    expect(unitCostRange(points, 3, 6)).toMatchObject({ brings: "below", high: 12 });
  });
});

describe("areas of loss and profit", () => {
  it("meet exactly where takings pass cost", () => {
    const points = [point(1, 10, 4), point(2, 11, 8), point(3, 12, 12 + 3), point(4, 13, 18)];
    // Between 2 (3 short) and 3 (3 ahead) the lines meet half way, at 2.5 kits and 11.5.
    expect(meeting(points[1] as CostPoint, points[2] as CostPoint)).toEqual({ kits: 2.5, money: 11.5 });
    const areas = gainAreas(points);
    expect(areas.map(({ gain }) => gain)).toEqual(["loss", "profit"]);
    expect(areas[0]?.upper.at(-1)).toEqual({ kits: 2.5, money: 11.5 });
    expect(areas[1]?.lower[0]).toEqual({ kits: 2.5, money: 11.5 });
  });

  it("close on the vertical of a step that puts one back at a loss", () => {
    const points = [point(1, 10, 12), point(2, 10, 14, true), point(3, 30, 16), point(4, 30, 18)];
    const [profit, loss] = gainAreas(points);
    expect(profit).toMatchObject({ gain: "profit" });
    expect(profit?.lower.at(-1)).toEqual({ kits: 3, money: 10 });
    expect(loss?.upper[0]).toEqual({ kits: 3, money: 30 });
    expect(loss?.lower[0]).toEqual({ kits: 3, money: 16 });
  });

  it("leave a gap where something is not known", () => {
    const points = [point(1, 10, 4), point(2, 11, 5), point(3, null, 6), point(4, 13, 7), point(5, 14, 8)];
    expect(gainAreas(points)).toHaveLength(2);
  });

  it("part where the lines only touch", () => {
    const areas = gainAreas([point(1, 1, 0), point(2, 0, 0), point(3, 0, 1)]);
    expect(areas.map(({ gain }) => gain)).toEqual(["loss", "profit"]);
  });

  it("never mix loss and profit, whatever the lines do", () => {
    const sums = fc.array(fc.tuple(fc.nat(200), fc.nat(200)), { minLength: 2, maxLength: 30 });
    fc.assert(
      fc.property(sums, (rows) => {
        const points = rows.map(([total, brings], place) => point(place + 1, total, brings));
        for (const { upper, lower } of gainAreas(points))
          upper.forEach((place, index) => {
            expect(place.money).toBeGreaterThanOrEqual((lower[index]?.money ?? 0) - 1e-9);
          });
      }),
    );
  });
});

describe("names and letters", () => {
  it("letter crossings in order, past Z too", () => {
    expect([0, 1, 25, 26, 27].map(crossingLetter)).toEqual(["A", "B", "Z", "AA", "AB"]);
  });

  it("enlarge the first crossings that stand too near", () => {
    expect(crowded([56, 61, 65, 120], 5, 30)).toEqual([56, 61, 65]);
    expect(crowded([20, 60, 120], 5, 30)).toEqual([]);
  });

  it("give room to the run first, and let no two labels touch", () => {
    const at = (place: number, rank: number) => ({ at: place, half: 30, rank });
    expect(labelsWithRoom([at(100, 1), at(120, 0), at(300, 1)]).map((label) => label.at)).toEqual([120, 300]);
    const box = (left: number) => ({ left, right: left + 80, top: 0, bottom: 20 });
    expect(freePlace([box(0), box(200)], [box(40)])).toEqual(box(200));
    expect(freePlace([box(0)], [box(40)])).toEqual(box(0));
  });
});

describe("names of rings", () => {
  const plot = { left: 60, right: 400, top: 0, bottom: 300 };
  const ring = (x: number, y: number, rank: number) => ({ kits: x, x, y, figure: "€10.00", rank });

  it("stand below left, above right where the axis is too near, and not at all where neither has room", () => {
    const names = ringNames([ring(200, 100, 0), ring(70, 100, 1), ring(70, 20, 2)], plot, []);
    expect(names.map(({ x, y, anchor }) => [x, y, anchor])).toEqual([
      [200, 100, "end"],
      [70, 100, "start"],
    ]);
  });

  it("keep off what is taken, the run first", () => {
    const names = ringNames([ring(210, 105, 1), ring(200, 100, 0)], plot, []);
    expect(names.map(({ x, anchor }) => [x, anchor])).toEqual([
      [200, "end"],
      [210, "start"],
    ]);
    const all = { left: 0, right: 400, top: 0, bottom: 300 };
    expect(ringNames([ring(200, 100, 0)], plot, [all])).toEqual([]);
  });
});

describe("runs worth a look", () => {
  it("hold the chosen run, in order, each with the sweep's figures", () => {
    const sweep = sweepRuns(smallPlan());
    const points = costPoints(sweep.columns, "used", { from: 1, to: sweep.to });
    const rows = worthALook(sweep, sweep.columns, points, 40);
    const sizes = rows.map(({ kits }) => kits);
    expect(sizes).toEqual([...sizes].sort((one, other) => one - other));
    expect(rows.find(({ kits }) => kits === 40)).toEqual({
      kits: 40,
      why: "yours",
      perKit: "5.44775",
      cash: "217.91",
      evenAfter: 19,
      profit: "262.09",
    });
    expect(sizes.length).toBeLessThanOrEqual(7);
  });
});

describe("the build-up of a kit", () => {
  it("lays the heads end to end up to the cost, and leaves the rest", () => {
    const { rows } = buildUp(costRun(smallPlan()));
    const parts = rows.filter(({ kind }) => kind === "part");
    expect(parts[0]?.bar?.from).toBe(0);
    parts.slice(1).forEach((row, place) => {
      expect(row.bar?.from).toBe(parts[place]?.bar?.to);
    });
    const cost = rows.find(({ key }) => key === "cost");
    expect(parts.at(-1)?.bar?.to).toBeCloseTo(cost?.bar?.to ?? 0, 9);
    // By hand: 12.00 a kit comes in, 5.44775 of it are cost.
    expect(cost?.bar?.to).toBeCloseTo((5.44775 / 12) * 100, 9);
    expect(rows.at(-1)).toMatchObject({ label: "Left for you", figure: { value: "6.55225" } });
  });

  it("says lost where a kit brings less than it costs", () => {
    const plan = smallPlan();
    const cheap = { ...plan, editions: plan.editions.map((edition) => ({ ...edition, price: "4" })) };
    expect(buildUp(costRun(cheap)).rows.at(-1)?.label).toBe("Lost on each");
  });
});
