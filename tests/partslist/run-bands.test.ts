import { describe, expect, it } from "vitest";
import { runBands } from "#src/partslist/run-bands.ts";

/** Colours after IEC 60062; the cases 120, 60 and 125 are those the design fixes. */
describe("bands of a run", () => {
  it.each([
    [120, ["brown", "red", "brown"]],
    [60, ["blue", "black", "black"]],
    [10, ["brown", "black", "black"]],
    [100, ["brown", "black", "brown"]],
    [500, ["green", "black", "brown"]],
    [1000, ["brown", "black", "red"]],
    [125, ["brown", "red", "green", "black"]],
    [144, ["brown", "yellow", "yellow", "black"]],
    [365, ["orange", "blue", "green", "black"]],
    [5, ["green", "black", "gold"]],
  ])("reads %i as %j", (kits, colours) => {
    expect(runBands(kits)).toEqual(colours);
  });

  it.each([0, -10, 12.5, 1234])("has no bands for %d", (kits) => {
    expect(runBands(kits)).toEqual([]);
  });
});
