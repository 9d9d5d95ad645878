import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fitPanels } from "#src/costing/panels/fit-panels.ts";
import { panelSentence } from "#src/costing/panels/panel-problem-words.ts";
import type { PanelBoard, PanelTerms } from "#src/costing/panels/panel-terms.ts";
import { panelsNeeded } from "#src/costing/panels/panels-needed.ts";
import { usefulPanels } from "#src/costing/panels/useful-panels.ts";
import { BOARD, bare, board, fitted, ROUTED, SCORED } from "./panel-cases.ts";
import { plainGrid, plainTwoBlocks } from "./plain-panels.ts";

const side = (least: number, most: number) => fc.integer({ min: least, max: most });
/** Panels and boards in whole millimetres, small enough to try every cut. */
const small = fc.record({ width: side(5, 60), height: side(5, 60), w: side(2, 20), h: side(2, 20) });

function mostOf(of: PanelBoard, terms: PanelTerms): number {
  const result = fitPanels(of, terms);
  return result.ok ? result.most : 0;
}

describe("boards of 58 × 42 mm on panels of at most 250 × 200 mm, worked by hand", () => {
  // Rails and gaps leave 250 × 186. As drawn ⌊252 ÷ 60⌋ × ⌊188 ÷ 44⌋ = 4 × 4 = 16; turned ⌊252 ÷ 44⌋ × ⌊188 ÷ 60⌋ =
  // 5 × 3 = 15. Two columns of four as drawn take 118 and a gap; the other 130 hold three turned columns of three:
  // 3 × 42 + 2 × 2 = 130. 8 + 9 = 17. By area ⌊252 × 188 ÷ (60 × 44)⌋ = 17 (17.9), so no layout holds more.
  it("hold 17 when routed, in two blocks, which is proven by area", () => {
    const { arrangements, ...rest } = fitted(BOARD, ROUTED);
    expect(rest).toMatchObject({ most: 17, mostByArea: 17, claim: "proven" });
    expect(arrangements.at(-1)).toEqual({
      first: { columns: 2, rows: 4, turned: false },
      second: { columns: 3, rows: 3, turned: true },
      lies: "beside",
      count: 17,
      width: 250_000,
      height: 178_000,
    });
    expect(arrangements.find(({ count }) => count === 16)).toMatchObject({
      first: { columns: 4, rows: 4, turned: false },
      second: null,
      width: 238_000,
      height: 174_000,
    });
  });

  // Scored, 250 × 190 are left: 4 × 4 (232 × 168) as drawn, 5 × 3 turned.
  it("hold 16 when scored, which is proven", () => {
    expect(fitted(BOARD, SCORED)).toMatchObject({ most: 16, claim: "proven" });
  });

  // Rails of 10 mm leave, along the long sides, 250 × 180: 4 × 4; along the short ones 230 × 200 and on all sides
  // 230 × 180: 3 × 4 as drawn, 5 × 3 turned (210 × 174).
  it("lose what rails take from the sides they are on", () => {
    const railed = (sides: "long" | "short" | "all") =>
      fitted(BOARD, { ...SCORED, rails: { sides, width: "10" } }).arrangements.at(-1);
    expect(railed("long")).toMatchObject({ count: 16, first: { columns: 4, rows: 4, turned: false } });
    expect(railed("short")).toMatchObject({ count: 15, first: { columns: 5, rows: 3, turned: true } });
    expect(railed("all")).toMatchObject({ count: 15, width: 210_000, height: 174_000 });
  });
});

describe("two blocks", () => {
  // 100 × 50, boards of 30 × 20, gap 1. As drawn 3 × 2 = 6, turned 4 × 1 = 4. One turned row (30 high) and, a gap
  // below it, 19 are left: none. Two columns as drawn take 61 and a gap, 38 are left: one turned column of one: 5.
  it("hold no more than the grid here", () => {
    const terms = bare(100, 50, { separation: "routed", gap: "1" });
    expect(fitted(board(30, 20), terms).arrangements.at(-1)).toMatchObject({ count: 6, second: null });
  });

  // 100 × 62, boards of 40 × 20, gap 1. As drawn 2 × 2 = 4 (61 would take 3 × 20 + 2 = 62: three rows) → 2 × 3 = 6;
  // turned 4 × 1 = 4. Two columns as drawn take 81 and a gap: 18 left. One column takes 40 and a gap: 59 left hold
  // two turned columns of one (41 wide): 3 + 2 = 5. So 6. With 103 wide, two columns and 21 left: one turned: 6 + 1.
  it("hold one more where a turned column fills the end", () => {
    const terms = bare(103, 62, { separation: "routed", gap: "1" });
    expect(fitted(board(40, 20), terms).arrangements.at(-1)).toMatchObject({
      count: 7,
      first: { columns: 2, rows: 3, turned: false },
      second: { columns: 1, rows: 1, turned: true },
      lies: "beside",
      width: 102_000,
      height: 62_000,
    });
    expect(mostOf(board(40, 20), bare(103, 62))).toBe(6);
  });

  it("are the most that any straight cut gives, tried at every millimetre", () => {
    fc.assert(
      fc.property(small, side(1, 4), ({ width, height, w, h }, gap) => {
        const terms = bare(width, height, { separation: "routed", gap: String(gap) });
        expect(mostOf(board(w, h), terms)).toBe(plainTwoBlocks(width, height, w, h, gap));
      }),
      { numRuns: 1000 },
    );
  });
});

