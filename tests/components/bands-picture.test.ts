import { describe, expect, it } from "vitest";
import { bandsInWords, drawnBands, edgeStripes } from "#src/components/bands-picture.ts";

describe("the drawn bands", () => {
  it("puts the first on the left cap and leaves the right part of a run empty", () => {
    const bands = drawnBands(["brown", "red", "brown"]);
    expect(bands.map(({ colour }) => colour)).toEqual(["brown", "red", "brown"]);
    expect(bands[0]?.height).toBeGreaterThan(bands[1]?.height ?? 0);
    expect(Math.max(...bands.map(({ x, width }) => x + width))).toBeLessThan(136);
  });

  it("puts a tolerance on the right cap, at full height", () => {
    const last = drawnBands(["brown", "black", "orange", "gold"], true).at(-1);
    expect(last).toMatchObject({ colour: "gold", height: 52 });
    expect(last?.x).toBeGreaterThan(147);
  });

  it("keeps four bands of a run apart and within the waist", () => {
    const bands = drawnBands(["brown", "yellow", "yellow", "black"]);
    for (const [place, band] of bands.entries())
      expect(band.x + band.width).toBeLessThan(bands[place + 1]?.x ?? 136);
  });

  it("says them in words", () => {
    expect(bandsInWords(["brown", "red", "brown"])).toBe("bands brown, red, brown");
    expect(bandsInWords([])).toBe("no bands");
  });

  it("fits three and four stripes of 8 on an edge of 38", () => {
    for (const count of [3, 4]) {
      const lefts = edgeStripes(count);
      expect(lefts[0]).toBeGreaterThan(0);
      expect((lefts.at(-1) ?? 0) + 8).toBeLessThan(38);
      expect((lefts[1] ?? 0) - (lefts[0] ?? 0)).toBeGreaterThan(8);
    }
  });
});
