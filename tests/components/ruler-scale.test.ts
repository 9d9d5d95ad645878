import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  figureHidden,
  nextSweetSpot,
  rulerPlace,
  rulerTicks,
  runAfterKey,
  runAtPlace,
} from "#src/components/ruler-scale.ts";
import { RULER_LEAST, RULER_MOST } from "#src/shapes/limits.ts";

const SPOTS = [60, 120, 180, 240];
const press = (key: string, shiftKey = false) => ({ key, shiftKey });

describe("the logarithmic ruler", () => {
  it("begins at 10, ends at 500, and keeps what lies beyond at its ends", () => {
    expect(rulerPlace(10)).toBe(0);
    expect(rulerPlace(500)).toBe(1);
    expect(rulerPlace(3)).toBe(0);
    expect(rulerPlace(1000)).toBe(1);
  });

  it("gives equal lengths to equal ratios: what a logarithm is", () => {
    expect(rulerPlace(40) - rulerPlace(20)).toBeCloseTo(rulerPlace(200) - rulerPlace(100), 5);
    expect(rulerPlace(Math.sqrt(10 * 500))).toBeCloseTo(0.5, 5);
  });

  it("leads back to the run it came from, for every run on it", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: RULER_LEAST, max: RULER_MOST }),
        (run) => runAtPlace(rulerPlace(run)) === run,
      ),
    );
  });

  it("never leaves its ends, wherever the pointer is", () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, min: -10, max: 10 }), (place) => {
        const run = runAtPlace(place);
        return Number.isInteger(run) && run >= RULER_LEAST && run <= RULER_MOST;
      }),
    );
  });

  it("has ticks by 2 to 100 and by 10 from there, with figures at round steps", () => {
    const ticks = rulerTicks();
    expect(ticks.map(({ kits }) => kits)).toEqual([
      ...Array.from({ length: 45 }, (_, step) => 10 + step * 2),
      ...Array.from({ length: 41 }, (_, step) => 100 + step * 10),
    ]);
    expect(ticks.filter(({ figure }) => figure).map(({ kits }) => kits)).toEqual([
      10, 20, 30, 40, 50, 60, 80, 100, 150, 200, 250, 300, 400, 500,
    ]);
    expect(ticks.find(({ kits }) => kits === 70)?.length).toBe(9);
    expect(ticks.find(({ kits }) => kits === 12)?.length).toBe(5);
  });

  it("hides a figure nearer to the ring than 9 in 100", () => {
    expect(figureHidden(250, 260)).toBe(true);
    expect(figureHidden(100, 120)).toBe(false);
    expect(figureHidden(50, 50)).toBe(true);
  });
});

describe("keys of the ruler", () => {
  it.each([
    [press("ArrowRight"), 121],
    [press("ArrowUp"), 121],
    [press("ArrowLeft"), 119],
    [press("ArrowDown"), 119],
    [press("PageUp"), 130],
    [press("PageDown"), 110],
    [press("Home"), 10],
    [press("End"), 500],
    [press("ArrowRight", true), 180],
    [press("ArrowLeft", true), 60],
  ])("%j leads from 120 to %i", (key, run) => {
    expect(runAfterKey(120, key, SPOTS)).toBe(run);
  });

  it("stops at the ends and leaves other keys alone", () => {
    expect(runAfterKey(500, press("ArrowRight"), SPOTS)).toBe(500);
    expect(runAfterKey(14, press("PageDown"), SPOTS)).toBe(10);
    expect(runAfterKey(120, press("a"), SPOTS)).toBeUndefined();
  });

  it("stays where it is when no sweet spot lies further, and ignores their order", () => {
    expect(nextSweetSpot(240, SPOTS, 1)).toBe(240);
    expect(nextSweetSpot(100, [240, 120, 180], 1)).toBe(120);
    expect(nextSweetSpot(200, [240, 120, 180], -1)).toBe(180);
  });
});
