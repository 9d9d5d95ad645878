import type { ImportState } from "#src/shapes/limits.ts";
import type { Changing } from "../note-change.ts";
import { type ImportHead, type ImportPlace, importsOf } from "../store/import.ts";
import { peopleOf } from "../store/membership.ts";
import type { Outcome } from "./outcome.ts";

/** A list as the page of lists names it. */
export interface ListedImport {
  id: string;
  version: number;
  name: string;
  rows: number;
  state: ImportState;
  createdAt: number;
  /** Names; `null` where the person is no longer in the workshop. */
  createdBy: string | null;
  takenAt: number | null;
  takenBy: string | null;
  outcome: Outcome | null;
  /** Only the list taken last: an earlier one lies under it. */
  canTakeBack: boolean;
}

const LISTED_MOST = 100;

/** The drafts and taken lists of a place, the newest first. Dropped ones are not named. */
export function listedImports(
  { db, workshop }: Pick<Changing, "db" | "workshop">,
  place: ImportPlace,
): ListedImport[] {
  const names = new Map(peopleOf(db, workshop.id).map(({ id, name }) => [id, name]));
  const rows = importsOf(db, place, LISTED_MOST).filter(({ state }) => state !== "dropped");
  const last = latest(rows);
  return rows.map((row) => ({
    id: row.id,
    version: row.version,
    name: row.fileName,
    rows: row.rowCount,
    state: row.state,
    createdAt: row.createdAt,
    createdBy: names.get(row.createdBy ?? "") ?? null,
    takenAt: row.takenAt,
    takenBy: names.get(row.takenBy ?? "") ?? null,
    outcome: row.outcome as Outcome | null,
    canTakeBack: row.id === last,
  }));
}

function latest(rows: ImportHead[]): string | undefined {
  const taken = rows.filter(({ state }) => state === "taken");
  return taken.sort((a, b) => (b.takenAt ?? 0) - (a.takenAt ?? 0) || (a.id < b.id ? 1 : -1))[0]?.id;
}
