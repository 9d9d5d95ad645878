import { describe, expect, it } from "vitest";
import { fileName } from "#src/components/islands/charts/file-name.ts";
import { missingThings } from "#src/components/islands/plan/missing-things.ts";
import { answerFigures, runAnswer } from "#src/components/islands/run/answer-words.ts";
import { changesInWords } from "#src/components/islands/run/change-words.ts";
import { breakEvenWords, crossingWords } from "#src/components/islands/run/crossing-words.ts";
import { costRun } from "#src/costing/cost-run.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { smallPlan } from "#tests/support/small-plan.ts";

const sentence = (plan: Plan) =>
  runAnswer(answerFigures(costRun(plan)))
    .map(({ text }) => text)
    .join("");

const priced = (price: string | null): Plan => {
  const plan = smallPlan();
  return { ...plan, editions: plan.editions.map((edition) => ({ ...edition, price })) };
};

describe("the answer", () => {
  it("says what a kit costs, brings in and earns, when the run is paid for and what it needs", () => {
    expect(sentence(smallPlan())).toBe(
      "Make 40. One kit costs €5.45 and brings in €12.00, so each earns €6.55. The run is paid for after 19 sold. It needs €217.91 in cash.",
    );
  });

  it("says so when the run loses money", () => {
    expect(sentence(priced("4"))).toBe(
      "A run of 40 loses money. One kit costs €5.45 and brings in €4.00, so each loses €1.45 even if all are sold.",
    );
  });

  it("says what is known when the price is not", () => {
    expect(sentence(priced(null))).toBe(
      "40 kits cost €217.91. One kit costs €5.45. What it brings in needs a price.",
    );
  });

  it("leads to the parts where there are none", () => {
    const pieces = runAnswer(answerFigures(costRun({ ...smallPlan(), lines: 0, parts: [] })));
    expect(pieces.map(({ text }) => text).join("")).toBe(
      "There are no parts yet. What a kit costs is known once there is a list: bring in a parts list.",
    );
    expect(pieces.flatMap(({ page }) => page ?? [])).toEqual(["parts"]);
  });

  it("says what the cost needs", () => {
    const plan = smallPlan();
    const unpriced = { ...plan, parts: plan.parts.map((part) => ({ ...part, offers: [] })) };
    expect(sentence(unpriced)).toBe("40 cannot be worked out yet. The cost needs 2 prices.");
  });
});

describe("what is missing", () => {
  it("is the parts before anything else", () => {
    const plan = { ...smallPlan(), lines: 0, parts: [], work: { ...smallPlan().work, ratePerHour: null } };
    const { used } = costRun(plan).perKit;
    const things = missingThings(plan, used.known ? [] : used.needs, { workshop: "w", kit: "k" });
    expect(things.map(({ reason, way }) => [reason, way.label, way.href])).toEqual([
      ["There are no parts yet.", "Go to Parts", "/workshops/w/kits/k/parts"],
      ["There is no hourly rate.", "Set the rate", "/workshops/w/kits/k/run#inputs"],
    ]);
  });

  it("is named place by place, with the way to its field and, where that can be, the way to say none", () => {
    const plan = smallPlan();
    const open = {
      ...plan,
      parts: plan.parts.map((part) => ({ ...part, offers: [] })),
      work: { ...plan.work, ratePerHour: null },
    };
    const { used } = costRun(open).perKit;
    const things = missingThings(open, used.known ? [] : used.needs, { workshop: "w", kit: "k" });
    expect(things.map(({ what, reason }) => [what, reason])).toEqual([
      ["R 1", "R has no price that can be used."],
      ["LA 1", "LA has no price that can be used."],
      ["", "There is no hourly rate."],
    ]);
    expect(things[0]?.way).toEqual({ label: "Add a price", href: "/workshops/w/kits/k/offers/resistor" });
    expect(things[2]?.noneOfIt).toEqual({
      label: "Count the hours at nothing",
      row: { kind: "hour-rate" },
      field: "ratePerHour",
    });
  });
});

describe("what changed between two runs", () => {
  it("is told in the trade's words, the first two and how many more", () => {
    const plan = smallPlan();
    expect(
      changesInWords(plan, [
        { what: "board-lots", quote: "q", from: 60, to: 90 },
        { what: "parcel-more", supplier: "weir" },
        { what: "break", part: "resistor", offer: "r", from: 1, to: 100 },
      ]),
    ).toBe("it takes 90 boards instead of 60, one parcel more, from Weir Parts, and 1 more");
    expect(changesInWords(plan, [{ what: "free-freight", supplier: "weir", reached: true }])).toBe(
      "freight from Weir Parts becomes free",
    );
    expect(changesInWords(plan, [])).toBe("");
  });
});

describe("break-even in words", () => {
  const nothing = { known: true, crossings: [], first: null, safe: null, upTo: 500, marginOfSafety: null };
  const at = (kits: number, way: "up" | "down") => ({ kits, way, profitBefore: "", profit: "", changes: [] });

  it("letters every crossing and names the first and the safe one", () => {
    const even = {
      ...nothing,
      crossings: [at(56, "up"), at(61, "down"), at(65, "up")],
      first: 56,
      safe: 65,
    };
    expect(crossingWords(smallPlan(), even)).toEqual([
      { letter: "A", kits: 56, words: "Takings first pass cost." },
      { letter: "B", kits: 61, words: "Back at a loss." },
      { letter: "C", kits: 65, words: "Ahead again, and from here on." },
    ]);
    expect(breakEvenWords(even)).toBe(
      "A run of 56 is the first that pays for itself; from 65 kits on every run does, if all are sold.",
    );
  });

  it("says none, and not known", () => {
    expect(breakEvenWords(nothing)).toBe("No run up to 500 pays for itself.");
    expect(breakEvenWords({ ...nothing, known: false })).toMatch(/^Not known/);
    expect(breakEvenWords({ ...nothing, first: 14, safe: 14 })).toBe(
      "From 14 kits on every run pays for itself, if all are sold.",
    );
  });
});

it("makes file names that every file system takes", () => {
  expect(fileName("Dew Lantern", "cost-per-kit")).toBe("dew-lantern-cost-per-kit");
  expect(fileName("Ö/ä: „x“", "plan")).toBe("o-a-x-plan");
  expect(fileName("☂", "plan")).toBe("kit-plan");
});