describe("grids", () => {
  it("are the most of one orientation, counted board by board", () => {
    fc.assert(
      fc.property(small, ({ width, height, w, h }) => {
        expect(mostOf(board(w, h), bare(width, height))).toBe(plainGrid(width, height, w, h, 0));
      }),
      { numRuns: 1000 },
    );
  });

  it("are exact where binary fractions are not: ten boards of 0.1 mm more", () => {
    // 3 × 33.1 + 2 × 0.1 = 99.5; in binary floating point 33.1 × 3 is 99.30000000000001.
    const terms = bare("99.5", "33.1", { separation: "routed", gap: "0.1" });
    expect(mostOf(board("33.1", "33.1"), terms)).toBe(3);
    expect(mostOf(board("33.1", "33.1"), { ...terms, largest: { width: "99.499", height: "33.1" } })).toBe(2);
    // 7 × 1.1 = 7.7 exactly; 7.7 ÷ 1.1 is 6.999… in binary.
    expect(mostOf(board("1.1", "1.1"), bare("7.7", "1.1"))).toBe(7);
  });
});

/** Boards, panels, rails and gaps of a few whole millimetres. */
const anyTerms = fc
  .record({
    width: side(20, 120),
    height: side(20, 120),
    routed: fc.boolean(),
    gap: side(1, 4),
    sides: fc.constantFrom("none" as const, "long" as const, "short" as const, "all" as const),
    rail: side(1, 8),
  })
  .map(({ width, height, routed, gap, sides, rail }) =>
    bare(width, height, {
      separation: routed ? "routed" : "v-score",
      gap: routed ? String(gap) : "0",
      rails: { sides, width: String(rail) },
    }),
  );
const anyBoard = fc.tuple(side(4, 50), side(4, 50));

describe("whatever the sizes", () => {
  it("turning the panel or the board changes no count", () => {
    fc.assert(
      fc.property(anyTerms, anyBoard, (terms, [w, h]) => {
        const { width, height } = terms.largest;
        const turned = { ...terms, largest: { width: height, height: width } };
        expect(fitPanels(board(w, h), turned)).toEqual(fitPanels(board(w, h), terms));
        expect(mostOf(board(h, w), terms)).toBe(mostOf(board(w, h), terms));
      }),
    );
  });

  it("a larger panel never holds fewer, nor one with narrower rails or gaps", () => {
    fc.assert(
      fc.property(anyTerms, anyBoard, side(0, 30), side(0, 30), (terms, [w, h], wider, taller) => {
        const { width, height } = terms.largest;
        // The frame keeps its long side, since rails belong to it.
        const [long, short] = [Number(width), Number(height)].sort((a, b) => b - a) as [number, number];
        const larger = {
          ...terms,
          largest: { width: String(long + Math.max(wider, taller)), height: String(short + taller) },
        };
        const most = mostOf(board(w, h), terms);
        expect(mostOf(board(w, h), larger)).toBeGreaterThanOrEqual(most);
        expect(
          mostOf(board(w, h), { ...terms, rails: { sides: "none", width: "0" } }),
        ).toBeGreaterThanOrEqual(most);
      }),
    );
  });

  it("routing a two-block layout never holds fewer than grids with the same gap, nor more than the bound", () => {
    fc.assert(
      fc.property(small, side(1, 3), ({ width, height, w, h }, gap) => {
        const result = fitPanels(
          board(w, h),
          bare(width, height, { separation: "routed", gap: String(gap) }),
        );
        if (!result.ok) return;
        expect(result.most).toBeGreaterThanOrEqual(plainGrid(width, height, w, h, gap));
        expect(result.most).toBeLessThanOrEqual(result.mostByArea);
        expect(result.mostByArea).toBeLessThanOrEqual(
          ((width + gap) * (height + gap)) / ((w + gap) * (h + gap)),
        );
        expect(result.claim === "proven").toBe(result.most === result.mostByArea);
      }),
      { numRuns: 500 },
    );
  });

  it("each count has the smallest panel of all that hold it, and the counts rise", () => {
    fc.assert(
      fc.property(anyTerms, anyBoard, (terms, [w, h]) => {
        const result = fitPanels(board(w, h), terms);
        if (!result.ok) return;
        const counts = result.arrangements.map(({ count }) => count);
        expect(counts).toEqual([...new Set(counts)].sort((a, b) => a - b));
        expect(counts[0]).toBe(1);
      }),
    );
  });
});

