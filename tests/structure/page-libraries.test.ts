import { expect, test } from "vitest";
import { importsOf, sourcesIn } from "./sources.ts";

const ISLANDS = "src/components/islands";
const files = new Map(sourcesIn("src").map((file) => [file.path, file]));

/** Everything a browser fetches at once with a file: its imports and theirs, other than on first use. */
function fetchedWith(start: string): Set<string> {
  const fetched = new Set<string>();
  const waiting = [start];
  for (let path = waiting.pop(); path !== undefined; path = waiting.pop()) {
    const file = files.get(path);
    if (fetched.has(path)) continue;
    fetched.add(path);
    for (const { target, typeOnly, onUse } of file ? importsOf(file) : [])
      if (!typeOnly && !onUse) waiting.push(target);
  }
  return fetched;
}

/** What weighs most, and must not come with a page that does not need it: see tests/bench/page-weight.ts. */
test.each([
  ["Tally.tsx", ["decimal.js", "ag-grid-community", "recharts", "src/costing/working.ts"]],
  ["RunPage.tsx", ["decimal.js", "ag-grid-community", "recharts"]],
  ["run/RunEvidence.tsx", ["decimal.js", "ag-grid-community"]],
  ["parts-grid/PartsPage.tsx", ["decimal.js", "ag-grid-community", "recharts", "papaparse"]],
  ["offers/OffersOverview.tsx", ["decimal.js", "ag-grid-community", "recharts"]],
  ["offers/OfferPage.tsx", ["decimal.js", "ag-grid-community", "recharts"]],
  ["boards/Boards.tsx", ["decimal.js", "ag-grid-community", "recharts"]],
])("%s comes without libraries it has no use for at once", (page, libraries) => {
  const fetched = fetchedWith(`${ISLANDS}/${page}`);
  expect(fetched.size, "the walk went on from the page").toBeGreaterThan(20);
  expect(libraries.filter((library) => fetched.has(library))).toEqual([]);
});

test("forms on pages without React bring none of it", () => {
  const fetched = fetchedWith("src/components/forms/send-form.ts");
  expect(fetched).toContain(`${ISLANDS}/call.ts`);
  expect([...fetched].filter((path) => /^(react|@tanstack|ag-grid|recharts|decimal)/.test(path))).toEqual([]);
});
