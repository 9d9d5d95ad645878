import { expect, test } from "vitest";
import { importsOf, type SourceFile, sourcesIn } from "./sources.ts";

/**
 * The import table of DEVELOPERS.md: what the files of a folder may import. `value` imports end up in what
 * runs; `type` imports are free unless `types` forbids them. The longest matching folder decides.
 */
interface Rule {
  folder: string;
  may: readonly RegExp[];
  /** What may be imported as a type besides; everything else may not be named at all. */
  types?: readonly RegExp[];
}

const PURE = [/^src\/(costing|partslist|shapes\/(limits|revision-letter)\.ts)/];
const REACT = [/^(react|react-dom|@tanstack\/react-query|ag-grid-community|ag-grid-react|recharts)$/];
const ISLAND_STATE = [/^src\/(components|drawings)\//, /^src\/access\.ts$/, ...PURE];

const RULES: readonly Rule[] = [
  { folder: "src/costing/decimal.ts", may: [/^decimal\.js$/] },
  {
    folder: "src/costing/",
    may: [/^src\/costing\//, /^src\/shapes\/limits\.ts$/],
    types: [/^src\/shapes\//],
  },
  {
    folder: "src/partslist/cells.ts",
    may: [/^papaparse$/, /^src\/partslist\//, /^src\/shapes\/limits\.ts$/],
  },
  {
    folder: "src/partslist/",
    may: [/^src\/partslist\//, /^src\/costing\/(decimal|money)/, /^src\/shapes\/limits\.ts$/],
    types: [/^src\/(shapes|costing)\//],
  },
  { folder: "src/shapes/limits.ts", may: [] },
  {
    folder: "src/shapes/",
    may: [
      /^src\/shapes\//,
      /^zod$/,
      /^src\/costing\/currenc/,
      /^src\/partslist\/(meanings|question-codes)\.ts$/,
    ],
    types: [/^src\/costing\//],
  },
  { folder: "src/drawings/", may: [/^src\/drawings\//] },
  { folder: "src/access.ts", may: [], types: [/^src\/shapes\/limits\.ts$/] },
  {
    folder: "db/",
    may: [/^db\//, /^drizzle-orm$/, /^better-sqlite3$/, /^node:$/, /^src\/(shapes\/limits\.ts$|drawings\/)/],
    types: [/^src\/shapes\//],
  },
  {
    folder: "src/server/store/",
    may: [/^src\/server\/store\//, /^db\//, /^drizzle-orm$/, /^src\/shapes\/limits\.ts$/],
    types: [/^src\/(shapes|costing|partslist)\//],
  },
  {
    folder: "src/server/",
    may: [/^(?!react|drizzle-orm|src\/components|src\/pages|src\/layouts|tests)/],
  },
  {
    folder: "src/pages/api/",
    may: [/^src\/(server|shapes|access)/, /^zod$/, /^src\/pages\/api\//],
    types: [/^astro$/],
  },
  {
    folder: "src/pages/",
    may: [
      /^src\/(server|access|layouts|components|drawings|costing|partslist|shapes\/(limits|revision-letter))/,
      /^astro/,
    ],
  },
  {
    folder: "src/layouts/",
    may: [
      /^src\/(layouts|components|access|styles|costing|shapes\/revision-letter)/,
      /^@fontsource/,
      /^astro/,
    ],
    types: [/^src\//],
  },
  { folder: "src/components/islands/", may: [...REACT, ...ISLAND_STATE], types: [/^src\//] },
  {
    folder: "src/components/",
    may: [...ISLAND_STATE, /^@fontsource/, /^astro/],
    types: [/^src\//, /^react$/],
  },
  { folder: "src/middleware.ts", may: [/^src\/server\//, /^astro/, /^node:$/] },
  { folder: "src/", may: [/^astro/], types: [/^src\//] },
];

function ruleOf(path: string): Rule {
  const fitting = RULES.filter(({ folder }) => path.startsWith(folder));
  return fitting.reduce((best, rule) => (rule.folder.length > best.folder.length ? rule : best));
}

function broken(file: SourceFile): string[] {
  const { may, types = [] } = ruleOf(file.path);
  return importsOf(file)
    .filter(({ target, typeOnly }) => {
      const allowed = typeOnly ? [...may, ...types] : may;
      return !/\.css$/.test(target) && !allowed.some((pattern) => pattern.test(target));
    })
    .map(
      ({ written, typeOnly }) => `${file.path} may not import ${typeOnly ? "the type of " : ""}${written}`,
    );
}

const all = [...sourcesIn("src"), ...sourcesIn("db")];

test("every folder imports only what DEVELOPERS.md lets it", () => {
  expect(all.flatMap(broken)).toEqual([]);
});

test("imports are spelled one way: # from the root or ./ beside, with the file's extension", () => {
  const wrong = all.flatMap((file) =>
    importsOf(file)
      .filter(({ written }) => /^\.\.\/\.\.\//.test(written) || /^[.#][^?]*\/[^./]+$/.test(written))
      .map(({ written }) => `${file.path}: ${written}`),
  );
  expect(wrong).toEqual([]);
});

test("no folder is a place for leftovers, and nothing re-exports a folder", () => {
  const wrong = all
    .map(({ path }) => path)
    .filter(
      (path) =>
        /(util|helper|common|misc)[^/]*$/.test(path) ||
        (/\/index\.ts$/.test(path) && !path.startsWith("src/pages/")),
    );
  expect(wrong).toEqual([]);
});

test("the environment is read in one place, bodies in one place", () => {
  const reads = all.filter(
    ({ path, text }) =>
      /process\.env\.?(?!\w*\.ASTRO)/.test(text) &&
      !/src\/server\/(config\.ts|ready\.mjs|main\.ts|dev\.ts)/.test(path),
  );
  expect(reads.map(({ path }) => path)).toEqual([]);
  const bodies = all.filter(
    ({ path, text }) =>
      /request\.(json|formData|text|arrayBuffer)\(/.test(text) && path !== "src/server/read-body.ts",
  );
  expect(bodies.map(({ path }) => path)).toEqual([]);
});
