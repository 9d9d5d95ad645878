import { type RungDraft, rungDrafts, rungsOf } from "#src/components/islands/offers/LadderEditor.tsx";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";

/** A quote as its form holds it: numbers as they are typed. */
export type QuoteDraft = Omit<BoardQuoteFields, "breaks" | "layers" | "leadTimeDays" | "boardsPerPanel"> & {
  breaks: RungDraft[];
  /** Null: singly; empty: in panels, of how many is not written yet. */
  boardsPerPanel: string | null;
  layers: string;
  leadTimeDays: string;
};

/** A quote as a form's first state. */
export function quoteDraft(quote: BoardQuoteFields): QuoteDraft {
  return {
    ...quote,
    breaks: rungDrafts(quote.breaks),
    boardsPerPanel: quote.boardsPerPanel === null ? null : String(quote.boardsPerPanel),
    layers: quote.layers === null ? "" : String(quote.layers),
    leadTimeDays: quote.leadTimeDays === null ? "" : String(quote.leadTimeDays),
  };
}

/** A quote as it is sent: without what a single board or another price model does not have. */
export function quoteFields(draft: QuoteDraft): BoardQuoteFields {
  const whole = (text: string) => (text === "" ? null : Number(text));
  const formula = draft.priceModel === "formula";
  const { boardsPerPanel, setUp, areaRate, areaUnit, perBoard } = draft;
  const panelless = { panelWidth: null, panelHeight: null, depanelling: "0" };
  return {
    ...draft,
    ...(boardsPerPanel === null ? panelless : {}),
    boardsPerPanel: boardsPerPanel === null ? null : Number(boardsPerPanel),
    setUp: formula ? setUp : null,
    areaRate: formula ? areaRate : null,
    areaUnit: formula ? (areaUnit ?? "dm2") : null,
    perBoard: formula ? perBoard : null,
    breaks: formula ? [] : rungsOf(draft.breaks),
    layers: whole(draft.layers),
    leadTimeDays: whole(draft.leadTimeDays),
  };
}
