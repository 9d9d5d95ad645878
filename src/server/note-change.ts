import type { Db } from "#db/client.ts";
import { newId } from "./new-id.ts";
import { Problem } from "./problem.ts";
import { addActivity, lastChangeOf } from "./store/activity.ts";

/** Who changes something, where and when: what every handler of a route is given. */
export interface Changing {
  db: Db;
  now: number;
  user: { id: string };
  workshop: { id: string };
  kit?: { id: string };
}

/** Where something is read. */
export type Where = Pick<Changing, "db" | "workshop">;

interface Change {
  /** What was done, such as "run.change". */
  action: string;
  subjectId: string;
  subjectName: string;
  detail?: Record<string, unknown>;
}

/** Writes a change into the activity log; called inside the transaction that makes it. */
export function noteChange({ db, now, user, workshop, kit }: Changing, change: Change): void {
  const { action, subjectId, subjectName, detail = {} } = change;
  const where = { workshopId: workshop.id, kitId: kit?.id ?? null, userId: user.id };
  addActivity(db, { id: newId(), ...where, at: now, action, subjectId, subjectName, detail });
}

/**
 * The reply to somebody who changes what another person changed after they saw it: the row as it stands,
 * and who changed it last, so that both values can be shown.
 */
export function clash({ db, workshop }: Changing, subjectId: string, row: object): Problem {
  const last = lastChangeOf(db, workshop.id, subjectId);
  return new Problem("changed-meanwhile", {
    current: { ...row, changedBy: last?.by ?? null, changedAt: last?.at ?? null },
  });
}
