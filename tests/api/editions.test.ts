import { expect, it } from "vitest";
import {
  DELETE,
  GET as loss,
  PATCH,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/[edition]/index.ts";
import { GET, POST, PUT } from "#src/pages/api/workshops/[workshop]/kits/[kit]/editions/index.ts";
import {
  PATCH as changeLines,
  GET as lines,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/lines/index.ts";
import { POST as newTask } from "#src/pages/api/workshops/[workshop]/kits/[kit]/tasks.ts";
import { POST as newKit } from "#src/pages/api/workshops/[workshop]/kits/index.ts";
import { call, testApp } from "#tests/support/app.ts";

const app = testApp();

async function kitWithLine() {
  const workshop = app.workshop();
  const as = app.person("designer", workshop);
  const kit = (await call(newKit, { as, params: { workshop: workshop.id }, body: { name: "Reed Chime" } }))
    .body;
  const params = { workshop: workshop.id, kit: kit.id };
  const full = (await call(GET, { as, params, method: "GET" })).body[0]?.id ?? "";
  const add = {
    do: "add-line",
    designators: "R1",
    mark: "in-kit",
    note: "",
    quantities: { [full]: 3 },
    part: { class: "resistor", name: "10 kΩ" },
  };
  await call(changeLines, { as, params, body: { changes: [add] } });
  return { as, params, full };
}

it("a new edition begins with another's quantities, or with none", async () => {
  const { as, params, full } = await kitWithLine();
  const fields = { weight: 1, boardsPerKit: 1 };
  const like = (await call(POST, { as, params, body: { ...fields, name: "With chip", like: full } })).body;
  const bare = (await call(POST, { as, params, body: { ...fields, name: "Bare board", like: null } })).body;
  const list = (await call(lines, { as, params, method: "GET" })).body;
  expect(list.lines[0]?.quantities).toEqual({ [full]: 3, [like?.id ?? ""]: 3 });
  expect(list.editions.map(({ name }) => name)).toEqual(["Full kit", "With chip", "Bare board"]);
  const order = [bare?.id, full, like?.id];
  const put = await call(PUT, { as, params, body: { editions: order }, method: "PUT" });
  expect(put.body.map(({ id }) => id)).toEqual(order);
});

it("an order that leaves one out is refused, and so is an edition of another kit", async () => {
  const [one, other] = [await kitWithLine(), await kitWithLine()];
  const at = { as: one.as, params: one.params };
  expect((await call(PUT, { ...at, body: { editions: [other.full] }, method: "PUT" })).status).toBe(422);
  const body = { name: "With chip", weight: 1, boardsPerKit: 1, like: other.full };
  expect((await call(POST, { ...at, body })).problem?.errors?.[0]?.at).toBe("like");
  const strange = { ...one.params, edition: other.full };
  expect((await call(PATCH, { as: one.as, params: strange, body: { version: 1, name: "X" } })).status).toBe(
    404,
  );
});

it("removing one tells what is lost, and the last one stays", async () => {
  const { as, params, full } = await kitWithLine();
  const body = { name: "Bare board", weight: 1, boardsPerKit: 1, like: null };
  await call(POST, { as, params, body });
  const task = { name: "Bend leads", editions: [full], minutesPerKit: "2", setUpMinutes: "0" };
  await call(newTask, { as, params, body: task });
  const at = { as, params: { ...params, edition: full } };
  expect((await call(loss, { ...at, method: "GET" })).body).toEqual({
    lines: 1,
    onlyHere: 1,
    forNothing: ["Bend leads"],
  });
  expect((await call(DELETE, { ...at, query: { version: "1" }, method: "DELETE" })).status).toBe(200);
  const [last] = (await call(GET, { as, params, method: "GET" })).body;
  const refused = await call(DELETE, {
    as,
    params: { ...params, edition: last?.id ?? "" },
    query: { version: "1" },
    method: "DELETE",
  });
  expect(refused.status).toBe(422);
});

it("a changed edition names the version it has seen and a name of its own", async () => {
  const { as, params, full } = await kitWithLine();
  const at = { as, params: { ...params, edition: full } };
  expect((await call(PATCH, { ...at, body: { version: 1, name: "Everything" } })).body).toMatchObject({
    name: "Everything",
    version: 2,
  });
  expect((await call(PATCH, { ...at, body: { version: 1, weight: 4 } })).status).toBe(409);
  await call(POST, { as, params, body: { name: "Bare", weight: 1, boardsPerKit: 1, like: null } });
  expect((await call(PATCH, { ...at, body: { version: 2, name: "Bare" } })).status).toBe(422);
});
