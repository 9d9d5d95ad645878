import { describe, expect, test } from "vitest";
import { type FittedPanels, fitPanels } from "#src/costing/panels/fit-panels.ts";
import { gridsIn } from "#src/costing/panels/grids.ts";
import { layOutPanel } from "#src/costing/panels/lay-out-panel.ts";
import { roomIn } from "#src/costing/panels/panel-frame.ts";
import type { PanelTerms } from "#src/costing/panels/panel-terms.ts";

/**
 * Boxes on a pallet are boards on a panel without rails and gaps. A router's gap is never 0, so sides and panel are a
 * micrometre less and the gap is that micrometre: the same counts. Scored panels take the sides as they are.
 */
function pallet([length, width, l, w]: readonly number[], routed: boolean): FittedPanels {
  const mm = (side: number | undefined) => (routed ? ((side ?? 0) - 0.001).toFixed(3) : String(side));
  const terms: PanelTerms = {
    largest: { width: mm(length), height: mm(width) },
    least: null,
    separation: routed ? "routed" : "v-score",
    gap: routed ? "0.001" : "0",
    rails: { sides: "none", width: "0" },
  };
  const result = fitPanels({ shape: "rectangle", width: mm(l), height: mm(w) }, terms);
  if (!result.ok) throw new Error(result.problems[0]?.code);
  return result;
}

/**
 * Pallet, box, then what is known: grid of one orientation, best guillotine layout, proven optimum, area bound.
 * 49 × 28 with 8 × 3: Lobato, Birgin and Morabito, recursive five-block and L-algorithm, page "packing" (57, 56).
 * 52 × 33 … 53 × 26: instances of the pallet-loading literature from memory, optima proven by exhaustive search.
 * The others: own exhaustive search.
 */
const PALLETS = [
  { sides: [49, 28, 8, 3], grid: 54, guillotine: 56, optimum: 57, area: 57 },
  { sides: [52, 33, 9, 4], grid: 40, guillotine: 46, optimum: 47, area: 47 },
  { sides: [40, 25, 7, 3], grid: 40, guillotine: 46, optimum: 47, area: 47 },
  { sides: [67, 37, 11, 3], grid: 72, guillotine: 74, optimum: 75, area: 75 },
  { sides: [63, 44, 8, 5], grid: 60, guillotine: 67, optimum: 69, area: 69 },
  { sides: [32, 22, 5, 4], grid: 32, guillotine: 34, optimum: 34, area: 35 },
  { sides: [40, 26, 7, 4], grid: 30, guillotine: 36, optimum: 36, area: 37 },
  { sides: [40, 33, 7, 4], grid: 40, guillotine: 46, optimum: 46, area: 47 },
  { sides: [53, 26, 7, 4], grid: 42, guillotine: 48, optimum: 48, area: 49 },
  { sides: [14, 10, 3, 2], grid: 21, guillotine: 23, optimum: 23, area: 23 },
  { sides: [16, 14, 4, 3], grid: 16, guillotine: 18, optimum: 18, area: 18 },
  { sides: [30, 22, 7, 4], grid: 21, guillotine: 22, optimum: 23, area: 23 },
  { sides: [9, 9, 5, 2], grid: 4, guillotine: 6, optimum: 8, area: 8 },
  { sides: [11, 11, 4, 3], grid: 6, guillotine: 8, optimum: 9, area: 10 },
  { sides: [20, 15, 6, 4], grid: 10, guillotine: 11, optimum: 11, area: 12 },
  { sides: [11, 9, 4, 2], grid: 10, guillotine: 10, optimum: 10, area: 12 },
  { sides: [17, 10, 4, 3], grid: 12, guillotine: 13, optimum: 14, area: 14 },
];

