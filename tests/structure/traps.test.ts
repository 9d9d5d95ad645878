import { spawnSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { importsOf, sourcesIn } from "./sources.ts";

/** Traps of the stack that the sources must keep clear of; DEVELOPERS.md says what each would do. */

const sources = sourcesIn("src");

test("no Astro actions and no zod of Astro's own: two versions of it would meet", () => {
  const wrong = sources.filter((file) =>
    importsOf(file).some(({ target }) => /^astro[:/](actions|schema|zod)/.test(target)),
  );
  expect(wrong.map(({ path }) => path)).toEqual([]);
  expect(sources.filter(({ path }) => path.startsWith("src/actions"))).toEqual([]);
});

test("no script or style that the content security policy would block", () => {
  const pages = sources.filter(({ path }) => path.endsWith(".astro"));
  const wrong = pages.filter(({ text }) => /is:inline|define:vars|\son[a-z]+="/.test(text));
  expect(wrong.map(({ path }) => path)).toEqual([]);
});

test("every grid carries the style nonce, without which it is unstyled", () => {
  const grids = sources.filter(({ text }) => /<AgGridReact/.test(text));
  expect(grids.filter(({ text }) => !/styleNonce/.test(text)).map(({ path }) => path)).toEqual([]);
});

test("data, builds and pictures stay out of version control", () => {
  const ignored = readFileSync(".gitignore", "utf8").split("\n");
  for (const folder of ["/data/", "/dist/", "/screens/", "node_modules/"]) expect(ignored).toContain(folder);
});

test("nothing names a package registry's host or a path of one machine", () => {
  const words = [
    "grep",
    "-nIE",
    "registry\\.[a-z]|(^|[^a-z])/(root|home)/[a-z]",
    "--",
    ".",
    ":!tests/structure/traps.test.ts",
  ];
  expect(spawnSync("git", words, { encoding: "utf8" }).stdout).toBe("");
});

test("the lock file holds no download addresses", () => {
  expect(readFileSync("package-lock.json", "utf8")).not.toContain('"resolved"');
});
