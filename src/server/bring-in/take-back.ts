import type { z } from "zod";
import type { TakeBack } from "#src/shapes/import.ts";
import { type Changing, noteChange } from "../note-change.ts";
import { Problem } from "../problem.ts";
import { type ImportPlace, lastTaken, moveImport } from "../store/import.ts";
import type { KitRow } from "../store/kit.ts";
import { inTransaction } from "../transaction.ts";
import { importAt } from "./import-at.ts";
import { laterChanges } from "./later-changes.ts";
import type { Before } from "./ledger.ts";
import { putBack } from "./put-back.ts";

/**
 * Takes a list back: what stood before stands again. Where something it touched was changed since, only when told to
 * do it even so.
 *
 * @throws Problem later-list-first, changed-since-taken (with what was changed), changed-meanwhile.
 */
export function takeBack(
  given: Changing,
  place: ImportPlace,
  kit: KitRow | null,
  id: string,
  input: z.infer<typeof TakeBack>,
): void {
  const { db } = given;
  inTransaction(db, () => {
    const row = importAt(given, place, id);
    if (row.state !== "taken" || row.version !== input.version) throw new Problem("changed-meanwhile");
    const last = lastTaken(db, place);
    if (last && last.id !== row.id)
      throw new Problem("later-list-first", { parameters: { name: last.fileName } });
    const before = row.before as Before;
    const changes = laterChanges(given, kit, before);
    if (changes.length > 0 && !input.evenSo)
      throw new Problem("changed-since-taken", { current: { changes } });
    putBack(given, kit, before);
    moveImport(db, row.id, "taken", row.version, { state: "taken-back" });
    noteChange(given, { action: "list.take-back", subjectId: row.id, subjectName: row.fileName });
  });
}
