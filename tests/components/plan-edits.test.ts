import { afterEach, describe, expect, it } from "vitest";
import { keepEdit, lastEdit, noteEdit, undoEdit } from "#src/components/islands/plan/edit-log.ts";
import { merged, withEdit, withPending } from "#src/components/islands/plan/pending-edits.ts";
import { fieldsNow, holderOf, withFields, withVersion } from "#src/components/islands/plan/plan-rows.ts";
import { spokenChange, tallyCells } from "#src/components/islands/plan/tally-cells.ts";
import { tally } from "#src/costing/tally.ts";
import { tallyChanges } from "#src/costing/tally-change.ts";
import { heldSmallPlan } from "#tests/support/small-plan.ts";

const RUN = { kind: "run" } as const;
const PRICE = { kind: "price", id: "kit" } as const;

describe("an edit on this screen", () => {
  it("changes its field and leaves every other part of the plan the same object", () => {
    const held = heldSmallPlan();
    const after = withFields(held, PRICE, { price: "13" });
    expect(after.plan.editions[0]?.price).toBe("13");
    expect(after.plan.parts).toBe(held.plan.parts);
    expect(held.plan.editions[0]?.price).toBe("12");
    const slower = withFields(held, RUN, { learningSlope: "0.9" });
    expect(slower.plan.work).toMatchObject({ learningSlope: "0.9", ratePerHour: "18" });
    expect(slower.plan.run).toBe(held.plan.run);
  });

  it("gives a new spare rate to every part that has none of its own", () => {
    const held = { ...heldSmallPlan(), spare: { rate: "0", own: ["lamp"] } };
    const { plan, spare } = withFields(held, RUN, { spareRate: "0.05" });
    expect(plan.parts.map(({ id, spareRate }) => [id, spareRate])).toEqual([
      ["resistor", "0.05"],
      ["lamp", "0"],
    ]);
    expect(fieldsNow({ ...held, spare }, RUN, ["spareRate"])).toEqual({ spareRate: "0.05" });
  });

  it("shares a version where the database does", () => {
    expect(holderOf({ kind: "channel", id: "site" })).not.toBe(holderOf(RUN));
    expect(holderOf({ kind: "weight", id: "kit" })).toBe(holderOf(PRICE));
    expect(withVersion(heldSmallPlan().versions, "kit", 7).rows.kit).toBe(7);
  });
});

describe("edits that wait to be sent", () => {
  it("join by row: the first base and the last value", () => {
    const first = { row: RUN, fields: { kits: 41 }, base: { kits: 40 } };
    const second = { row: RUN, fields: { kits: 42 }, base: { kits: 41 } };
    expect(withEdit([first], second)).toEqual([{ row: RUN, fields: { kits: 42 }, base: { kits: 40 } }]);
    expect(withEdit([first], { row: PRICE, fields: { price: "1" }, base: { price: null } })).toHaveLength(2);
  });

  it("stay on top of a plan fetched meanwhile", () => {
    const fresh = heldSmallPlan();
    const shown = withPending(fresh, [{ row: RUN, fields: { kits: 77 }, base: { kits: 40 } }]);
    expect(shown.plan.run.kits).toBe(77);
  });

  it("are sent again where only we changed a field, and ask where both did", () => {
    const edit = { row: RUN, fields: { kits: 80, sweepTo: 300 }, base: { kits: 40, sweepTo: 200 } };
    expect(merged(edit, { kits: 55, sweepTo: 200 })).toEqual({
      ours: { sweepTo: 300 },
      both: [{ field: "kits", yours: 80, theirs: 55 }],
    });
    expect(merged(edit, { kits: 80, sweepTo: 200 })).toEqual({ ours: { sweepTo: 300 }, both: [] });
  });
});

describe("the last edit", () => {
  afterEach(keepEdit);
  const edit = (field: string, from: number, to: number, at: number, undone: number[]) =>
    noteEdit({
      before: { ...heldSmallPlan(), spare: { rate: String(from), own: [] } },
      field,
      from,
      at,
      nameFrom: (began) => `From ${began} to ${to}.`,
      undo: () => undone.push(from),
    });

  it("goes on from where it began while the same field is edited, and undoes to there", () => {
    const undone: number[] = [];
    edit("run kits", 100, 101, 0, undone);
    edit("run kits", 101, 102, 1000, undone);
    expect(lastEdit.now()).toMatchObject({ name: "From 100 to 102.", before: { spare: { rate: "100" } } });
    undoEdit();
    expect(undone).toEqual([100]);
    expect(lastEdit.now()).toBeNull();
  });

  it("starts afresh with another field, and after a pause", () => {
    edit("run kits", 100, 101, 0, []);
    edit("sale taxRate", 0, 1, 500, []);
    expect(lastEdit.now()?.name).toBe("From 0 to 1.");
    edit("sale taxRate", 1, 2, 60_000, []);
    expect(lastEdit.now()?.name).toBe("From 1 to 2.");
  });
});

describe("signed changes of the strip", () => {
  const { plan } = heldSmallPlan();
  const dearer = withFields(heldSmallPlan(), { kind: "hour-rate" }, { ratePerHour: "36" }).plan;

  // By hand: 270 minutes at 18.00 more an hour are 81.00, over 40 kits 2.025 each, halves away from zero 2.03;
  // 298.91 is paid for after ⌈298.91 ÷ 12⌉ = 25 sold, 6 more than 19.
  it("say by how much, and whether that is better", () => {
    expect(tallyChanges(tally(plan), tally(dearer))).toEqual([
      { figure: "costPerKit", by: "2.03", turn: "worse" },
      { figure: "earnsPerKit", by: "-2.03", turn: "worse" },
      { figure: "evenAfter", by: "6", turn: "worse" },
      { figure: "cashNeeded", by: "81.00", turn: "worse" },
    ]);
    expect(tallyChanges(tally(dearer), tally(plan)).every(({ turn }) => turn === "better")).toBe(true);
  });

  it("call a price that changes neither, and leave out what is not known on one side", () => {
    const priced = withFields(heldSmallPlan(), PRICE, { price: "13" }).plan;
    expect(tallyChanges(tally(plan), tally(priced))[0]).toEqual({
      figure: "price",
      by: "1.00",
      turn: "neither",
    });
    const unpriced = withFields(heldSmallPlan(), PRICE, { price: null }).plan;
    expect(tallyChanges(tally(plan), tally(unpriced))).toEqual([]);
  });

  it("are written in the cells and said once, in words", () => {
    const changes = tallyChanges(tally(plan), tally(dearer));
    const address = { workshop: "w", kit: "k" };
    const cells = tallyCells(tally(dearer), { address, currency: "EUR", changes });
    expect(cells.map(({ value }) => value)).toEqual(["€7.47", "€12.00", "€4.53", "25", "€298.91"]);
    expect(cells[0]?.change).toEqual({ amount: "+€2.03", turn: "worse" });
    expect(cells[3]?.change).toEqual({ amount: "+6", turn: "worse" });
    expect(spokenChange(tally(dearer), changes)).toBe("Cost per kit €7.47, €2.03 more.");
  });

  it("name what a figure waits for, with the way there", () => {
    const unpriced = withFields(heldSmallPlan(), PRICE, { price: null }).plan;
    const address = { workshop: "w", kit: "k" };
    const cells = tallyCells(tally(unpriced), { address, currency: "EUR", changes: [] });
    expect(cells[1]).toMatchObject({
      value: null,
      needs: "not set",
      needsHref: "/workshops/w/kits/k/price",
    });
  });
});