describe("rectangles in a rectangle: pallet-loading instances", () => {
  test.each(PALLETS)("$sides: a scored panel holds the grid of one orientation, $grid", ({ sides, grid }) => {
    expect(pallet(sides, false)).toMatchObject({ most: grid, claim: "proven" });
  });

  test.each(PALLETS)(
    "$sides: two blocks hold no more than the best guillotine layout, $guillotine, and claim no more than is so",
    ({ sides, grid, guillotine, optimum, area }) => {
      const { most, mostByArea, claim } = pallet(sides, true);
      expect(most).toBeGreaterThanOrEqual(grid);
      expect(most).toBeLessThanOrEqual(guillotine);
      expect(mostByArea).toBeGreaterThanOrEqual(optimum);
      expect(mostByArea).toBeLessThanOrEqual(area);
      if (claim === "proven") expect(most).toBe(optimum);
    },
  );

  // Those where two blocks reach the best guillotine layout; in the others they fall short, and say so.
  test("two blocks reach the best guillotine layout in eleven of seventeen", () => {
    const reached = PALLETS.filter(({ sides, guillotine }) => pallet(sides, true).most === guillotine);
    expect(reached.map(({ sides }) => sides.join(" "))).toEqual([
      "49 28 8 3",
      "67 37 11 3",
      "32 22 5 4",
      "14 10 3 2",
      "16 14 4 3",
      "30 22 7 4",
      "9 9 5 2",
      "11 11 4 3",
      "20 15 6 4",
      "11 9 4 2",
      "17 10 4 3",
    ]);
  });
});

/**
 * Panel guides of board houses (common practice): total = board × count + gap × (count − 1) + 2 × border in each
 * direction. A routed border is the rail and the gap towards it. Inches are 25.4 mm exactly.
 */
interface Guide {
  name: string;
  panel: [string, string];
  board: [string, string];
  gap: string;
  rail: string;
  /** Columns and rows with the panel on its long side: as drawn, and turned, which the guides call upright. */
  drawn: [number, number];
  turned: [number, number];
  /** Of the turned grid, in micrometres. */
  outer: { width: number; height: number };
}

const GUIDES: Guide[] = [
  {
    name: "30 × 20 scored, 250 × 350, border 5",
    panel: ["250", "350"],
    board: ["30", "20"],
    gap: "0",
    rail: "5",
    drawn: [11, 12],
    turned: [17, 8],
    outer: { width: 350_000, height: 250_000 },
  },
  {
    name: "33 × 21.5 routed with 2, 250 × 350, border 7",
    panel: ["250", "350"],
    board: ["33", "21.5"],
    gap: "2",
    rail: "5",
    drawn: [9, 10],
    turned: [14, 6],
    outer: { width: 341_000, height: 222_000 },
  },
  {
    name: "2 × 3 in routed with 0.1, 16 × 22 in usable",
    panel: ["406.4", "558.8"],
    board: ["50.8", "76.2"],
    gap: "2.54",
    rail: "0",
    drawn: [10, 5],
    turned: [7, 7],
    outer: { width: 548_640, height: 370_840 },
  },
  {
    name: "4 × 3 in routed with 0.1, 16 × 22 in usable",
    panel: ["406.4", "558.8"],
    board: ["101.6", "76.2"],
    gap: "2.54",
    rail: "0",
    drawn: [5, 5],
    turned: [7, 3],
    outer: { width: 548_640, height: 309_880 },
  },
];

describe("boards per panel, board houses' panel guides (common practice, recomputed)", () => {
  test.each(GUIDES)("$name", ({ panel, board, gap, rail, drawn, turned, outer }) => {
    const terms: PanelTerms = {
      largest: { width: panel[0], height: panel[1] },
      least: null,
      separation: gap === "0" ? "v-score" : "routed",
      gap,
      rails: { sides: rail === "0" ? "none" : "all", width: rail },
    };
    const result = fitPanels({ shape: "rectangle", width: board[0], height: board[1] }, terms);
    if (!result.ok) throw new Error(result.problems[0]?.code);
    const grids = gridsIn(roomIn(result.measures), result.measures);
    const largest = [false, true].map((way) => grids.find(({ first }) => first.turned === way));
    expect(largest.map((grid) => [grid?.first.columns, grid?.first.rows])).toEqual([drawn, turned]);
    expect(result.most).toBeGreaterThanOrEqual(Math.max(...largest.map((grid) => grid?.count ?? 0)));
    const upright = largest[1];
    expect(upright && layOutPanel(upright, result.measures).outer).toEqual(outer);
  });
});
