import type { FittedPanels } from "#src/costing/panels/fit-panels.ts";
import { layOutPanel, type Panel } from "#src/costing/panels/lay-out-panel.ts";
import { panelOfQuote, panelsAt } from "#src/costing/panels/panel-of-quote.ts";
import { usefulPanels } from "#src/costing/panels/useful-panels.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** A panel to choose, and the quote that is for it, if there is one. */
export interface ShownPanel {
  panel: Panel;
  quote: string | null;
}

const CHOICES = 4;

/** The house whose panels are shown first: the chosen quote's, else the first that has any. */
export function firstHouse(plan: Plan, run: RunResult): string | null {
  const houses = plan.boards.panelTerms.map(({ boardHouse }) => boardHouse);
  const chosen = run.boards.quotes.find(({ id }) => id === run.boards.chosen);
  return houses.find((house) => house === chosen?.boardHouse) ?? houses[0] ?? null;
}

/**
 * A few sizes of panel at a house: those its quotes are for, laid out as quoted, and the most useful of the others
 * for the boards to order. At most four, unless it quotes for more.
 */
export function shownPanels(plan: Plan, house: string, fitted: FittedPanels, toOrder: number): ShownPanel[] {
  const quoted = new Map<number, ShownPanel>();
  for (const { id, boardHouse } of plan.boards.quotes) {
    const found = boardHouse === house ? panelOfQuote(plan, id) : null;
    if (!found) continue;
    const { count } = found.panel.arrangement;
    if (!quoted.has(count) || id === plan.boards.chosenQuote)
      quoted.set(count, { panel: found.panel, quote: id });
  }
  const useful = usefulPanels(fitted, Math.max(1, toOrder), CHOICES).filter(
    ({ count }) => !quoted.has(count),
  );
  const others = useful
    .slice(Math.max(0, useful.length + quoted.size - CHOICES))
    .map((arrangement) => ({ panel: layOutPanel(arrangement, fitted.measures), quote: null }));
  return [...quoted.values(), ...others].sort((a, b) => countOf(a) - countOf(b));
}

/** Boards of a shown panel. */
export function countOf({ panel }: ShownPanel): number {
  return panel.arrangement.count;
}

/** What a house's panels look like on the page: all that fits, what is offered, and the one that is drawn. */
export interface PanelView {
  house: string;
  fitted: FittedPanels;
  shown: readonly ShownPanel[];
  now: ShownPanel;
}

/** The view of a house's panels with one of `count` boards drawn, or the first; null where none can be laid out. */
export function panelView(plan: Plan, run: RunResult, house: string, count: number | null): PanelView | null {
  const fitted = panelsAt(plan, house);
  if (!fitted?.ok) return null;
  const { toOrder, required, chosen } = run.boards;
  const shown = shownPanels(plan, house, fitted, toOrder ?? required);
  const now = shown.find((one) => countOf(one) === count) ?? firstShown(shown, chosen);
  return now ? { house, fitted, shown, now } : null;
}

/** The panel drawn first: of the chosen quote, else of a quote, else the largest. */
function firstShown(shown: readonly ShownPanel[], chosen: string | null): ShownPanel | undefined {
  return (
    shown.find(({ quote }) => quote !== null && quote === chosen) ??
    shown.find(({ quote }) => quote !== null) ??
    shown.at(-1)
  );
}
