import { type FittedPanels, fitPanels } from "#src/costing/panels/fit-panels.ts";
import { layOutPanel, type Panel } from "#src/costing/panels/lay-out-panel.ts";
import type { PanelBoard, PanelTerms } from "#src/costing/panels/panel-terms.ts";

/** The demonstration's board, invented. */
export const BOARD: PanelBoard = { shape: "rectangle", width: "58", height: "42" };

/** A house's terms as in the picture of the Boards page: routed with 2 mm, rails of 5 mm along the long sides. */
export const ROUTED: PanelTerms = {
  largest: { width: "250", height: "200" },
  least: null,
  separation: "routed",
  gap: "2",
  rails: { sides: "long", width: "5" },
};

export const SCORED: PanelTerms = { ...ROUTED, separation: "v-score", gap: "0" };

/** Without rails, so that a panel is its room. Measures in mm. */
export function bare(
  width: number | string,
  height: number | string,
  over: Partial<PanelTerms> = {},
): PanelTerms {
  return {
    ...SCORED,
    largest: { width: String(width), height: String(height) },
    rails: { sides: "none", width: "0" },
    ...over,
  };
}

export function board(width: number | string, height: number | string): PanelBoard {
  return { shape: "rectangle", width: String(width), height: String(height) };
}

/** What fits, where something must. */
export function fitted(of: PanelBoard, terms: PanelTerms): FittedPanels {
  const result = fitPanels(of, terms);
  if (!result.ok) throw new Error(JSON.stringify(result.problems));
  return result;
}

/** The panel of one count, or of the most. */
export function panelOf(of: PanelBoard, terms: PanelTerms, count?: number): Panel {
  const { arrangements, measures, most } = fitted(of, terms);
  const arrangement = arrangements.find((one) => one.count === (count ?? most));
  if (!arrangement) throw new Error(`No layout of ${count}.`);
  return layOutPanel(arrangement, measures);
}
