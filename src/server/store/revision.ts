import { and, desc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { revisions } from "#db/schema/kits.ts";

export type RevisionRow = typeof revisions.$inferSelect;

/** Keeps the parts list as it stood when a revision ended. */
export function addRevision(db: Db, row: RevisionRow): void {
  db.insert(revisions).values(row).run();
}

/** The revisions of a kit that have ended, the newest first, without their lists. */
export function revisionsOf(db: Db, kitId: string): Omit<RevisionRow, "snapshot">[] {
  return db
    .select({
      id: revisions.id,
      workshopId: revisions.workshopId,
      kitId: revisions.kitId,
      number: revisions.number,
      endedAt: revisions.endedAt,
      endedBy: revisions.endedBy,
    })
    .from(revisions)
    .where(eq(revisions.kitId, kitId))
    .orderBy(desc(revisions.number))
    .all();
}

/** The last revision of a kit that has ended, with its list. */
export function lastRevisionOf(db: Db, kitId: string): RevisionRow | undefined {
  return db
    .select()
    .from(revisions)
    .where(eq(revisions.kitId, kitId))
    .orderBy(desc(revisions.number))
    .limit(1)
    .get();
}

export function removeRevision(db: Db, kitId: string, revisionId: string): void {
  db.delete(revisions)
    .where(and(eq(revisions.id, revisionId), eq(revisions.kitId, kitId)))
    .run();
}
