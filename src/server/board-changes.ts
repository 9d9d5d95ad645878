import type { z } from "zod";
import { BoardQuote, type BoardQuoteChange, type BoardQuoteFields } from "#src/shapes/board-quote.ts";
import { BOARD_QUOTES_MOST } from "#src/shapes/limits.ts";
import { beforeAndAfter } from "./before-and-after.ts";
import { checked } from "./checked.ts";
import { kitBoard } from "./kit-board.ts";
import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, clash, noteChange, type Where } from "./note-change.ts";
import { refuseQuotedPanel } from "./panel-faults.ts";
import { type PanelTermsView, viewTerms } from "./panel-terms-changes.ts";
import { Problem, wrongField } from "./problem.ts";
import {
  addBoardQuote as addRow,
  type BoardQuoteRow,
  boardQuoteOf,
  boardQuotesOf,
  changeBoardQuote as changeRow,
  type QuoteWithBreaks,
  removeBoardQuote as removeRow,
} from "./store/board-quote.ts";
import type { KitRow } from "./store/kit.ts";
import { changePanelTerms, panelTermsOf } from "./store/panel-terms.ts";
import { changeRunPlan, type RunPlanRow, runPlanOf } from "./store/run-plan.ts";
import { inTransaction } from "./transaction.ts";

type Changing = ChangingSomewhere & { kit: KitRow };

/** A quote as people see it, with its lots or breaks. */
export type BoardQuoteView = Omit<BoardQuoteRow, "workshopId" | "kitId"> & {
  breaks: { quantity: number; price: string }[];
};

/** How the kit orders its boards; the version is the run plan's. */
export type BoardChoiceView = Pick<
  RunPlanRow,
  "chosenQuoteId" | "boardYield" | "boardConfidence" | "version"
>;

/** All that the Boards page of a kit is made of. */
export interface BoardsView {
  choice: BoardChoiceView;
  quotes: BoardQuoteView[];
  panelTerms: PanelTermsView[];
}

function view({ quote: { workshopId: _, kitId: __, ...row }, breaks }: QuoteWithBreaks): BoardQuoteView {
  return { ...row, breaks };
}

function choiceOf(row: RunPlanRow): BoardChoiceView {
  const { chosenQuoteId, boardYield, boardConfidence, version } = row;
  return { chosenQuoteId, boardYield, boardConfidence, version };
}

/** The kit's quotes, the panels of board houses, and how it orders its boards. */
export function boards({ db, kit }: Where & { kit: KitRow }): BoardsView {
  return {
    choice: choiceOf(runPlanOf(db, kit.id)),
    quotes: boardQuotesOf(db, kit.id).map(view),
    panelTerms: panelTermsOf(db, kit.id).map(viewTerms),
  };
}

function found({ db, kit }: Changing, quoteId: string): BoardQuoteView {
  const row = boardQuoteOf(db, kit.id, quoteId);
  if (!row) throw new Problem("not-found");
  return view(row);
}

/** Adds a board house's quote for the kit's board. */
export function addQuote(given: Changing, input: BoardQuoteFields): BoardQuoteView {
  const { db, workshop, kit } = given;
  const { breaks, ...fields } = checked(BoardQuote, input);
  refuseQuotedPanel({ ...fields, breaks }, kitBoard(kit));
  return inTransaction(db, () => {
    if (boardQuotesOf(db, kit.id).length >= BOARD_QUOTES_MOST)
      throw wrongField("", `A kit has at most ${BOARD_QUOTES_MOST} quotes. Remove one first.`);
    const row = addRow(db, { id: newId(), workshopId: workshop.id, kitId: kit.id, ...fields }, breaks);
    noteChange(given, { action: "quote.add", subjectId: row.id, subjectName: row.boardHouse });
    return found(given, row.id);
  });
}

/** Changes fields of a quote; together with those that stay they must make sense. */
export function changeQuote(
  given: Changing,
  quoteId: string,
  { version, ...changed }: z.infer<typeof BoardQuoteChange>,
): BoardQuoteView {
  return inTransaction(given.db, () => {
    const before = found(given, quoteId);
    if (before.version !== version) throw clash(given, quoteId, before);
    const { id: _, version: __, ...stays } = before;
    const { breaks, ...fields } = checked(BoardQuote, { ...stays, ...changed });
    refuseQuotedPanel({ ...fields, breaks }, kitBoard(given.kit));
    if (!changeRow(given.db, quoteId, version, fields, breaks)) throw clash(given, quoteId, before);
    renameHouse(given, before.boardHouse, fields.boardHouse);
    const detail = beforeAndAfter(stays, { ...fields, breaks });
    noteChange(given, { action: "quote.change", subjectId: quoteId, subjectName: before.boardHouse, detail });
    return found(given, quoteId);
  });
}

/** Panel terms go by the house's name: they follow when its last quote gets another. */
function renameHouse({ db, kit }: Changing, from: string, to: string): void {
  const terms = panelTermsOf(db, kit.id);
  const own = terms.find(({ boardHouse }) => boardHouse === from);
  if (from === to || !own || terms.some(({ boardHouse }) => boardHouse === to)) return;
  if (boardQuotesOf(db, kit.id).some(({ quote }) => quote.boardHouse === from)) return;
  changePanelTerms(db, own.id, own.version, { boardHouse: to });
}

/** Removes a quote; a kit that had chosen it takes the cheapest again. */
export function removeQuote(given: Changing, quoteId: string, version: number): void {
  const { db, kit } = given;
  inTransaction(db, () => {
    const before = found(given, quoteId);
    if (!removeRow(db, quoteId, version)) throw clash(given, quoteId, before);
    const run = runPlanOf(db, kit.id);
    if (run.chosenQuoteId === quoteId) changeRunPlan(db, kit.id, run.version, { chosenQuoteId: null });
    noteChange(given, { action: "quote.remove", subjectId: quoteId, subjectName: before.boardHouse });
  });
}
