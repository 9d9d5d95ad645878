/**
 * How the browser's scripts are divided. Left alone, every set of pages that share a module gets a file of its own,
 * some sixty a page, each with its headers and too short to be compressed well. Here what every page of a kit needs
 * lies in few files, and what a page does not need stays out of them.
 */

const ISLANDS = "/src/components/islands/";

/** Libraries by the file they go into. */
const LIBRARIES = [
  ["react", /\/node_modules\/(react|react-dom|scheduler)\/|commonjsHelpers/],
  ["query", /\/node_modules\/@tanstack\//],
  ["decimal", /\/node_modules\/decimal\.js\//],
  ["grid", /\/node_modules\/ag-grid/],
  [
    "charts",
    /\/node_modules\/(recharts|victory-vendor|d3-[a-z]+|@reduxjs|redux|reselect|immer|es-toolkit)\//,
  ],
];

/** The pages of a kit; what nearly all of them need lies in one file. */
const PAGES = ["RunPage.tsx", "boards/Boards.tsx", "offers/OffersOverview.tsx", "parts-grid/PartsPage.tsx"];
const NEARLY_ALL = 3;

/** A module with everything it imports other than on first use. */
function withImports(start, getModuleInfo) {
  const reached = new Set();
  const waiting = [start];
  for (let id = waiting.pop(); id !== undefined; id = waiting.pop()) {
    if (reached.has(id)) continue;
    reached.add(id);
    waiting.push(...(getModuleInfo(id)?.importedIds ?? []));
  }
  return reached;
}

/** What the strip of a kit needs, what pages outside kits need, and plain forms: worked out once a build. */
function reach(root, getModuleInfo) {
  const of = (path) => withImports(root + path, getModuleInfo);
  return {
    kit: of(`${ISLANDS}Tally.tsx`),
    toasts: of(`${ISLANDS}parts/Toasts.tsx`),
    outside: of(`${ISLANDS}supply/Suppliers.tsx`),
    forms: of("/src/components/forms/send-form.ts"),
    pages: PAGES.map((page) => of(ISLANDS + page)),
  };
}

function ownChunk(id, root, { kit, toasts, outside, forms, pages }) {
  // Forms are on pages without React, toasts on every other: what they need stays small and apart.
  if (forms.has(id)) return kit.has(id) || pages.some((page) => page.has(id)) ? "plain" : undefined;
  if (toasts.has(id)) return "toasts";
  if (kit.has(id) && outside.has(id)) return "base";
  if (kit.has(id)) return id.startsWith(`${root}/src/costing/`) ? "costing" : "kit";
  return pages.filter((page) => page.has(id)).length < NEARLY_ALL ? undefined : "pages";
}

/** The file a module goes into, or nothing where that is left to the bundler. */
export function chunkOf(root) {
  let reached;
  return (id, { getModuleInfo }) => {
    if (id.endsWith("vite/preload-helper.js")) return "toasts";
    const library = LIBRARIES.find(([, pattern]) => pattern.test(id));
    if (library) return library[0];
    reached ??= reach(root, getModuleInfo);
    return id.startsWith(`${root}/src/`) ? ownChunk(id, root, reached) : undefined;
  };
}
