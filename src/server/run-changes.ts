import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import { boardQuoteOf } from "./store/board-quote.ts";
import { changeEdition, type EditionRow, editionOf } from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { changeRunPlan, type RunPlanRow, runPlanOf } from "./store/run-plan.ts";
import { changeWorkshop } from "./store/workshop.ts";
import { inTransaction } from "./transaction.ts";

type Changing = ChangingSomewhere & { workshop: WorkshopRow; kit: KitRow };

/** What a changed row tells the person who changed it: the version their next change must name. */
export interface Changed {
  version: number;
}

/** The fields of a change with what stood there before, for the activity log. */
function beforeAndAfter<Row extends object>(before: Row, fields: Partial<Row>): Record<string, unknown> {
  const names = Object.keys(fields) as (keyof Row & string)[];
  return Object.fromEntries(names.map((name) => [name, [before[name], fields[name]]]));
}

/** Changes fields of a kit's run plan. */
export function setRunPlan(
  given: Changing,
  { version, ...fields }: Partial<RunPlanRow> & { version: number },
): Changed {
  const { db, kit } = given;
  return inTransaction(db, () => {
    if (fields.chosenQuoteId && !boardQuoteOf(db, kit.id, fields.chosenQuoteId))
      throw wrongField("chosenQuoteId", "This kit has no such quote.");
    const before = runPlanOf(db, kit.id);
    const after = changeRunPlan(db, kit.id, version, fields);
    if (!after) throw clash(given, kit.id, before);
    const detail = beforeAndAfter(before, fields);
    noteChange(given, { action: "run.change", subjectId: kit.id, subjectName: kit.name, detail });
    return { version: after.version };
  });
}

/** Changes an edition's price or its share of the run. */
export function setEdition(
  given: Changing,
  editionId: string,
  { version, ...fields }: Partial<Pick<EditionRow, "price" | "weight">> & { version: number },
): Changed {
  const { db, kit } = given;
  return inTransaction(db, () => {
    const before = editionOf(db, kit.id, editionId);
    if (!before) throw new Problem("not-found");
    const after = changeEdition(db, kit.id, editionId, version, fields);
    if (!after) throw clash(given, editionId, before);
    const detail = beforeAndAfter(before, fields);
    noteChange(given, { action: "edition.change", subjectId: editionId, subjectName: before.name, detail });
    return { version: after.version };
  });
}

/** Sets what an hour's own work costs, for every kit of the workshop. */
export function setHourRate(
  given: ChangingSomewhere & { workshop: WorkshopRow },
  { version, ratePerHour }: { version: number; ratePerHour: string | null },
): Changed {
  const { db, workshop } = given;
  return inTransaction(db, () => {
    const after = changeWorkshop(db, workshop.id, version, { ratePerHour });
    if (!after) throw clash(given, workshop.id, workshop);
    const detail = beforeAndAfter(workshop, { ratePerHour });
    noteChange(given, {
      action: "workshop.hour-rate",
      subjectId: workshop.id,
      subjectName: workshop.name,
      detail,
    });
    return { version: after.version };
  });
}
