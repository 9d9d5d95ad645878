import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fitPanels } from "#src/costing/panels/fit-panels.ts";
import { layOutPanel, type Panel } from "#src/costing/panels/lay-out-panel.ts";
import type { Rect } from "#src/costing/panels/micrometres.ts";
import type { PanelBoard, PanelTerms } from "#src/costing/panels/panel-terms.ts";
import { BOARD, bare, board, panelOf, ROUTED, SCORED } from "./panel-cases.ts";

describe("twelve boards of 58 × 42 mm, four across, as the Boards page draws them", () => {
  // 4 × 58 + 3 × 2 = 238; 3 × 42 + 2 × 2 = 130, two gaps and two rails of 5 make 144.
  const measures = panelOf(BOARD, ROUTED).measures;
  const twelve = layOutPanel(
    {
      first: { columns: 4, rows: 3, turned: false },
      second: null,
      lies: "beside",
      count: 12,
      width: 238_000,
      height: 130_000,
    },
    measures,
  );

  it("need 238 × 144 mm, worked by hand", () => {
    expect(twelve.outer).toEqual({ width: 238_000, height: 144_000 });
    expect(twelve.boards[0]).toEqual({ x: 0, y: 7_000, width: 58_000, height: 42_000, turned: false });
    expect(twelve.boards.at(-1)).toMatchObject({ x: 180_000, y: 95_000 });
    expect(twelve.rails.map(({ x, y, width, height }) => [x, y, width, height])).toEqual([
      [0, 0, 238_000, 5_000],
      [0, 139_000, 238_000, 5_000],
    ]);
  });

  it("fill 292.32 of 342.72 cm², rails 23.8, gaps 26.6: 85.29 %", () => {
    expect(twelve.areas).toEqual({
      boards: "292.32",
      rails: "23.8",
      gaps: "26.6",
      panel: "342.72",
      used: "0.8529",
    });
  });

  // Each of 4 columns: 4 gaps of 2 tabs; each of 3 rows: 3 gaps of 2 tabs. 32 + 18.
  it("hang on fifty breaking tabs, a quarter of a side from its ends", () => {
    expect(twelve.tabs).toHaveLength(50);
    expect(twelve.tabs).toContainEqual({ x: 12_000, y: 5_000, width: 5_000, height: 2_000 });
    expect(twelve.tabs).toContainEqual({ x: 58_000, y: 15_000, width: 2_000, height: 5_000 });
    expect(twelve.scores).toEqual({ x: [], y: [] });
  });

  it("have tooling holes 8 mm from the ends of the rails", () => {
    expect(twelve.rails[1]?.holes).toEqual([
      { x: 8_000, y: 141_500, across: 3_000 },
      { x: 230_000, y: 141_500, across: 3_000 },
    ]);
  });
});

describe("scored panels", () => {
  it("are scored along every board's edge and nowhere else", () => {
    const panel = panelOf(board(30, 20), { ...SCORED, largest: { width: "70", height: "52" } });
    // Two columns, two rows of 20 between rails of 5.
    expect(panel.outer).toEqual({ width: 60_000, height: 50_000 });
    expect(panel.scores).toEqual({ x: [30_000], y: [5_000, 25_000, 45_000] });
    expect(panel.tabs).toEqual([]);
  });

  it("with rails on all sides have a closed frame, counted once at its corners", () => {
    const panel = panelOf(board(30, 20), bare(40, 30, { rails: { sides: "all", width: "5" } }));
    // 40 × 30 less 30 × 20: 12 − 6 = 6 cm².
    expect(panel.areas).toMatchObject({ boards: "6", rails: "6", gaps: "0", panel: "12", used: "0.5" });
    // Holes of 3 mm in the corners' middles: 1 mm clear of the scores at 5 and 35 mm.
    expect(panel.rails.map(({ holes }) => holes.map(({ x, y }) => [x, y]))).toEqual([
      [
        [2_500, 2_500],
        [37_500, 2_500],
      ],
      [
        [2_500, 27_500],
        [37_500, 27_500],
      ],
      [],
      [],
    ]);
  });
});

describe("round boards", () => {
  it("count as circles, and hang on one tab where they come nearest", () => {
    const round: PanelBoard = { shape: "round", width: "50", height: "50" };
    const panel = panelOf(round, bare(102, 50, { separation: "routed", gap: "2" }));
    // Two circles: 2 × 25² × π = 3926.990817 mm² of 102 × 50.
    expect(panel.areas).toMatchObject({
      boards: "39.26990817",
      gaps: "11.73009183",
      panel: "51",
      used: "0.77",
    });
    expect(panel.tabs).toEqual([{ x: 50_000, y: 22_500, width: 2_000, height: 5_000 }]);
  });
});

