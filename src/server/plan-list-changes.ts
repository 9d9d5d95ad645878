import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import type { Changed } from "./run-changes.ts";
import { editionsOf } from "./store/edition.ts";
import { chargeList, type PlanList, packingList, taskList } from "./store/plan-list.ts";
import type { ChargeRow, PackingItemRow, TaskRow } from "./store/run-plan.ts";
import { inTransaction } from "./transaction.ts";

type Changing = ChangingSomewhere & { kit: { id: string } };
type Row = TaskRow | PackingItemRow | ChargeRow;
type Entry<R extends Row> = Omit<R, "id" | "workshopId" | "kitId" | "version" | "position">;

/** Rows of one kind that a run plan holds at most; as in the shape of a plan. */
const ROWS_MOST = 100;

function refuseStrangeEditions({ db, kit }: Changing, fields: object): void {
  const named = (fields as { editions?: string[] | null }).editions;
  if (!named) return;
  const own = new Set(editionsOf(db, kit.id).map(({ id }) => id));
  const strange = named.findIndex((id) => !own.has(id));
  if (strange >= 0) throw wrongField(`editions.${strange}`, "Name an edition of this kit.");
}

function listChanges<R extends Row>(list: PlanList<R>, noun: string) {
  function found(given: Changing, id: string): R {
    const row = list.one(given.db, given.kit.id, id);
    if (!row) throw new Problem("not-found");
    return row;
  }
  const note = (given: Changing, what: string, row: R, detail: Record<string, unknown>) =>
    noteChange(given, { action: `${noun}.${what}`, subjectId: row.id, subjectName: row.name, detail });

  return {
    /** Adds a row, last unless a position is named. */
    add(
      given: Changing,
      { position, ...fields }: Entry<R> & { position?: number },
    ): Changed & { id: string } {
      const { db, kit, workshop } = given;
      refuseStrangeEditions(given, fields);
      return inTransaction(db, () => {
        if (list.count(db, kit.id) >= ROWS_MOST)
          throw wrongField("name", `A run takes at most ${ROWS_MOST} of these.`);
        const place = position ?? list.nextPosition(db, kit.id);
        const where = { id: newId(), workshopId: workshop.id, kitId: kit.id, position: place, version: 1 };
        const row = { ...fields, ...where } as unknown as R;
        list.add(db, row);
        note(given, "add", row, { ...fields });
        return { id: row.id, version: row.version };
      });
    },

    /** Changes fields of a row that its person has seen as it is. */
    change(given: Changing, id: string, change: { version: number } & Partial<Entry<R>>): Changed {
      const { version, ...fields } = change;
      refuseStrangeEditions(given, fields);
      return inTransaction(given.db, () => {
        const before = found(given, id);
        const after = list.change(given.db, id, version, fields as Partial<R>);
        if (!after) throw clash(given, id, before);
        const names = Object.keys(fields) as (keyof R & string)[];
        note(
          given,
          "change",
          after,
          Object.fromEntries(names.map((name) => [name, [before[name], after[name]]])),
        );
        return { version: after.version };
      });
    },

    /** Removes a row and hands it back, so that it can be put back where it was. */
    remove(given: Changing, id: string, version: number): R {
      return inTransaction(given.db, () => {
        const row = found(given, id);
        if (!list.remove(given.db, id, version)) throw clash(given, id, row);
        note(given, "remove", row, { ...row });
        return row;
      });
    },
  };
}

export const taskChanges = listChanges(taskList, "task");
export const packingChanges = listChanges(packingList, "packing");
export const chargeChanges = listChanges(chargeList, "charge");
