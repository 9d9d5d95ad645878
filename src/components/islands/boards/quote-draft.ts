import { type RungDraft, rungDrafts, rungsOf } from "#src/components/islands/offers/LadderEditor.tsx";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";

/** A quote as its form holds it: numbers as they are typed. */
export type QuoteDraft = Omit<BoardQuoteFields, "breaks" | "layers" | "leadTimeDays"> & {
  breaks: RungDraft[];
  layers: string;
  leadTimeDays: string;
};

/** A quote of which nothing is written down; its board is the kit's. */
export function blankQuote(
  currency: string,
  today: string,
  width: string | null,
  height: string | null,
): BoardQuoteFields {
  return {
    boardHouse: "",
    currency,
    width,
    height,
    boardsPerPanel: null,
    panelWidth: null,
    panelHeight: null,
    depanelling: "0",
    layers: 2,
    finish: "",
    colour: "",
    priceModel: "lots",
    breaks: [],
    setUp: null,
    areaRate: null,
    areaUnit: null,
    perBoard: null,
    engineeringCharge: "0",
    stencilCharge: "0",
    freight: null,
    leadTimeDays: null,
    pricedOn: today,
    validUntil: null,
    note: "",
  };
}

export function quoteDraft(quote: BoardQuoteFields): QuoteDraft {
  return {
    ...quote,
    breaks: rungDrafts(quote.breaks),
    layers: quote.layers === null ? "" : String(quote.layers),
    leadTimeDays: quote.leadTimeDays === null ? "" : String(quote.leadTimeDays),
  };
}

export function quoteFields(draft: QuoteDraft): BoardQuoteFields {
  const whole = (text: string) => (text === "" ? null : Number(text));
  return {
    ...draft,
    breaks: rungsOf(draft.breaks),
    layers: whole(draft.layers),
    leadTimeDays: whole(draft.leadTimeDays),
  };
}
