import type { PricesFrom } from "#src/shapes/import.ts";
import type { Changing } from "../note-change.ts";
import { Problem, wrongField } from "../problem.ts";
import {
  changeDraft,
  type DraftChange,
  type ImportPlace,
  type ImportRow,
  importOf,
  moveImport,
} from "../store/import.ts";
import { supplierOf } from "../store/supplier.ts";

const STATE_WORDS: Readonly<Record<ImportRow["state"], string>> = {
  draft: "begun",
  taken: "brought in",
  "taken-back": "taken back",
  dropped: "dropped",
};

/** An import of this place, whatever became of it. A dropped one is gone. */
export function importAt({ db }: Changing, place: ImportPlace, id: string): ImportRow {
  const row = importOf(db, place, id);
  if (!row || row.state === "dropped") throw new Problem("not-found");
  return row;
}

/** A draft of this place, with the version its person has seen; any version where none is named. */
export function draftAt(given: Changing, place: ImportPlace, id: string, seen?: number): ImportRow {
  const row = importAt(given, place, id);
  if (row.state !== "draft")
    throw new Problem("no-draft-any-more", { parameters: { state: STATE_WORDS[row.state] } });
  if (seen !== undefined && row.version !== seen)
    throw new Problem("changed-meanwhile", { current: { version: row.version } });
  return row;
}

/** Drops a draft: its text goes at once. */
export function dropDraft(given: Changing, place: ImportPlace, id: string, seen: number): void {
  const row = draftAt(given, place, id, seen);
  if (!moveImport(given.db, row.id, "draft", seen, { state: "dropped", content: "" }))
    throw new Problem("changed-meanwhile");
}

/** Writes an edit into a draft, unless somebody else did first. */
export function writeDraft({ db }: Changing, row: ImportRow, change: DraftChange): void {
  if (!changeDraft(db, row.id, row.version, change)) throw new Problem("changed-meanwhile");
}

/** Whose the prices are after an edit, held against the suppliers there are. */
export function pricesFromAfter(
  { db, workshop }: Changing,
  row: ImportRow,
  chosen: PricesFrom | null | undefined,
): Pick<ImportRow, "supplierId" | "supplierName"> {
  if (chosen === undefined) return { supplierId: row.supplierId, supplierName: row.supplierName };
  if (chosen === null) return { supplierId: null, supplierName: null };
  if ("name" in chosen) return { supplierId: null, supplierName: chosen.name };
  if (!supplierOf(db, workshop.id, chosen.id))
    throw wrongField("pricesFrom.id", "This supplier is no longer there. Choose another.");
  return { supplierId: chosen.id, supplierName: null };
}
