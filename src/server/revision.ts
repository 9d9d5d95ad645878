import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import { PartsSnapshot, type SnapshotPart } from "#src/shapes/parts-snapshot.ts";
import { revisionLetter } from "#src/shapes/revision-letter.ts";
import { newId } from "./new-id.ts";
import { type Changing, noteChange } from "./note-change.ts";
import { editionsOf } from "./store/edition.ts";
import { beginNextRevision, type KitRow } from "./store/kit.ts";
import { lineQuantitiesOf, linesOf } from "./store/line.ts";
import type { PartRow } from "./store/part.ts";
import { addRevision, lastRevisionOf, type RevisionRow } from "./store/revision.ts";

function snapshotPart(part: PartRow): SnapshotPart {
  const { workshopId, freeStock, stockCost, createdAt, version, ...read } = part;
  return read;
}

/** A kit's parts list as it stands now, for keeping. */
export function partsSnapshot(db: Db, kitId: string): PartsSnapshot {
  const quantities = groupBy(lineQuantitiesOf(db, kitId), (row) => row.lineId);
  return {
    editions: editionsOf(db, kitId).map(({ id, name }) => ({ id, name })),
    lines: linesOf(db, kitId).map(({ line, part }) => ({
      id: line.id,
      position: line.position,
      designators: line.designators,
      mark: line.mark,
      note: line.note,
      part: snapshotPart(part),
      quantities: (quantities.get(line.id) ?? []).map(({ editionId, perKit }) => ({
        edition: editionId,
        perKit,
      })),
    })),
  };
}

/**
 * Ends the current revision of a kit's parts list: keeps the list as it stands and counts the revision up.
 * Call it inside a transaction, before the change that begins the next revision. Returns what was kept
 * and the kit as it then stands.
 */
export function endRevision(by: Changing, kit: KitRow): { ended: RevisionRow; kit: KitRow } {
  const ended: RevisionRow = {
    id: newId(),
    workshopId: kit.workshopId,
    kitId: kit.id,
    number: kit.revision,
    endedAt: by.now,
    endedBy: by.user.id,
    snapshot: partsSnapshot(by.db, kit.id),
  };
  addRevision(by.db, ended);
  noteChange(
    { ...by, kit },
    {
      action: "revision.end",
      subjectId: kit.id,
      subjectName: kit.name,
      detail: { revision: revisionLetter(kit.revision) },
    },
  );
  return { ended, kit: beginNextRevision(by.db, kit.id) };
}

/** A revision that has ended, with its lines as they are compared. */
export interface EndedRevision {
  revision: string;
  endedAt: number;
  editions: PartsSnapshot["editions"];
  lines: (Omit<PartsSnapshot["lines"][number], "quantities"> & { quantities: Record<string, number> })[];
}

/** The last revision that has ended; `null` while the first one lasts. */
export function lastRevision(db: Db, kitId: string): EndedRevision | null {
  const row = lastRevisionOf(db, kitId);
  if (!row) return null;
  const snapshot = PartsSnapshot.parse(row.snapshot);
  return {
    revision: revisionLetter(row.number),
    endedAt: row.endedAt,
    editions: snapshot.editions,
    lines: snapshot.lines.map((line) => ({
      ...line,
      quantities: Object.fromEntries(line.quantities.map(({ edition, perKit }) => [edition, perKit])),
    })),
  };
}
