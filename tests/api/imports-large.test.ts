import { describe, expect, it } from "vitest";
import { GET as COST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import]/cost.ts";
import { readAside } from "#src/server/bring-in/read-aside.ts";
import { READING_JOBS } from "#src/server/bring-in/reading-jobs.ts";
import { call, testApp } from "#tests/support/app.ts";
import { importCalls, importKit } from "#tests/support/import-kit.ts";
import { runKit } from "#tests/support/run-kit.ts";

const app = testApp();

function longList(lines: number): string {
  const rows = Array.from(
    { length: lines },
    (_, at) => `"R${2 * at + 1}, R${2 * at + 2}",2,${(at % 900) + 100}k,0805,RC-${at}`,
  );
  return `Reference,Qty,Value,Footprint,MPN\n${rows.join("\n")}\n`;
}

describe("a long list", () => {
  it("reads the same in another thread as here", async () => {
    const job = {
      source: {
        id: "a list of its own",
        kind: "parts-list" as const,
        text: longList(40),
        mapping: null,
        remembered: null,
        decisions: { answers: [], join: [] },
        existing: [],
      },
      pricesFrom: null,
      terms: { today: "2026-03-09", currency: "EUR", confirms: false },
    };
    const here = READING_JOBS["parts-summary"](job);
    expect(await readAside("parts-summary", job, 20_000)).toEqual(here);
  });

  it("is taken whole, and the server goes on while it is read", async () => {
    const kit = importKit(app);
    const { id } = (await kit.upload(longList(1900))).body;
    let turns = 0;
    const turning = setInterval(() => turns++, 1);
    const view = (await kit.look(id)).body;
    clearInterval(turning);
    expect(turns).toBeGreaterThan(0);
    expect(view.counts).toMatchObject({ rows: 1901, lines: 1900, skipped: 1 });
    expect(view.difference.counts.added).toBe(1900);
    expect(view.difference.added).toHaveLength(200);
    expect((await kit.take(id, view)).status).toBe(200);
    expect(kit.standing().lines).toHaveLength(1900);
  });

  it("of more lines than a kit can hold is told so, and nothing is taken", async () => {
    const kit = importKit(app);
    const taken = await kit.bringIn(longList(2001));
    expect(taken.status).toBe(422);
    expect(taken.problem?.title).toBe("This list has 2001 lines; a kit holds at most 2000.");
    expect(kit.standing().lines).toEqual([]);
  });
});

describe("the cost of a list, before it is taken", () => {
  /**
   * By hand: the kit of 40 has two of one part, 80 at 0.773911 and 5.00 freight. The list makes it four: 160.
   * Goods 80 × 0.773911 = 61.91288, rounded 61.91; 160 × 0.773911 = 123.82576, rounded 123.83. The rest stays.
   */
  it("is what the run would cost with it, and changes nothing", async () => {
    const workshop = app.workshop({ ratePerHour: "0" });
    const as = app.person("designer", workshop);
    const kit = runKit(app, workshop);
    const calls = importCalls(app, as, workshop, kit);
    const { id } = (await calls.upload('Ref,Qty,Value\n"R1,R2,R3,R4",4,10k\n')).body;
    const before = calls.standing();
    const params = { workshop: workshop.id, kit: kit.id, import: id };
    const { body } = await call(COST, { as, params, method: "GET" });
    expect(body).toMatchObject({ kits: 40, currency: "EUR" });
    expect(body.change).toBe("1.548");
    expect(calls.standing()).toEqual(before);
  });
});
