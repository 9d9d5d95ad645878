import type { Db } from "#db/client.ts";
import { newId } from "./new-id.ts";
import { noteChange } from "./note-change.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { addMembership } from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";
import { addWorkshop } from "./store/workshop.ts";

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