const side = (least: number, most: number) => fc.integer({ min: least, max: most });
const cases = fc
  .record({
    width: side(40, 200),
    height: side(40, 200),
    w: side(5, 60),
    h: side(5, 60),
    routed: fc.boolean(),
    gap: side(1, 4),
    sides: fc.constantFrom("none" as const, "long" as const, "short" as const, "all" as const),
    rail: side(1, 12),
    which: fc.nat(),
  })
  .map(({ width, height, w, h, routed, gap, sides, rail, which }) => {
    const terms: PanelTerms = bare(width, height, {
      separation: routed ? "routed" : "v-score",
      gap: routed ? String(gap) : "0",
      rails: { sides, width: String(rail) },
    });
    const result = fitPanels(board(w, h), terms);
    if (!result.ok) return null;
    const arrangement = result.arrangements[which % result.arrangements.length];
    return arrangement ? layOutPanel(arrangement, result.measures) : null;
  })
  .filter((panel): panel is Panel => panel !== null);

/** Whether two rectangles are at least so far apart, across or down. */
function apart(a: Rect, b: Rect, gap: number): boolean {
  return (
    a.x + a.width + gap <= b.x ||
    b.x + b.width + gap <= a.x ||
    a.y + a.height + gap <= b.y ||
    b.y + b.height + gap <= a.y
  );
}

function touches(a: Rect, b: Rect): boolean {
  return !apart(a, b, 1);
}

describe("any panel that is laid out", () => {
  it("has its boards inside, apart by the gap from each other and from the rails", () => {
    fc.assert(
      fc.property(cases, ({ boards, rails, outer, arrangement, measures: { gap, board: one, largest } }) => {
        expect(boards).toHaveLength(arrangement.count);
        expect(outer.width <= largest.width && outer.height <= largest.height).toBe(true);
        boards.forEach((placed, index) => {
          const { x, y, width, height, turned } = placed;
          expect([width, height]).toEqual(turned ? [one.height, one.width] : [one.width, one.height]);
          expect(x >= 0 && y >= 0 && x + width <= outer.width && y + height <= outer.height).toBe(true);
          for (const other of [...boards.slice(index + 1), ...rails])
            expect(apart(placed, other, gap)).toBe(true);
        });
        rails.forEach((rail, index) => {
          for (const other of rails.slice(index + 1)) expect(apart(rail, other, 0)).toBe(true);
        });
      }),
    );
  });

  it("is cut to its boards: without rails some board touches every edge", () => {
    fc.assert(
      fc.property(cases, ({ boards, rails, outer }) => {
        const pieces: Rect[] = [...boards, ...rails];
        expect(Math.min(...pieces.map(({ x }) => x))).toBe(0);
        expect(Math.min(...pieces.map(({ y }) => y))).toBe(0);
        expect(Math.max(...pieces.map(({ x, width }) => x + width))).toBe(outer.width);
        expect(Math.max(...pieces.map(({ y, height }) => y + height))).toBe(outer.height);
      }),
    );
  });

  it("hangs together when routed, its tabs in the gaps and on no board", () => {
    fc.assert(
      fc.property(cases, ({ boards, rails, tabs, outer, measures: { routed } }) => {
        if (!routed) return;
        const pieces: Rect[] = [...boards, ...rails, ...tabs];
        for (const tab of tabs) {
          expect([...boards, ...rails].every((piece) => apart(tab, piece, 0))).toBe(true);
          expect([...boards, ...rails].filter((piece) => touches(tab, piece)).length).toBeGreaterThanOrEqual(
            2,
          );
          expect(tab.x >= 0 && tab.y >= 0).toBe(true);
          expect(tab.x + tab.width <= outer.width && tab.y + tab.height <= outer.height).toBe(true);
        }
        const reached = new Set([0]);
        for (const at of reached)
          pieces.forEach((piece, index) => {
            if (touches(pieces[at] as Rect, piece)) reached.add(index);
          });
        expect(reached.size).toBe(pieces.length);
      }),
    );
  });

  it("has areas that add up to the panel's", () => {
    fc.assert(
      fc.property(cases, ({ areas, boards, outer }) => {
        const sum = new Decimal(areas.boards).plus(areas.rails).plus(areas.gaps);
        expect(sum.toFixed()).toBe(areas.panel);
        expect(Number(areas.panel)).toBeCloseTo((outer.width * outer.height) / 1e8, 8);
        expect(Number(areas.gaps)).toBeGreaterThanOrEqual(0);
        const boardArea = boards.reduce((all, { width, height }) => all + width * height, 0) / 1e8;
        expect(Number(areas.used)).toBeCloseTo(boardArea / Number(areas.panel), 4);
      }),
    );
  });

  it("is the same for the same input, and touches nothing of it", () => {
    const frozen = Object.freeze({ ...BOARD });
    expect(panelOf(frozen, ROUTED)).toEqual(panelOf(frozen, ROUTED));
    expect(JSON.parse(JSON.stringify(panelOf(BOARD, ROUTED)))).toEqual(panelOf(BOARD, ROUTED));
  });
});