describe("what does not go", () => {
  const said = (of: PanelBoard, terms: PanelTerms) => {
    const result = fitPanels(of, terms);
    return result.ok
      ? null
      : result.problems.map((problem) => [problem.code, problem.field, panelSentence(problem)]);
  };

  it("a round board cannot be scored, and can be routed", () => {
    const round: PanelBoard = { shape: "round", width: "50", height: "50" };
    expect(said(round, SCORED)).toEqual([
      [
        "round-v-score",
        "separation",
        "A round board cannot be V-scored, because a score runs straight from edge to edge. Choose routing.",
      ],
    ]);
    // 250 × 186 left: ⌊252 ÷ 52⌋ × ⌊188 ÷ 52⌋ = 4 × 3; a honeycomb might hold more, so nothing is proven.
    expect(fitted(round, ROUTED)).toMatchObject({ most: 12, claim: "best-tried" });
  });

  it("a board larger than what rails leave is named with both sizes", () => {
    expect(said(board(240, 190), ROUTED)).toEqual([
      [
        "board-larger-than-panel",
        "board",
        "A board of 240 × 190 mm does not fit into the 250 × 186 mm that rails and gaps leave. Narrow the rails, or ask for a larger panel.",
      ],
    ]);
    expect(said(BOARD, { ...ROUTED, rails: { sides: "all", width: "120" } })?.[0]?.[2]).toContain(
      "the 6 × 0 mm",
    );
  });

  it("a panel below the least size is not offered", () => {
    const terms = bare(60, 50, { least: { width: "50", height: "55" } });
    // One board of 40 × 45 fits, or 45 × 40; neither reaches 50 × 55.
    expect(said(board(40, 45), terms)).toEqual([
      [
        "below-least",
        "least",
        "The largest panel of this board would be 40 × 45 mm, which is below the least size. Widen the rails, or order single boards.",
      ],
    ]);
    const least = { width: "100", height: "100" };
    expect(fitted(BOARD, { ...ROUTED, least }).arrangements.map(({ count }) => count)).not.toContain(2);
  });

  it("contradictions and slips of the pen are told by field", () => {
    expect(said(BOARD, { ...SCORED, gap: "2" })?.[0]?.slice(0, 2)).toEqual(["gap-with-v-score", "gap"]);
    expect(said(BOARD, { ...ROUTED, gap: "0" })?.[0]?.slice(0, 2)).toEqual(["routed-without-gap", "gap"]);
    expect(said(BOARD, { ...ROUTED, rails: { sides: "all", width: "0" } })?.[0]?.slice(0, 2)).toEqual([
      "rail-without-width",
      "rails.width",
    ]);
    expect(said(BOARD, { ...ROUTED, least: { width: "300", height: "10" } })?.[0]?.[0]).toBe(
      "least-above-largest",
    );
    expect(said(board("0.5", "58.00001"), ROUTED)).toEqual([
      ["too-small", "board.width", "Check the board's width: it is less than 1 mm."],
      [
        "too-fine",
        "board.height",
        "Write the board's height in whole micrometres: at most 3 decimals of a millimetre.",
      ],
    ]);
    expect(said(BOARD, bare(2001, 10))?.[0]?.slice(0, 2)).toEqual(["too-large", "largest.width"]);
    expect(said(board(1, 1), bare(100, 100))).toEqual([
      [
        "too-many-boards",
        "board",
        "10000 boards would fit, and more than 2000 to a panel are not laid out. Check the board's size.",
      ],
    ]);
  });
});

describe("panels for a number of boards", () => {
  it("hold them, with what is over", () => {
    expect(panelsNeeded(113, 12)).toEqual({ panels: 10, boards: 120, over: 7 });
    expect(panelsNeeded(120, 12)).toEqual({ panels: 10, boards: 120, over: 0 });
    expect(panelsNeeded(0, 12)).toEqual({ panels: 0, boards: 0, over: 0 });
  });

  // Panels for 120 boards, and their outer mm² in all: 17 (250 × 192) × 8 = 384 000, 16 (238 × 188) × 8 = 357 952,
  // 15 (218 × 192) × 8 = 334 848; 12 (174 × 192) × 10 = 334 080; 8 (118 × 188) × 15 = 332 760; 6 (86 × 192) × 20 = 330 240.
  it("are offered in a few sizes: the largest, and those unbeaten in panels and laminate", () => {
    const counts = (toOrder: number, choices: number) =>
      usefulPanels(fitted(BOARD, ROUTED), toOrder, choices).map(({ count }) => count);
    expect(counts(120, 4)).toEqual([8, 12, 15, 17]);
    expect(counts(120, 9)).toEqual([6, 8, 12, 15, 17]);
    expect(counts(120, 1)).toEqual([17]);
    expect(usefulPanels(fitted(board(240, 180), ROUTED), 5, 4).map(({ count }) => count)).toEqual([1]);
  });
});
