import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { expect, it } from "vitest";
import { testApp } from "#tests/support/app.ts";
import { importKit } from "#tests/support/import-kit.ts";

const app = testApp();

/** Our own lists, and where they lie beside the project, real ones; a clone without them tries only its own. */
const FOLDERS = ["samples", "../shared/corpus/dev"];
const lists = FOLDERS.filter((folder) => existsSync(folder)).flatMap((folder) =>
  readdirSync(folder)
    .filter((name) => /\.(csv|tsv|txt)$/.test(name))
    .map((name) => [name, join(folder, name)] as const),
);

/** Brings a list in with every suggestion taken, and returns what it would change. */
async function suggested(kit: ReturnType<typeof importKit>, bytes: Uint8Array, name: string) {
  const { id } = (await kit.upload(bytes, name)).body;
  const view = (await kit.edit(id, { version: 1, takeSuggestions: true })).body;
  return { id, view };
}

it.each(lists)("%s brought in twice changes nothing the second time", async (name, path) => {
  const kit = importKit(app);
  const bytes = readFileSync(path);
  const first = await suggested(kit, bytes, name);
  expect(first.view.questions.must).toBe(0);
  const taken = await kit.take(first.id, first.view);
  expect([taken.status, taken.problem]).toEqual([200, null]);
  const before = kit.standing();
  const second = await suggested(kit, bytes, name);
  const { added, removed, changed, revalued } = second.view.difference;
  expect({ added, removed, changed, revalued }).toEqual({
    added: [],
    removed: [],
    changed: [],
    revalued: [],
  });
  expect((await kit.take(second.id, second.view)).problem?.code).toBe("nothing-to-bring-in");
  expect(kit.standing()).toEqual(before);
});
