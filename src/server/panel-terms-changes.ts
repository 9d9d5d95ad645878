import type { z } from "zod";
import { BOARD_QUOTES_MOST } from "#src/shapes/limits.ts";
import { type PanelTermsChange, type PanelTermsFields, PanelTermsOfHouse } from "#src/shapes/panel-terms.ts";
import { beforeAndAfter } from "./before-and-after.ts";
import { checked } from "./checked.ts";
import { kitBoard } from "./kit-board.ts";
import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { refuseTerms } from "./panel-faults.ts";
import { Problem, wrongField } from "./problem.ts";
import type { KitRow } from "./store/kit.ts";
import {
  addPanelTerms as addRow,
  changePanelTerms as changeRow,
  type PanelTermsRow,
  panelTermsOf,
  removePanelTerms as removeRow,
} from "./store/panel-terms.ts";
import { inTransaction } from "./transaction.ts";

type Changing = ChangingSomewhere & { kit: KitRow };

/** A board house's panel terms as people see them. */
export type PanelTermsView = Omit<PanelTermsRow, "workshopId" | "kitId">;

/** Terms without the places they belong to. */
export function viewTerms({ workshopId: _, kitId: __, ...row }: PanelTermsRow): PanelTermsView {
  return row;
}

function found({ db, kit }: Changing, id: string): PanelTermsView {
  const row = panelTermsOf(db, kit.id).find((one) => one.id === id);
  if (!row) throw new Problem("not-found");
  return viewTerms(row);
}

function refuseTaken({ db, kit }: Changing, boardHouse: string, own?: string): void {
  if (panelTermsOf(db, kit.id).some((one) => one.boardHouse === boardHouse && one.id !== own))
    throw wrongField("boardHouse", `The panels of ${boardHouse} are written down already. Change those.`);
}

/** Writes down what a board house makes panels of the kit's board like. */
export function addTerms(given: Changing, input: PanelTermsFields): PanelTermsView {
  const { db, workshop, kit } = given;
  const fields = checked(PanelTermsOfHouse, input);
  refuseTerms(fields, kitBoard(kit));
  return inTransaction(db, () => {
    refuseTaken(given, fields.boardHouse);
    if (panelTermsOf(db, kit.id).length >= BOARD_QUOTES_MOST)
      throw wrongField(
        "",
        `A kit has the panels of at most ${BOARD_QUOTES_MOST} board houses. Remove one first.`,
      );
    const row = addRow(db, { id: newId(), workshopId: workshop.id, kitId: kit.id, ...fields });
    noteChange(given, { action: "panel-terms.add", subjectId: row.id, subjectName: row.boardHouse });
    return viewTerms(row);
  });
}

/** Changes fields of panel terms; together with those that stay a panel must be possible. */
export function changeTerms(
  given: Changing,
  id: string,
  { version, ...changed }: z.infer<typeof PanelTermsChange>,
): PanelTermsView {
  return inTransaction(given.db, () => {
    const before = found(given, id);
    if (before.version !== version) throw clash(given, id, before);
    const { id: _, version: __, ...stays } = before;
    const fields = checked(PanelTermsOfHouse, { ...stays, ...changed });
    refuseTaken(given, fields.boardHouse, id);
    refuseTerms(fields, kitBoard(given.kit));
    if (!changeRow(given.db, id, version, fields)) throw clash(given, id, before);
    const detail = beforeAndAfter(stays, fields);
    noteChange(given, {
      action: "panel-terms.change",
      subjectId: id,
      subjectName: before.boardHouse,
      detail,
    });
    return found(given, id);
  });
}

/** Removes panel terms; quotes for panels keep their price and lose their drawing. */
export function removeTerms(given: Changing, id: string, version: number): void {
  inTransaction(given.db, () => {
    const before = found(given, id);
    if (!removeRow(given.db, id, version)) throw clash(given, id, before);
    noteChange(given, { action: "panel-terms.remove", subjectId: id, subjectName: before.boardHouse });
  });
}
