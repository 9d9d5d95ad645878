import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { channels } from "#db/schema/channels.ts";
import { editions } from "#db/schema/kits.ts";
import { lines } from "#db/schema/parts.ts";
import { offers } from "#db/schema/supply.ts";
import { kitChip, kitFigures } from "#src/components/home/kit-on-home.ts";
import { offerThings } from "#src/components/islands/offers/settle-offers.ts";
import { tallyCells } from "#src/components/islands/plan/tally-cells.ts";
import { thingLink } from "#src/components/islands/plan/thing-link.ts";
import { thingWords } from "#src/components/islands/plan/thing-words.ts";
import { answerFigures, runAnswer } from "#src/components/islands/run/answer-words.ts";
import { home } from "#src/server/home.ts";
import { kitState } from "#src/server/kit-state.ts";
import { kitStops } from "#src/server/trail.ts";
import { testApp } from "#tests/support/app.ts";
import { runKit } from "#tests/support/run-kit.ts";

const app = testApp();
const TODAY = "2026-03-09";

function place() {
  const workshop = app.workshop({ ratePerHour: "18" });
  const ines = app.person("owner", workshop);
  const onHome = (kit: string) => {
    const found = home(app.db, workshop, "owner", ines, app.now, TODAY).kits.find(
      (one) => one.kit.id === kit,
    );
    if (!found?.money) throw new Error("The kit is not on the home page.");
    return { ...found, money: found.money };
  };
  return { workshop, onHome };
}

describe("what is to settle about offers", () => {
  it("is counted alike by the trail, the home page and the Offers page, in the same words", () => {
    const { workshop, onHome } = place();
    const kit = runKit(app, workshop);
    // 80 resistors are needed; the price is without a day and 50 are shown: two doubts, one thing.
    app.db.update(offers).set({ stockShown: 50 }).where(eq(offers.workshopId, workshop.id)).run();
    const state = kitState(app.db, workshop, kit, TODAY);
    const things = offerThings({ plan: state.plan, run: state.result } as Parameters<typeof offerThings>[0]);
    const stop = kitStops("owner", state).find(({ key }) => key === "offers");
    expect(stop?.state).toEqual({ kind: "to-settle", count: 1 });
    expect(things).toHaveLength(1);
    const { money, stops } = onHome(kit.id);
    expect(stops).toEqual(kitStops("owner", state));
    expect(money.waiting).toEqual(things);
    const address = { workshop: workshop.id, kit: kit.id };
    expect(
      money.waiting.map((thing) => [thingWords(thing, money.plan), thingLink(address, thing).href]),
    ).toEqual([
      [
        `Weir Parts ${kit.id} shows 30 fewer of 10 kΩ than are ordered. Ask when more come, or take another offer. The price of Weir Parts ${kit.id} for 10 kΩ has no day. Ask again, or write when it was seen.`,
        `/workshops/${workshop.id}/kits/${kit.id}/offers/part-${kit.id}`,
      ],
    ]);
  });

  it("is nothing once the price has its day and the stock reaches", () => {
    const { workshop, onHome } = place();
    const kit = runKit(app, workshop);
    app.db
      .update(offers)
      .set({ stockShown: 80, pricedOn: TODAY })
      .where(eq(offers.workshopId, workshop.id))
      .run();
    expect(onHome(kit.id).money.waiting).toEqual([]);
    expect(kitChip(onHome(kit.id))).toEqual({ kind: "good", words: "All settled" });
  });
});

describe("a kit whose list is not begun", () => {
  it("needs parts: on the home page, in the strip and in the answer of its run", () => {
    const { workshop, onHome } = place();
    const kit = runKit(app, workshop);
    app.db.delete(lines).where(eq(lines.kitId, kit.id)).run();
    app.db.update(editions).set({ price: null }).where(eq(editions.kitId, kit.id)).run();
    const { money, empty } = onHome(kit.id);
    expect(empty).toBe(true);
    expect(money.waiting).toEqual([]);
    expect(kitFigures(money.tally).map(({ value }) => value)).toEqual([
      "needs parts",
      "not set",
      "needs both",
      "needs both",
    ]);
    const address = { workshop: workshop.id, kit: kit.id };
    const cells = tallyCells(money.tally, { address, currency: "EUR", changes: [] });
    expect(cells.map(({ label, needs, needsHref }) => [label, needs, needsHref?.split(kit.id)[1]])).toEqual([
      ["Cost per kit", "needs parts", "/parts"],
      ["Price", "not set", "/price"],
      ["Earns per kit", "needs both", "/parts"],
      ["Even after", "needs both", "/parts"],
      ["Cash needed", "needs parts", "/parts"],
    ]);
    const answer = runAnswer(answerFigures(kitState(app.db, workshop, kit, TODAY).result));
    expect(answer[0]?.text).toBe("There are no parts yet.");
  });
});

describe("what is to settle about the price", () => {
  it("is a stop of its own: a channel that lacks two terms is one thing, a list price another", () => {
    const { workshop, onHome } = place();
    const kit = runKit(app, workshop);
    const priceStop = () => onHome(kit.id).stops.find(({ key }) => key === "price")?.state;
    expect(priceStop()).toEqual({ kind: "done" });
    app.db.update(channels).set({ feeRate: null, postagePaid: null }).where(eq(channels.id, kit.site)).run();
    expect(priceStop()).toEqual({ kind: "to-settle", count: 1 });
    app.db.update(editions).set({ price: null }).where(eq(editions.kitId, kit.id)).run();
    expect(priceStop()).toEqual({ kind: "to-settle", count: 2 });
    app.db.delete(lines).where(eq(lines.kitId, kit.id)).run();
    expect(priceStop()).toEqual({ kind: "not-started" });
  });
});
