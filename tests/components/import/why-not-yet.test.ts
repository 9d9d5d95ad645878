import { describe, expect, it } from "vitest";
import { takeWords, thenWords, whyNotYet } from "#src/components/islands/import/why-not-yet.ts";
import { partsView, question } from "./parts-view.ts";

const none = { open: [], must: 0, look: 0, settled: [], settledCount: 0 };
const counts = { added: 0, removed: 0, changed: 0, revalued: 0, unchanged: 23 };
const same = { counts, added: [], removed: [], changed: [], revalued: [] };
const ready = partsView(none);

describe("why a list cannot be brought in yet", () => {
  it("names the rows that must be settled, and not those that are worth a look", () => {
    const open = [question(21, "must"), question(15, "must"), question(9, "look")];
    expect(whyNotYet(partsView({ ...none, open, must: 2, look: 1 }))).toBe("Settle rows 15 and 21 first.");
    expect(whyNotYet(partsView({ ...none, open: [question(15, "must")], must: 1 }))).toBe(
      "Settle row 15 first.",
    );
    expect(whyNotYet(partsView({ ...none, open: [question(9, "look")], look: 1 }))).toBeUndefined();
  });

  it("says where nothing would change, unless prices come along", () => {
    expect(whyNotYet({ ...ready, difference: same })).toBe("Everything in this list stands so already.");
    const priced = { ...ready.prices, offers: 3 };
    expect(whyNotYet({ ...ready, difference: same, prices: priced })).toBeUndefined();
  });

  it("says where no row is a line, or too many are", () => {
    const of = (linesWithSuggestions: number) => ({
      ...ready,
      counts: { ...ready.counts, linesWithSuggestions },
    });
    expect(whyNotYet(of(0))).toBe("No row is a line yet. Look at what the columns mean.");
    expect(whyNotYet(of(2000))).toBeUndefined();
    expect(whyNotYet(of(2001))).toContain("at most 2000 lines");
  });

  it("points at prices that cannot be", () => {
    const faults = [{ at: "rows.2.breaks.0.price", message: "At most 6 decimals." }];
    expect(whyNotYet({ ...ready, prices: { ...ready.prices, faults } })).toBe(
      "Put the prices right that are named above.",
    );
  });
});

it("says on the button what it does, and beside it what then is so", () => {
  expect(takeWords(ready)).toBe("Bring in 23 lines");
  expect(thenWords(ready, "B")).toBe(
    "Then: 21 lines match rev B, 4 of them change, 2 are new, 1 leaves the list.",
  );
  const first = { ...ready, difference: { ...same, counts: { ...counts, added: 23, unchanged: 0 } } };
  expect(thenWords(first, "A")).toBe("Then: 23 lines are new.");
});
