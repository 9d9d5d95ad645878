import { eq } from "drizzle-orm";
import { expect, it } from "vitest";
import { lineQuantities, lines, parts } from "#db/schema/parts.ts";
import { offers } from "#db/schema/supply.ts";
import { endRevision } from "#src/server/revision.ts";
import { revisionCost } from "#src/server/revision-cost.ts";
import { kitOf } from "#src/server/store/kit.ts";
import { testApp } from "#tests/support/app.ts";
import { runKit } from "#tests/support/run-kit.ts";

const app = testApp();
const TODAY = "2026-03-09";

/** A kit whose revision A has ended; a run of 40, two resistors at 0.773911 in a kit. */
function place() {
  const workshop = app.workshop({ ratePerHour: "18" });
  const made = runKit(app, workshop);
  const by = { db: app.db, now: app.now, user: app.person("owner", workshop), workshop };
  const cost = () => revisionCost(app.db, workshop, kitOf(app.db, workshop.id, made.id) ?? made, TODAY);
  return { workshop, made, line: `line-${made.id}`, end: () => endRevision(by, made), cost };
}

it("is the difference between the two lists, both by today's offers", () => {
  const { line, end, cost } = place();
  end();
  app.db.update(lineQuantities).set({ perKit: 3 }).where(eq(lineQuantities.lineId, line)).run();
  // 40 × 2 at 0.773911 are 61.91, 40 × 3 are 92.87: 30.96 more for 40 kits, 0.774 for one.
  expect(cost()?.change).toBe("0.774");
  expect(cost()).toMatchObject({
    kits: 40,
    currency: "EUR",
    before: { known: true },
    after: { known: true },
  });
});

it("is not known where a list holds a part without a price, and says what it needs", () => {
  const { made, line, end, cost } = place();
  end();
  app.db
    .delete(offers)
    .where(eq(offers.partId, `part-${made.id}`))
    .run();
  expect(cost()).toMatchObject({
    change: null,
    before: { known: false, needs: [{ code: "unpriced-part" }] },
    after: { known: false },
  });
  app.db.delete(lines).where(eq(lines.id, line)).run();
  expect(cost()).toMatchObject({ change: null, after: { known: false, needs: [{ code: "no-parts" }] } });
});

it("counts a part that has left the workshop as one without offers, and leaves everything as it was", () => {
  const { made, line, end, cost } = place();
  end();
  app.db.delete(lines).where(eq(lines.id, line)).run();
  app.db
    .delete(parts)
    .where(eq(parts.id, `part-${made.id}`))
    .run();
  expect(cost()).toMatchObject({ before: { known: false, needs: [{ code: "unpriced-part" }] } });
  expect(app.db.select().from(lines).all()).toEqual([]);
  expect(app.db.select().from(parts).all()).toEqual([]);
});

it("is nothing while the first revision lasts", () => {
  expect(place().cost()).toBeNull();
});
