import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { panelTerms } from "#db/schema/boards.ts";

export type PanelTermsRow = typeof panelTerms.$inferSelect;
type NewPanelTermsRow = typeof panelTerms.$inferInsert;

/** What board houses make panels of a kit's board like, by house. */
export function panelTermsOf(db: Db, kitId: string): PanelTermsRow[] {
  return db
    .select()
    .from(panelTerms)
    .where(eq(panelTerms.kitId, kitId))
    .orderBy(asc(panelTerms.boardHouse))
    .all();
}

export function addPanelTerms(db: Db, row: NewPanelTermsRow): PanelTermsRow {
  return db.insert(panelTerms).values(row).returning().get();
}

/** Changes terms that still have the version `seen`; `undefined` where they have moved on. */
export function changePanelTerms(
  db: Db,
  id: string,
  seen: number,
  change: Partial<PanelTermsRow>,
): PanelTermsRow | undefined {
  return db
    .update(panelTerms)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(panelTerms.id, id), eq(panelTerms.version, seen)))
    .returning()
    .get();
}

/** Removes terms that still have the version `seen`; whether they were there. */
export function removePanelTerms(db: Db, id: string, seen: number): boolean {
  return (
    db
      .delete(panelTerms)
      .where(and(eq(panelTerms.id, id), eq(panelTerms.version, seen)))
      .run().changes > 0
  );
}
