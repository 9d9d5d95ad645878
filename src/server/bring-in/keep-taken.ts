import type { ColumnMapping } from "#src/partslist/mapping.ts";
import type { Changing } from "../note-change.ts";
import { noteChange } from "../note-change.ts";
import { Problem } from "../problem.ts";
import { rememberMapping } from "../store/column-memory.ts";
import { type ImportRow, moveImport } from "../store/import.ts";
import type { Before } from "./ledger.ts";
import type { Outcome } from "./outcome.ts";

function didNothing({ lines, offers }: Outcome): boolean {
  const ofLines = lines === null ? 0 : lines.added + lines.changed + lines.removed;
  return ofLines + offers.added + offers.changed + offers.confirmed === 0;
}

/**
 * Ends a draft as taken: with what stood before, what it did, and what its columns meant. Call it inside the
 * transaction that took it.
 *
 * @throws Problem nothing-to-bring-in where taking it changed nothing, changed-meanwhile where the draft moved on.
 */
export function keepTaken(
  given: Changing,
  row: ImportRow,
  mapping: ColumnMapping,
  outcome: Outcome,
  before: Before,
): void {
  const { db, now, user, workshop } = given;
  if (didNothing(outcome)) throw new Problem("nothing-to-bring-in");
  const ending = { state: "taken", takenAt: now, takenBy: user.id, outcome, before } as const;
  if (!moveImport(db, row.id, "draft", row.version, ending)) throw new Problem("changed-meanwhile");
  const { kind, fingerprint } = row;
  rememberMapping(db, { workshopId: workshop.id, kind, fingerprint, mapping, usedAt: now });
  noteChange(given, {
    action: "list.take",
    subjectId: row.id,
    subjectName: row.fileName,
    detail: { ...outcome },
  });
}

/** Refuses a list whose must-be-settled rows wait. */
export function refuseUnsettled(mustRows: readonly number[]): void {
  if (mustRows.length > 0)
    throw new Problem("rows-to-settle", { parameters: { rows: mustRows.slice(0, 10).join(", ") } });
}
