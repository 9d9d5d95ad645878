import type { Plan } from "#src/shapes/plan.ts";
import { type FittedPanels, fitPanels, type PanelsFitted } from "./fit-panels.ts";
import { layOutPanel, type Panel } from "./lay-out-panel.ts";
import { quotedLayout } from "./quoted-layout.ts";

/**
 * What fits on a board house's panels for the plan's board. `null`: the board's size or the house's terms are not
 * known.
 *
 * @example a board of 58 × 42 mm and terms of Kilnside → every count that fits
 */
export function panelsAt({ boards }: Plan, boardHouse: string): PanelsFitted | null {
  const terms = boards.panelTerms.find((one) => one.boardHouse === boardHouse);
  return boards.size === null || terms === undefined ? null : fitPanels(boards.size, terms);
}

/** A quote's panel, and what else would fit. */
export interface QuotedPanel {
  panel: Panel;
  fitted: FittedPanels;
}

/**
 * The panel a quote of the plan is for. `null`: it is for single boards, or size or terms are not known, or the
 * terms hold no panel of so many boards.
 *
 * @example a quote of Kilnside for panels of 12 → the panel, place by place
 */
export function panelOfQuote(plan: Plan, id: string): QuotedPanel | null {
  const quote = plan.boards.quotes.find((one) => one.id === id);
  if (quote === undefined || quote.boardsPerPanel === null) return null;
  const fitted = panelsAt(plan, quote.boardHouse);
  if (fitted === null || !fitted.ok) return null;
  const layout = quotedLayout(fitted, quote.boardsPerPanel, quote.pieceSize);
  return layout && { panel: layOutPanel(layout, fitted.measures), fitted };
}
