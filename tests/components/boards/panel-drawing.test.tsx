// @vitest-environment happy-dom
import { cleanup, render, screen } from "@testing-library/react";
import fc from "fast-check";
import { afterEach, describe, expect, it } from "vitest";
import type { BoardPicture } from "#src/components/board-picture.ts";
import { PanelDrawing } from "#src/components/islands/boards/PanelDrawing.tsx";
import { PanelMeasures } from "#src/components/islands/boards/PanelMeasures.tsx";
import { PanelUse } from "#src/components/islands/boards/PanelUse.tsx";
import { framePanel, LEADER_FOOT, leadersOf } from "#src/components/islands/boards/panel-places.ts";
import { areaText } from "#src/components/islands/boards/panel-words.ts";
import { fitPanels } from "#src/costing/panels/fit-panels.ts";
import { layOutPanel, type Panel } from "#src/costing/panels/lay-out-panel.ts";
import { DEW_LANTERN } from "#src/drawings/dew-lantern.ts";
import { BOARD, bare, board, panelOf, ROUTED, SCORED } from "#tests/costing/panels/panel-cases.ts";

afterEach(cleanup);

const LANTERN: BoardPicture = { shape: "rectangle", widthMm: 58, heightMm: 42, marks: DEW_LANTERN };
const NO_BREAK = /\u00a0/g;
const plain = (text: string | null | undefined) => (text ?? "").replace(NO_BREAK, " ");

function drawn(panel: Panel) {
  render(<PanelDrawing panel={panel} picture={LANTERN} />);
  const picture = screen.getByRole("img");
  const words = [...picture.querySelectorAll("text")].map(({ textContent }) => plain(textContent));
  return { picture, words };
}

describe("the drawing of a panel", () => {
  it("routed in two blocks: one sentence, every board, measures and names, worked by hand", () => {
    const { picture, words } = drawn(panelOf(BOARD, ROUTED));
    expect(plain(picture.getAttribute("aria-label"))).toBe(
      "A panel of 17 boards, 2 × 4 and 3 × 3 turned, 250 × 192 mm, routed with gaps of 2 mm and breaking tabs, with two rails of 5 mm.",
    );
    const boards = [...picture.querySelectorAll("use")].map((one) => one.getAttribute("transform") ?? "");
    expect(boards).toHaveLength(17);
    // Two columns of 58 and their gaps end at 120; a turned board of 42 there hangs from its right edge, 162.
    expect(boards.filter((place) => place.includes("rotate(90)"))).toHaveLength(9);
    expect(boards).toContain("translate(162 7) rotate(90)");
    expect(words).toEqual([
      "250 mm",
      "192 mm",
      "58",
      "42",
      "breaking tab, 5 mm",
      "routed gap, 2 mm",
      "rail, 5 mm",
      "50 mm",
    ]);
  });

  it("scored: scores instead of tabs and gaps", () => {
    const { picture, words } = drawn(panelOf(BOARD, SCORED));
    expect(plain(picture.getAttribute("aria-label"))).toContain(
      "232 × 178 mm, V-scored, with two rails of 5 mm.",
    );
    expect(words).toContain("V-score, edge to edge");
    expect(words.join()).not.toContain("tab");
  });

  it("without rails says so", () => {
    const { words, picture } = drawn(panelOf(board(30, 20), bare(60, 40)));
    expect(plain(picture.getAttribute("aria-label"))).toContain("V-scored, without rails.");
    expect(words.join()).not.toContain("rail");
  });

  // Tabs: block one 4 to the rail, 12 between rows, 8 between columns; where the blocks meet 42, 14, 26, 30, 10 and
  // 42 mm face each other: 2 + 1 + 2 + 2 + 1 + 2; block two 6 and 6 to the rails, 12 and 12. 24 + 10 + 36 = 70.
  it("gives the same measures as text", () => {
    render(<PanelMeasures panel={panelOf(BOARD, ROUTED)} />);
    const rows = screen
      .getAllByRole("row")
      .map((row) => [...row.children].map(({ textContent }) => plain(textContent)));
    expect(rows.slice(1)).toEqual([
      ["Panel", "250 × 192 mm"],
      ["Largest panel", "250 × 200 mm"],
      ["Board", "58 × 42 mm"],
      ["Boards to a panel", "17 boards, 2 × 4 and 3 × 3 turned"],
      ["Rails", "two rails, 5 mm"],
      ["Routed gap", "2 mm"],
      ["Breaking tabs", "70 of 5 mm"],
      ["Board area", "414 cm², 86 %"],
      ["Panel area", "480 cm²"],
    ]);
  });

  it("says how much of it is board, and leaves out what there is none of", () => {
    render(<PanelUse panel={panelOf(board(30, 20), bare(60, 40))} />);
    expect(screen.getByText(/100/).textContent).toBe("100%");
    expect(screen.getAllByRole("listitem").map(({ textContent }) => plain(textContent))).toEqual([
      "4 boards24 cm²",
    ]);
  });

  it("writes small areas with a decimal", () => {
    expect(["9.96", "9.94", "0.25", "1234.5"].map((area) => plain(areaText(area)))).toEqual([
      "10.0 cm²",
      "9.9 cm²",
      "0.3 cm²",
      "1 235 cm²",
    ]);
  });
});

const side = (least: number, most: number) => fc.integer({ min: least, max: most });
const anyPanel = fc
  .tuple(side(40, 300), side(40, 300), side(8, 120), side(8, 120), fc.boolean(), side(0, 3))
  .map(([width, height, w, h, routed, rails]) => {
    const terms = bare(width, height, {
      separation: routed ? "routed" : "v-score",
      gap: routed ? "2" : "0",
      rails: { sides: (["none", "long", "short", "all"] as const)[rails] ?? "none", width: "5" },
    });
    const result = fitPanels(board(w, h), terms);
    const last = result.ok ? result.arrangements.at(-1) : undefined;
    return result.ok && last ? layOutPanel(last, result.measures) : null;
  })
  .filter((panel): panel is Panel => panel !== null);

describe("room in the picture", () => {
  it("is kept by any panel at any width", () => {
    fc.assert(
      fc.property(anyPanel, side(300, 1200), (panel, width) => {
        const frame = framePanel(panel, width);
        expect(frame.left + frame.panelWidth).toBeLessThanOrEqual(width);
        expect(frame.panelHeight).toBeLessThanOrEqual(720.001);
        // Both sides at one scale.
        expect(frame.panelWidth / panel.outer.width).toBeCloseTo(frame.panelHeight / panel.outer.height, 9);
      }),
    );
  });

  it("no leader crosses another's name, and every dot lies on the panel", () => {
    fc.assert(
      fc.property(anyPanel, side(560, 1200), (panel, width) => {
        const frame = framePanel(panel, width);
        const leaders = leadersOf(panel, frame);
        for (const one of leaders) {
          expect(one.x >= frame.left && one.x <= frame.left + frame.panelWidth).toBe(true);
          expect(one.y >= frame.top && one.y <= frame.top + frame.panelHeight).toBe(true);
          const end = one.x + LEADER_FOOT + one.words.length * 7.4;
          expect(end).toBeLessThanOrEqual(width + 0.001);
          for (const other of leaders) {
            if (other === one || other.x < one.x || other.x > end) continue;
            expect(other.level, `${other.words} stands in ${one.words}`).toBeLessThan(one.level);
          }
        }
      }),
    );
  });
});
