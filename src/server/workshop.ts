import type { Db } from "#db/client.ts";
import type { WorkshopChange, WorkshopSettings } from "#src/shapes/workshop.ts";
import { beforeAndAfter } from "./before-and-after.ts";
import { newId } from "./new-id.ts";
import { type Changing, clash, noteChange } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import { kitsOf } from "./store/kit.ts";
import { addMembership, membershipOf, type WorkshopRow } from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";
import { addWorkshop, changeWorkshop, removeWorkshop } from "./store/workshop.ts";
import { inTransaction } from "./transaction.ts";

/** Makes a workshop and its first owner one of its people. Call it inside a transaction. */
export function beginWorkshop(
  { db, now, user }: { db: Db; now: number; user: UserRow },
  { name, currency }: { name: string; currency: string },
): WorkshopRow {
  const workshop = addWorkshop(db, { id: newId(), name, currency, createdAt: now });
  addMembership(db, { workshopId: workshop.id, userId: user.id, role: "owner", createdAt: now });
  noteChange(
    { db, now, user, workshop },
    { action: "workshop.begin", subjectId: workshop.id, subjectName: name },
  );
  return workshop;
}

/** A workshop's settings, as its owners see and change them. */
export function settingsOf({ id, name, currency, ratePerHour, version }: WorkshopRow): WorkshopSettings {
  return { id, name, currency, ratePerHour, version };
}

type Given = Changing & { user: UserRow; workshop: WorkshopRow };

/** Changes name or currency; the currency only while no kit has prices in it. */
export function changeSettings(given: Given, { version, ...fields }: WorkshopChange): WorkshopSettings {
  const { db, workshop, user } = given;
  const moves = fields.currency !== undefined && fields.currency !== workshop.currency;
  return inTransaction(db, () => {
    if (moves && kitsOf(db, workshop.id).length > 0)
      throw new Problem("currency-fixed", { parameters: { currency: workshop.currency } });
    const changed = changeWorkshop(db, workshop.id, version, fields);
    if (!changed) {
      const current = membershipOf(db, workshop.id, user.id)?.workshop ?? workshop;
      throw clash(given, workshop.id, settingsOf(current));
    }
    const detail = { ...beforeAndAfter(workshop, fields) };
    noteChange(given, {
      ...{ action: "workshop.change", subjectId: workshop.id, subjectName: changed.name, detail },
    });
    return settingsOf(changed);
  });
}

/** Deletes a workshop with everything in it, once its name was typed. */
export function deleteWorkshop({ db, workshop }: Given, name: string): void {
  if (name.trim() !== workshop.name)
    throw wrongField("name", `Write the workshop's name as it stands: ${workshop.name}`);
  removeWorkshop(db, workshop.id);
}
