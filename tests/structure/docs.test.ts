import { existsSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { can, PERMISSIONS, type Permission } from "#src/access.ts";
import { ROLES } from "#src/shapes/limits.ts";
import packageJson from "../../package.json" with { type: "json" };

const readme = readFileSync("README.md", "utf8");
const developers = readFileSync("DEVELOPERS.md", "utf8");

test("README lists exactly the variables that the configuration reads", () => {
  const read = new Set(readFileSync("src/server/config.ts", "utf8").match(/TINPENNY_[A-Z_]+(?=:)/g));
  const listed = new Set([...readme.matchAll(/^\| `(TINPENNY_[A-Z_]+)`/gm)].map((match) => match[1]));
  expect([...listed].sort()).toEqual([...read].sort());
});

test("the permission table in DEVELOPERS.md is the one in access.ts", () => {
  const rows = [...developers.matchAll(/^\| ([a-z-]+) \|(.*)\|$/gm)].filter(
    ([, name]) => name !== "permission",
  );
  const stated = Object.fromEntries(
    rows
      .filter(([, name]) => (name as string) in PERMISSIONS)
      .map(([, name, cells]) => [name, (cells as string).split("|").map((cell) => cell.trim() === "yes")]),
  );
  const coded = Object.fromEntries(
    (Object.keys(PERMISSIONS) as Permission[]).map((name) => [name, ROLES.map((role) => can(role, name))]),
  );
  expect(stated).toEqual(coded);
});

test("every npm script and file that the two pages name exists", () => {
  const both = readme + developers;
  const scripts = [...both.matchAll(/npm run ([a-z:]+)/g)].map((match) => match[1] as string);
  expect(scripts.filter((name) => !(name in packageJson.scripts))).toEqual([]);
  const files = [...both.matchAll(/`((?:src|db|tests)\/[\w./-]+\.\w+)`/g)].map((match) => match[1] as string);
  expect(files.filter((path) => !existsSync(path))).toEqual([]);
});

test("every package is named with its reason, or belongs to the platform", () => {
  const unnamed = Object.keys(packageJson.dependencies).filter(
    (name) => !developers.includes(name) && !/^(@astrojs|@fontsource|@tailwindcss|react-)/.test(name),
  );
  expect(unnamed).toEqual([]);
});
