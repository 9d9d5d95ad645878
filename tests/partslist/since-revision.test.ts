import fc from "fast-check";
import { expect, it } from "vitest";
import { type ComparedLine, compareLists } from "#src/partslist/since-revision.ts";

function line(id: string, over: Partial<ComparedLine> = {}): ComparedLine {
  const part = {
    class: "resistor",
    name: "10 kΩ",
    spec: "",
    package: "",
    manufacturer: "",
    manufacturerPartNumber: "",
  };
  return {
    id,
    designators: id.toUpperCase(),
    mark: "in-kit",
    note: "",
    quantities: { full: 1 },
    part,
    ...over,
  };
}

it("tells added, removed and changed lines apart, with each field before and after", () => {
  const before = [line("r1"), line("r2"), line("r3")];
  const after = [line("r1"), line("r2", { quantities: { full: 2, bare: 1 } }), line("r4")];
  const change = compareLists(before, after);
  expect(change.added.map(({ id }) => id)).toEqual(["r4"]);
  expect(change.removed.map(({ id }) => id)).toEqual(["r3"]);
  expect(change.changed.map(({ fields }) => fields)).toEqual([
    [
      { field: "quantity:full", before: "1", after: "2" },
      { field: "quantity:bare", before: "0", after: "1" },
    ],
  ]);
});

it("takes a line with the same designators for the same line", () => {
  const change = compareLists(
    [line("old", { designators: "R1" })],
    [line("new", { designators: "R1", note: "1 %" })],
  );
  expect(change).toMatchObject({
    added: [],
    removed: [],
    changed: [{ fields: [{ field: "note", after: "1 %" }] }],
  });
});

it("finds nothing between a list and itself, and accounts for every line between any two", () => {
  const ids = fc.uniqueArray(fc.constantFrom(..."abcdefghij"), { maxLength: 10 });
  fc.assert(
    fc.property(ids, ids, (one, other) => {
      const [before, after] = [one.map((id) => line(id)), other.map((id) => line(id))];
      expect(compareLists(before, before)).toEqual({ added: [], removed: [], changed: [] });
      const change = compareLists(before, after);
      const same = other.filter((id) => one.includes(id)).length;
      expect(change.added.length + same).toBe(after.length);
      expect(change.removed.length + same).toBe(before.length);
    }),
  );
});
