import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { overlaps, stillOurs } from "#src/components/islands/parts-grid/overlaps.ts";
import {
  applySteps,
  inverseSteps,
  joinSteps,
  partToBe,
  type Step,
  withVersions,
} from "#src/components/islands/parts-grid/steps.ts";
import { line, listOf } from "./list.ts";

const list = listOf(line("r1"), line("r2"), line("r3", { part: { id: "part-r1" } }), line("r4"));

/** Any step that can be taken on the list above. */
const anyStep: fc.Arbitrary<Step> = fc.oneof(
  fc.record({
    do: fc.constant("change-line" as const),
    line: fc.constantFrom("r1", "r2", "r3", "r4"),
    set: fc.record({ note: fc.string(), quantities: fc.constant({ bare: 4 }) }),
  }),
  fc.record({
    do: fc.constant("change-part" as const),
    part: fc.constantFrom("part-r1", "part-r2"),
    set: fc.record({ drawer: fc.string() }),
  }),
  fc.record({
    do: fc.constant("choose" as const),
    part: fc.constantFrom("part-r1", "part-r4"),
    set: fc.record({ leastSpare: fc.nat(9) }),
  }),
  fc.record({
    do: fc.constant("move-line" as const),
    line: fc.constantFrom("r1", "r2", "r3", "r4"),
    to: fc.nat(3),
  }),
);

describe("the way back", () => {
  it("leads to the list as it was, whatever was done", () => {
    fc.assert(
      fc.property(fc.array(anyStep, { maxLength: 6 }), (steps) => {
        const back = applySteps(applySteps(list, steps), inverseSteps(list, steps));
        expect(back.lines).toEqual(list.lines);
        for (const choice of back.choices) expect(choice.leastSpare).toBe(0);
      }),
    );
  });

  it("brings a removed line back to its place, and a line of its own part back to the shared one", () => {
    const steps: Step[] = [
      { do: "own-part", line: "r3", set: { name: "12 kΩ" } },
      { do: "remove-line", line: "r2" },
    ];
    const after = applySteps(list, steps);
    expect(after.lines.map(({ id }) => id)).toEqual(["r1", "r3", "r4"]);
    expect(after.lines[1]?.part).toMatchObject({ id: partToBe("r3"), name: "12 kΩ" });
    const back = applySteps(after, inverseSteps(list, steps));
    expect(back.lines.map(({ id, part }) => [id, part.id])).toEqual([
      ["r1", "part-r1"],
      ["r2", "part-r2"],
      ["r3", "part-r1"],
      ["r4", "part-r4"],
    ]);
  });
});

describe("joining steps", () => {
  it("changes each row once, keeps the order of the rest, and comes to the same list", () => {
    const steps: Step[] = [
      { do: "change-line", line: "r1", set: { quantities: { full: 2 } } },
      { do: "change-part", part: "part-r1", set: { drawer: "B1" } },
      { do: "change-line", line: "r1", set: { note: "new", quantities: { bare: 1 } } },
      { do: "change-part", part: "part-r1", set: { drawer: "B2" } },
    ];
    const joined = joinSteps(steps);
    expect(joined).toHaveLength(2);
    expect(applySteps(list, joined)).toEqual(applySteps(list, steps));
  });
});

describe("versions", () => {
  it("are those the server has; a second step on a row names the one the first leaves", () => {
    const sent = withVersions(list, [
      { do: "change-line", line: "r1", set: { note: "a" } },
      { do: "remove-line", line: "r1" },
      { do: "choose", part: "part-r2", set: { leastSpare: 1 } },
    ]);
    expect(sent).toMatchObject([{ version: 1 }, { version: 2 }, { version: 0 }]);
  });

  it("name a part that was still to be made by what the server made of it", () => {
    const made = listOf(line("r9", { part: { id: "server-part", version: 3 } }));
    const step: Step = { do: "change-part", part: partToBe("r9"), set: { drawer: "C1" } };
    expect(withVersions(made, [step])).toMatchObject([{ part: "server-part", version: 3 }]);
  });
});

describe("another person's change", () => {
  const ours: Step[] = [{ do: "change-line", line: "r1", set: { note: "ours", quantities: { full: 2 } } }];

  it("clashes only in the fields that both changed to something else", () => {
    const theirs = applySteps(list, [{ do: "change-line", line: "r1", set: { quantities: { full: 3 } } }]);
    expect(overlaps(list, theirs, ours)).toMatchObject([{ field: "quantity:full", yours: 2, theirs: 3 }]);
    const elsewhere = applySteps(list, [{ do: "change-line", line: "r1", set: { designators: "R7" } }]);
    expect(overlaps(list, elsewhere, ours)).toEqual([]);
    expect(overlaps(list, applySteps(list, ours), ours)).toEqual([]);
  });

  it("is not taken back by our undo", () => {
    const after = applySteps(list, ours);
    expect(stillOurs(after, ours)).toBe(true);
    const then = applySteps(after, [{ do: "change-line", line: "r1", set: { note: "his" } }]);
    expect(stillOurs(then, ours)).toBe(false);
  });
});
