import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type ComparableLine, listDifference } from "#src/partslist/difference.ts";

const line = (over: Partial<ComparableLine> & { id: string }): ComparableLine => ({
  designators: [],
  quantity: 1,
  class: "resistor",
  value: null,
  description: null,
  package: null,
  manufacturer: null,
  partNumber: null,
  mark: "in-kit",
  note: null,
  drawer: null,
  ...over,
});

const REV_B = [
  line({ id: "r", designators: ["R1", "R2"], quantity: 2, value: "10k", package: "0207" }),
  line({ id: "c", designators: ["C1"], class: "capacitor", value: "100n", drawer: "B3" }),
  line({ id: "u", designators: ["U1"], class: "integrated-circuit", value: "4093" }),
  line({ id: "s", class: "mechanical", description: "Screw M3 x 8", quantity: 4, value: null }),
];

describe("the difference of two lists", () => {
  it("is nothing where the same list comes again, however its values are spelled", () => {
    const again = REV_B.map((one) => ({ ...one, id: `${one.id}2`, drawer: null }));
    const spelled = again.map((one) =>
      one.value === "10k"
        ? { ...one, value: "10 kΩ" }
        : one.value === "100n"
          ? { ...one, value: "0.1µF" }
          : one,
    );
    const result = listDifference(REV_B, spelled);
    expect(result).toMatchObject({ added: [], removed: [], changed: [], revalued: [] });
    expect(result.unchanged).toHaveLength(4);
  });

  it("names what is new, gone, re-valued and changed", () => {
    const revC = [
      line({ id: "1", designators: ["R1", "R2"], quantity: 2, value: "22k", package: "0207" }),
      line({ id: "2", designators: ["C1", "C2"], quantity: 2, class: "capacitor", value: "100n" }),
      line({ id: "3", class: "mechanical", description: "Screw M3 x 8", quantity: 6, value: null }),
      line({ id: "4", designators: ["D1"], class: "diode", value: "1N4148" }),
    ];
    expect(listDifference(REV_B, revC)).toEqual({
      added: ["4"],
      removed: ["u"],
      revalued: [{ current: "r", incoming: "1", changes: [{ field: "value", from: "10k", to: "22k" }] }],
      changed: [
        {
          current: "c",
          incoming: "2",
          changes: [
            { field: "designators", from: "C1", to: "C1, C2" },
            { field: "quantity", from: "1", to: "2" },
          ],
        },
        { current: "s", incoming: "3", changes: [{ field: "quantity", from: "4", to: "6" }] },
      ],
      unchanged: [],
    });
  });

  it("changes nothing the incoming list does not speak of", () => {
    const bare = [line({ id: "1", designators: ["C1"], class: "capacitor", value: "100n", quantity: null })];
    expect(listDifference([REV_B[1] as ComparableLine], bare).unchanged).toHaveLength(1);
  });

  it("keeps the larger part of a line that is split in two", () => {
    const before = [line({ id: "r", designators: ["R1", "R2", "R3"], quantity: 3, value: "10k" })];
    const after = [
      line({ id: "1", designators: ["R3"], value: "22k" }),
      line({ id: "2", designators: ["R1", "R2"], quantity: 2, value: "10k" }),
    ];
    const result = listDifference(before, after);
    expect(result.added).toEqual(["1"]);
    expect(result.changed[0]).toMatchObject({ current: "r", incoming: "2" });
  });

  it("follows a part whose designators were numbered anew only where all else is equal", () => {
    const before = [
      line({ id: "a", designators: ["R1"], value: "10k" }),
      line({ id: "b", designators: ["R2"], value: "47k" }),
    ];
    const after = [
      line({ id: "1", designators: ["R11"], value: "10k" }),
      line({ id: "2", designators: ["R12"], value: "4k7" }),
    ];
    const result = listDifference(before, after);
    expect(result.changed.map(({ current, incoming }) => [current, incoming])).toEqual([["a", "1"]]);
    expect(result).toMatchObject({ added: ["2"], removed: ["b"] });
  });

  it("accounts for every line on both sides once", () => {
    const arbitrary = fc.uniqueArray(
      fc.record({
        id: fc.uuid(),
        designators: fc.array(fc.constantFrom("R1", "R2", "R3", "C1", "C2"), { maxLength: 3 }),
        value: fc.constantFrom("10k", "10 kΩ", "22k", null),
        quantity: fc.constantFrom(1, 2, null),
      }),
      { maxLength: 8, selector: (one) => one.id },
    );
    fc.assert(
      fc.property(arbitrary, arbitrary, (left, right) => {
        const current = left.map((one) => line(one));
        const incoming = right.map((one) => line(one));
        const result = listDifference(current, incoming);
        const pairs = [...result.revalued, ...result.changed, ...result.unchanged];
        expect([...result.removed, ...pairs.map((one) => one.current)].sort()).toEqual(
          current.map((one) => one.id).sort(),
        );
        expect([...result.added, ...pairs.map((one) => one.incoming)].sort()).toEqual(
          incoming.map((one) => one.id).sort(),
        );
      }),
    );
  });

  it("of a list with itself is nothing", () => {
    const unchanged = listDifference(REV_B, REV_B).unchanged;
    expect(unchanged.map(({ current, incoming }) => current === incoming)).toEqual([true, true, true, true]);
  });
});
