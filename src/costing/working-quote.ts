import { panelOfQuote } from "./panels/panel-of-quote.ts";
import { panelSheet } from "./panels/working-panel.ts";
import { piecesSheet } from "./panels/working-pieces.ts";
import type { WorkingContext } from "./working.ts";
import { count, notKnown, type Sheet, step } from "./working-lines.ts";

/** A board house's quote at this run size (section 6), for single boards or panels. */
export function quoteSheet({ prepared, result }: WorkingContext, id: string): Sheet | null {
  const quote = prepared.quotes.find((one) => one.stated.id === id);
  const found = result.boards.quotes.find((one) => one.id === id);
  if (quote === undefined || found === undefined) return null;
  const { required, toOrder } = result.boards;
  const panel = panelOfQuote(prepared.plan, id) === null ? null : (`panel:${id}` as const);
  const sheet = toOrder === null ? null : piecesSheet(quote, { required, toOrder }, result.currency, panel);
  if (sheet !== null) return sheet;
  const needs = found.landed.known ? [] : found.landed.needs;
  return {
    title: `${found.boardHouse}, boards for a run of ${result.kits}`,
    steps: [
      step(null, "Boards to order", toOrder === null ? notKnown(needs) : count(toOrder, "boards"), "6", {
        opens: "boards-to-order",
      }),
      step(null, "One good board", notKnown(needs), "6", { result: true }),
    ],
    notes: [],
    basis: `In ${found.currency}, without VAT`,
  };
}

/** How the panel of a quote comes to its size and count; null where its size, count or terms are not known. */
export function quotedPanelSheet({ prepared }: WorkingContext, id: string): Sheet | null {
  const quoted = panelOfQuote(prepared.plan, id);
  return quoted && panelSheet(quoted.panel, quoted.fitted);
}
