import { and, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { columnMemories } from "#db/schema/imports.ts";
import type { ImportKind } from "#src/shapes/limits.ts";

export type ColumnMemoryRow = typeof columnMemories.$inferSelect;

/** What the columns of a heading with this fingerprint meant the last time, or nothing. */
export function rememberedMapping(
  db: Db,
  workshopId: string,
  kind: ImportKind,
  fingerprint: string,
): unknown {
  return db
    .select({ mapping: columnMemories.mapping })
    .from(columnMemories)
    .where(
      and(
        eq(columnMemories.workshopId, workshopId),
        eq(columnMemories.kind, kind),
        eq(columnMemories.fingerprint, fingerprint),
      ),
    )
    .get()?.mapping;
}

/** Remembers what the columns meant, for the next list of the same shape. */
export function rememberMapping(db: Db, row: ColumnMemoryRow): void {
  db.insert(columnMemories)
    .values(row)
    .onConflictDoUpdate({
      target: [columnMemories.workshopId, columnMemories.kind, columnMemories.fingerprint],
      set: { mapping: row.mapping, usedAt: row.usedAt },
    })
    .run();
}
