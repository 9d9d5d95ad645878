import fc from "fast-check";
import { expect, it } from "vitest";
import { fitPanels } from "#src/costing/panels/fit-panels.ts";
import { millimetres } from "#src/costing/panels/micrometres.ts";
import { outerOf } from "#src/costing/panels/panel-frame.ts";
import { panelSentence } from "#src/costing/panels/panel-problem-words.ts";
import { quotedPanelProblem } from "#src/costing/panels/quoted-panel.ts";
import { BOARD, bare, board } from "./panel-cases.ts";

const on = (width: string, height: string, count: number) => {
  const problem = quotedPanelProblem(BOARD, { width, height }, count);
  return problem && panelSentence(problem);
};

it("boards that cannot lie on the quoted panel are told with all three", () => {
  expect(on("238", "144", 12)).toBeNull();
  // 12 × 24.36 = 292.32 cm² on 280.
  expect(on("200", "140", 12)).toBe(
    "12 boards of 58 × 42 mm do not fit on a panel of 200 × 140 mm, however they lie. Check its size and the boards on it.",
  );
  expect(on("300", "41", 2)).not.toBeNull();
  // Turned it lies in: 42 across, 58 down.
  expect(on("84", "58", 2)).toBeNull();
  expect(on("0.0001", "58", 2)).toBeNull();
});

it("round boards are measured by their own area", () => {
  // Two circles of 50 mm have 39.27 cm²; 50 × 78 mm has 39.0, 50 × 79 mm 39.5.
  const round = { shape: "round", width: "50", height: "50" } as const;
  expect(quotedPanelProblem(round, { width: "78", height: "50" }, 2)).not.toBeNull();
  expect(quotedPanelProblem(round, { width: "79", height: "50" }, 2)).toBeNull();
});

it("no panel that can be laid out is ever refused", () => {
  const side = (least: number, most: number) => fc.integer({ min: least, max: most });
  fc.assert(
    fc.property(side(40, 200), side(40, 200), side(5, 60), side(5, 60), (width, height, w, h) => {
      const result = fitPanels(board(w, h), bare(width, height, { separation: "routed", gap: "1" }));
      if (!result.ok) return;
      for (const arrangement of result.arrangements) {
        const outer = outerOf(arrangement, result.measures);
        const size = { width: millimetres(outer.width), height: millimetres(outer.height) };
        expect(quotedPanelProblem(board(w, h), size, arrangement.count)).toBeNull();
      }
    }),
  );
});
