import { describe, expect, it } from "vitest";
import { POST as copies } from "#src/pages/api/workshops/[workshop]/kits/[kit]/copies.ts";
import { DELETE, PATCH } from "#src/pages/api/workshops/[workshop]/kits/[kit]/index.ts";
import {
  PATCH as changeLines,
  GET as lines,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/lines/index.ts";
import { POST as endRevision } from "#src/pages/api/workshops/[workshop]/kits/[kit]/revisions/index.ts";
import { GET as kitList, POST as newKit } from "#src/pages/api/workshops/[workshop]/kits/index.ts";
import { activitySince } from "#src/server/store/activity.ts";
import { channelsOf } from "#src/server/store/channel.ts";
import { changeKit, kitOf } from "#src/server/store/kit.ts";
import { runPlanOf } from "#src/server/store/run-plan.ts";
import { call, testApp } from "#tests/support/app.ts";

const app = testApp();

function place() {
  const workshop = app.workshop();
  return { workshop, as: app.person("designer", workshop), params: { workshop: workshop.id } };
}

async function begin(at: ReturnType<typeof place>, name = "Fen Beacon") {
  const { body } = await call(newKit, { as: at.as, params: at.params, body: { name } });
  return { kit: body, asking: { as: at.as, params: { ...at.params, kit: body.id } } };
}

describe("a new kit", () => {
  it("has one edition and a run to start from, with nothing about its sale decided", async () => {
    const at = place();
    const { kit, asking } = await begin(at);
    expect(kit).toMatchObject({ name: "Fen Beacon", revision: "A", closed: false, version: 1 });
    const list = (await call(lines, { ...asking, method: "GET" })).body;
    expect(list.editions).toMatchObject([{ name: "Full kit", weight: 1, boardsPerKit: 1, price: null }]);
    expect(list.lines).toEqual([]);
    expect(runPlanOf(app.db, kit.id)).toMatchObject({
      kits: 50,
      sweepTo: 500,
      spareRate: "0",
      boardYield: "1",
      boardConfidence: "0.95",
      learningSlope: "1",
      kitsMadeBefore: 0,
      replacementShare: "0",
    });
    const [site, ...more] = channelsOf(app.db, kit.id);
    expect(more).toEqual([]);
    expect(site?.channel).toMatchObject({ name: "Own site", weight: 1, taxRate: null, feeRate: null });
    expect(site?.channel).toMatchObject({ packingCost: null, minutesPerOrder: null, kitsPerOrder: "1" });
  });

  it("needs a name that no other kit of the workshop has", async () => {
    const at = place();
    await begin(at);
    const again = await call(newKit, { as: at.as, params: at.params, body: { name: " Fen Beacon " } });
    expect(again.status).toBe(422);
    expect(again.problem?.errors?.[0]?.at).toBe("name");
    const elsewhere = place();
    expect((await begin(elsewhere)).kit.name).toBe("Fen Beacon");
  });

  it("refuses a board without width", async () => {
    const at = place();
    const body = { name: "Fen Beacon", boardWidth: "0" };
    const answer = await call(newKit, { as: at.as, params: at.params, body });
    expect(answer.problem?.errors).toEqual([{ at: "boardWidth", message: "A board is wider than 0 mm." }]);
  });
});

describe("changing a kit", () => {
  it("takes the version that was seen, writes down who did it, and refuses an older one", async () => {
    const at = place();
    const { kit, asking } = await begin(at);
    const first = await call(PATCH, {
      ...asking,
      body: { version: 1, boardShape: "round", boardWidth: "52.5" },
    });
    expect(first.body).toMatchObject({ version: 2, boardShape: "round", boardWidth: "52.5" });
    const late = await call(PATCH, { ...asking, body: { version: 1, summary: "Blinks at dusk" } });
    expect(late.problem?.code).toBe("changed-meanwhile");
    expect(late.problem?.current).toMatchObject({ version: 2, boardWidth: "52.5", changedBy: at.as.name });
    const noted = activitySince(app.db, at.workshop.id, 0, null, 10).map(({ action, by }) => [action, by]);
    expect(noted).toContainEqual(["kit.change", at.as.name]);
    expect(kit.version).toBe(1);
  });

  it("keeps what is drawn on the board until the board has another shape or size", async () => {
    const at = place();
    const { kit, asking } = await begin(at);
    const marks = { pads: [[2, 3]] as const };
    changeKit(app.db, at.workshop.id, kit.id, 1, { boardWidth: "58", boardHeight: "42", boardMarks: marks });
    const drawn = () => kitOf(app.db, at.workshop.id, kit.id)?.boardMarks;
    await call(PATCH, { ...asking, body: { version: 2, summary: "Blinks", boardWidth: "58" } });
    expect(drawn()).toEqual(marks);
    await call(PATCH, { ...asking, body: { version: 3, boardWidth: "60" } });
    expect(drawn()).toBeNull();
  });

  it("closes it and opens it again", async () => {
    const { asking } = await begin(place());
    expect((await call(PATCH, { ...asking, body: { version: 1, closed: true } })).body.closed).toBe(true);
    expect((await call(PATCH, { ...asking, body: { version: 2, closed: false } })).body.closed).toBe(false);
  });

  it("removes it, if it was seen as it is", async () => {
    const at = place();
    const { asking } = await begin(at);
    await call(PATCH, { ...asking, body: { version: 1, summary: "Blinks" } });
    expect((await call(DELETE, { ...asking, query: { version: "1" }, method: "DELETE" })).status).toBe(409);
    expect((await call(DELETE, { ...asking, query: { version: "2" }, method: "DELETE" })).status).toBe(204);
    const left = await call(kitList, { as: at.as, params: at.params, method: "GET" });
    expect(left.body).toEqual([]);
  });

  it("ends a revision and keeps its list", async () => {
    const { asking } = await begin(place());
    expect((await call(endRevision, asking)).body.revision).toBe("B");
    expect((await call(endRevision, asking)).body.revision).toBe("C");
  });
});

describe("a copy", () => {
  it("has the same list with rows of its own, and shares the parts", async () => {
    const at = place();
    const { kit, asking } = await begin(at);
    const before = (await call(lines, { ...asking, method: "GET" })).body;
    const edition = before.editions[0]?.id ?? "";
    const add = {
      do: "add-line",
      designators: "R2, R1",
      mark: "in-kit",
      note: "",
      quantities: { [edition]: 2 },
      part: { class: "resistor", name: "10 kΩ", spec: "5 %" },
    };
    await call(changeLines, { ...asking, body: { changes: [add] } });
    const copy = (await call(copies, { ...asking, body: { name: "Fen Beacon, another" } })).body;
    const there = { as: at.as, params: { ...at.params, kit: copy.id }, method: "GET" };
    const [from, to] = [
      (await call(lines, { ...asking, method: "GET" })).body,
      (await call(lines, there)).body,
    ];
    expect(to.lines).toHaveLength(1);
    expect(to.lines[0]?.designators).toBe("R1, R2");
    expect(to.lines[0]?.id).not.toBe(from.lines[0]?.id);
    expect(to.lines[0]?.part.id).toBe(from.lines[0]?.part.id);
    expect(Object.values(to.lines[0]?.quantities ?? {})).toEqual([2]);
    expect(Object.keys(to.lines[0]?.quantities ?? {})).toEqual([to.editions[0]?.id]);
    expect(to.kit.revision).toBe("A");
    expect(from.kit.id).toBe(kit.id);
  });
});

describe("the list of kits", () => {
  it("shows a co-builder only those they were asked to", async () => {
    const at = place();
    const [{ kit }] = [await begin(at), await begin(at, "Reed Chime")];
    const coBuilder = app.person("co-builder", at.workshop);
    const asking = { as: coBuilder, params: at.params, method: "GET" };
    expect((await call(kitList, asking)).body).toEqual([]);
    app.guest(coBuilder, { ...kit, workshopId: at.workshop.id } as never);
    expect((await call(kitList, asking)).body.map(({ name }) => name)).toEqual(["Fen Beacon"]);
  });
});
