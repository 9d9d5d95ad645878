import { and, desc, eq, gte, inArray, isNull, or } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { activity } from "#db/schema/activity.ts";
import { users } from "#db/schema/people.ts";

export type ActivityRow = typeof activity.$inferSelect;

/** Writes down who changed what. Call it inside the transaction of the change. */
export function addActivity(db: Db, row: ActivityRow): void {
  db.insert(activity).values(row).run();
}

/** Who changed a thing last, and when; `undefined` where the log knows of no change. */
export function lastChangeOf(
  db: Db,
  workshopId: string,
  subjectId: string,
): { by: string | null; at: number } | undefined {
  return db
    .select({ by: users.name, at: activity.at })
    .from(activity)
    .leftJoin(users, eq(users.id, activity.userId))
    .where(and(eq(activity.workshopId, workshopId), eq(activity.subjectId, subjectId)))
    .orderBy(desc(activity.at))
    .limit(1)
    .get();
}

/** An entry with the name of the person, `null` where the person is gone or it was the program itself. */
export interface ActivityEntry extends ActivityRow {
  by: string | null;
}

/** What happened in a workshop since a moment, the newest first; `kitIds` leaves out other kits' entries. */
export function activitySince(
  db: Db,
  workshopId: string,
  since: number,
  kitIds: string[] | null,
  most: number,
): ActivityEntry[] {
  const about = kitIds === null ? undefined : or(isNull(activity.kitId), inArray(activity.kitId, kitIds));
  return db
    .select({ entry: activity, by: users.name })
    .from(activity)
    .leftJoin(users, eq(users.id, activity.userId))
    .where(and(eq(activity.workshopId, workshopId), gte(activity.at, since), about))
    .orderBy(desc(activity.at))
    .limit(most)
    .all()
    .map(({ entry, by }) => ({ ...entry, by }));
}
