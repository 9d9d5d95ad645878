import { describe, expect, it } from "vitest";
import { newsSentence } from "#src/components/home/news-words.ts";
import { newsFor } from "#src/server/news.ts";
import { noteChange } from "#src/server/note-change.ts";
import type { KitRow } from "#src/server/store/kit.ts";
import type { Role } from "#src/shapes/limits.ts";
import { sourcesIn } from "#tests/structure/sources.ts";
import { testApp } from "#tests/support/app.ts";

const app = testApp();
const HOUR = 60 * 60 * 1000;

function place() {
  const workshop = app.workshop();
  const kit = app.kit(workshop);
  const tom = app.person("seller", workshop);
  const did = (action: string, subjectName: string, detail = {}, within: KitRow | null = kit) =>
    noteChange(
      { db: app.db, now: app.now, user: tom, workshop, ...(within && { kit: within }) },
      { action, subjectId: subjectName, subjectName, detail },
    );
  const reads = (role: Role) => {
    const { id } = app.person(role, workshop);
    const who = { workshopId: workshop.id, role, userId: id, kitIds: [kit.id] };
    return newsFor(app.db, who, app.now).map((entry) => newsSentence(entry, kit.name, "EUR"));
  };
  return { tom: tom.name.split(" ")[0], workshop, kit, did, reads };
}

describe("what is new", () => {
  it("says who set which price to what, by first name, as it now stands", () => {
    const { tom, kit, did, reads } = place();
    did("edition.change", "Full kit", { price: ["32.00", "33.00"] });
    app.pass(1000);
    did("edition.change", "Full kit", { price: ["33.00", "34.00"] });
    expect(reads("owner")).toEqual([`${tom} set the price of ${kit.name}, Full kit, to €34.00.`]);
  });

  it("counts what somebody did several times, and names what they did once", () => {
    const { tom, kit, did, reads } = place();
    for (const line of ["R1", "R2", "C1"]) did("line.add", line);
    did("line.remove", "U1");
    expect(reads("designer").sort()).toEqual(
      [`${tom} added 3 lines to ${kit.name}.`, `${tom} removed U1 from ${kit.name}.`].sort(),
    );
  });

  it("goes back a day, and leaves out one's own", () => {
    const { workshop, kit, tom, did, reads } = place();
    did("line.add", "R1");
    const who = { workshopId: workshop.id, role: "seller" as const, kitIds: [kit.id] };
    app.pass(23 * HOUR);
    expect(reads("owner")).toEqual([`${tom} added R1 to ${kit.name}.`]);
    app.pass(2 * HOUR);
    expect(reads("owner")).toEqual([]);
    const owner = app.person("owner", workshop);
    noteChange(
      { db: app.db, now: app.now, user: owner, workshop, kit },
      { action: "line.add", subjectId: "r", subjectName: "R2" },
    );
    expect(newsFor(app.db, { ...who, userId: owner.id }, app.now)).toEqual([]);
  });

  it("is not what a role may not see: prices, offers and runs from a co-builder, people from all but owners", () => {
    const { tom, kit, did, reads } = place();
    did("edition.change", "Full kit", { price: [null, "34.00"] });
    did("offer.change", "Socket");
    did("run.change", kit.name, { kits: [100, 120] });
    did("part.choose", "Socket");
    did("list.take", "prices.csv", {}, null);
    did("invitation.send", "somebody@example.org");
    did("person.role", "Ruth Ojala");
    did("access-token.make", "script");
    did("line.change", "R1");
    expect(reads("co-builder")).toEqual([`${tom} changed R1 in ${kit.name}.`]);
    expect(reads("designer")).not.toContain(`${tom} changed the role of Ruth Ojala.`);
    expect(reads("designer")).toContain(`${tom} set the run of ${kit.name} to 120.`);
    expect(reads("owner")).toContain(`${tom} changed the role of Ruth Ojala.`);
    expect(reads("owner").join()).not.toMatch(/example\.org|script/);
  });
});

it("has words for whatever the server writes down", () => {
  const written = sourcesIn("src/server").flatMap(({ text }) =>
    [...text.matchAll(/action(?::| =)[^;,]*/g)].flatMap(([clause]) =>
      [...clause.matchAll(/"([a-z-]+\.[a-z-]+)"/g)].map(([, action]) => action as string),
    ),
  );
  expect(written.length).toBeGreaterThan(30);
  const entry = { id: "", workshopId: "", kitId: "k", userId: null, at: 0, subjectId: "", subjectName: "x" };
  const wordless = written.filter(
    (action) =>
      !action.startsWith("access-token.") &&
      newsSentence({ ...entry, action, detail: {}, by: null, count: 1 }, "Fen Beacon", "EUR") === null,
  );
  expect(wordless).toEqual([]);
});
