import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";

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
