import { expect, test } from "vitest";
import { migrateDb, openDb } from "#db/client.ts";
import { KITS } from "#db/seed/kits.ts";
import { loadDemonstration } from "#db/seed/load.ts";
import { seedId, WORKSHOP_ID } from "#db/seed/seed-id.ts";
import { costRun } from "#src/costing/cost-run.ts";
import { sweepRuns } from "#src/costing/sweep.ts";
import { planOf } from "#src/server/plan.ts";
import { kitsOf } from "#src/server/store/kit.ts";
import { membershipOf } from "#src/server/store/membership.ts";
import { Plan } from "#src/shapes/plan.ts";

const NOW = Date.UTC(2026, 2, 9);

function loaded() {
  const db = openDb(":memory:");
  migrateDb(db);
  loadDemonstration(db, {}, NOW);
  return db;
}

test("the demonstration loads into an empty database, and every kit gives a valid plan", () => {
  const db = loaded();
  const workshop = membershipOf(db, WORKSHOP_ID, seedId("user", "ines"))?.workshop;
  const kits = kitsOf(db, WORKSHOP_ID);
  expect(kits.map(({ name }) => name)).toEqual(KITS.map(({ name }) => name));
  for (const kit of kits) {
    const plan = planOf(db, workshop as never, kit, "2026-03-09");
    expect(Plan.safeParse(plan).error).toBeUndefined();
  }
});

test("Dew Lantern has 23 lines and three editions, as the demonstration promises", () => {
  const kit = KITS[0];
  expect(kit?.lines).toHaveLength(23);
  expect(kit?.editions).toHaveLength(3);
});

test("quantities agree with designators in every line that has designators", () => {
  for (const kit of KITS)
    for (const line of kit.lines.filter(({ designators }) => designators !== ""))
      expect(Math.max(...line.perKit)).toBe(line.designators.split(", ").length);
});

test("Dew Lantern crosses break-even three times, and its run is the last kit before a step in cost", () => {
  const db = loaded();
  const workshop = membershipOf(db, WORKSHOP_ID, seedId("user", "ines"))?.workshop;
  const kit = kitsOf(db, WORKSHOP_ID).find(({ name }) => name === "Dew Lantern");
  const { breakEven, sweetSpots } = sweepRuns(planOf(db, workshop as never, kit as never, "2026-03-09"));
  expect(breakEven.crossings.map(({ way }) => way)).toEqual(["up", "down", "up"]);
  expect(sweetSpots.map(({ kits }) => kits)).toContain(KITS[0]?.run.kits);
});

test("Dew Lantern's boards come singly or in panels as the run grows: who is cheapest, worked by hand", () => {
  const db = loaded();
  const workshop = membershipOf(db, WORKSHOP_ID, seedId("user", "ines"))?.workshop;
  const kit = kitsOf(db, WORKSHOP_ID).find(({ name }) => name === "Dew Lantern");
  const plan = planOf(db, workshop as never, kit as never, "2026-03-09");
  const at = (kits: number) => {
    const { quotes, chosen } = costRun(plan, kits).boards;
    const quote = quotes.find(({ id }) => id === chosen);
    return [
      quote?.boardHouse,
      quote?.boardsPerPiece,
      quote?.pieces,
      quote?.landed.known && quote.landed.value,
    ];
  };
  // 10 kits, 12 boards: a panel 27.00 + 12 × 0.08, with 36 and 12.50; singly 12 × 4.10 + 33 = 82.20.
  expect(at(10)).toEqual(["Kilnside", 12, 1, "76.46"]);
  expect(at(47)).toEqual(["Kilnside", 1, 50, "108.5"]);
  // A lot of 125 for 160 and freight 41 in dollars at 0.92.
  expect(at(120)).toEqual(["Hollow Mill", 1, 125, "184.92"]);
  // 8 panels of 232 × 178 mm: 33.0368 dm² × 2.20 = 72.68; 128 boards at 0.60 + 0.06 = 84.48; 98 and freight 9.
  expect(at(121)).toEqual(["Saltmarsh", 16, 8, "264.16"]);
  // 11 panels of 12: 11 × 19.96, with 48.50.
  expect(at(124)).toEqual(["Kilnside", 12, 11, "268.06"]);
  expect(at(170)).toEqual(["Hollow Mill", 1, 250, "332.12"]);
});
