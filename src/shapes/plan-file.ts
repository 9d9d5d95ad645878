import { z } from "zod";
import { OWN_SITE } from "./limits.ts";
import { Plan } from "./plan.ts";

type Given = Record<string, unknown>;

function isRecord(value: unknown): value is Given {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}

/** One rule for every sale, as plans had it before they had channels: fee and tax on price and postage. */
function channelOf(sale: Given): Given {
  return {
    id: "own-site",
    name: OWN_SITE,
    weight: 1,
    editions: null,
    discount: "0",
    ownPrices: [],
    taxStated: "inside",
    feeOnPostage: true,
    feeOnTax: true,
    packingCost: "0",
    other: { name: "", amount: "0", sharedOver: 1 },
    minutesPerOrder: "0",
    kitsPerOrder: "1",
    ...sale,
  };
}

/** Boards as plans had them before panels: every quote for single boards, no size known, no house's panels. */
function boardsOf(boards: Given): Given {
  const singly = { boardsPerPanel: null, pieceSize: null, formula: null, depanelling: "0" };
  const quotes = Array.isArray(boards.quotes)
    ? boards.quotes.map((quote: unknown) => (isRecord(quote) ? { ...singly, ...quote } : quote))
    : boards.quotes;
  return { size: null, panelTerms: [], ...boards, quotes };
}

/** A plan of the first format in the words of the second; anything else as it came. */
function asNow(value: unknown): unknown {
  if (!isRecord(value) || value.format !== "tinpenny-plan/1") return value;
  const { sale, ...rest } = value;
  // Early files do not say how long the list is; each of its parts stands in it at least once.
  const lines = Array.isArray(rest.parts) ? rest.parts.length : 0;
  const channels = isRecord(sale) ? [channelOf(sale)] : sale;
  const boards = isRecord(rest.boards) ? boardsOf(rest.boards) : rest.boards;
  return { lines, ...rest, format: "tinpenny-plan/2", boards, channels };
}

/** A plan as somebody sends it: of this format, or of the first, which is read as what it meant. */
export const PlanFile = z.preprocess(asNow, Plan);
