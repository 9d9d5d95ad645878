import { groupBy } from "#db/group-by.ts";
import { compareDesignators } from "#src/partslist/designators.ts";
import type { DraftLine } from "#src/partslist/draft.ts";
import { canBeSamePart, type PartFields, partChanges, partFields } from "#src/partslist/part-fields.ts";
import { editionsOf } from "../store/edition.ts";
import type { LineChange, LineQuantityRow, LineRow } from "../store/line.ts";
import { lineQuantitiesOf, linesOf, placeLine } from "../store/line.ts";
import type { PartRow } from "../store/part.ts";
import type { Ledger } from "./ledger.ts";
import { type PartShelf, partShelf } from "./part-shelf.ts";

/** A line of the list that is taken, in its order. */
export interface TakenLine {
  line: DraftLine;
  /** The line of the kit that it is; `null` for a new one. */
  existing: string | null;
  /** Fields of the kit's line that the list states otherwise; empty leaves the line as it is. */
  differs: readonly LineField[];
}
export type LineField = "designators" | "quantity" | "mark" | "note" | "part";

export interface LineCounts {
  added: number;
  changed: number;
  removed: number;
  same: number;
}

interface Work {
  ledger: Ledger;
  kitId: string;
  shelf: PartShelf;
  editionIds: string[];
  quantities: Map<string, LineQuantityRow[]>;
}

function newPart(work: Work, said: PartFields): PartRow {
  const part = work.ledger.addPart({ ...said, note: "", freeStock: 0, stockCost: null });
  work.shelf.put(part);
  return part;
}

/** A known part with what the list adds to it. */
function toldMore(work: Work, part: PartRow, said: PartFields): PartRow {
  const change = partChanges(part, said);
  if (Object.keys(change).length === 0) return part;
  const changed = work.ledger.changePart(part, change);
  work.shelf.put(changed);
  return changed;
}

function partFor(work: Work, said: PartFields): PartRow {
  return work.shelf.find(said) ?? newPart(work, said);
}

/** The part of a line that was there: the same where nothing contradicts, another where the value is. */
function partAgain(work: Work, partId: string, said: PartFields): PartRow {
  const old = work.shelf.byId(partId);
  return old && canBeSamePart(old, said) ? toldMore(work, old, said) : partFor(work, said);
}

function pieces(line: DraftLine): number {
  return line.quantity ?? 0;
}

function designatorText(line: DraftLine): string {
  return [...line.designators].sort(compareDesignators).join(", ");
}

function addLine(work: Work, line: DraftLine, position: number): PartRow {
  const part = partFor(work, partFields(line));
  work.ledger.addLine(
    {
      kitId: work.kitId,
      partId: part.id,
      position,
      designators: designatorText(line),
      mark: line.mark,
      note: line.note ?? "",
    },
    work.editionIds.map((editionId) => ({ editionId, perKit: pieces(line) })),
  );
  return part;
}

/** New quantities where an edition had what the others have; an edition without the line stays without it. */
function newQuantities(work: Work, row: LineRow, perKit: number): LineQuantityRow[] {
  const old = work.quantities.get(row.id) ?? [];
  const usual = Math.max(0, ...old.map((quantity) => quantity.perKit));
  if (old.length === 0)
    return work.editionIds.map((editionId) => ({
      workshopId: row.workshopId,
      lineId: row.id,
      editionId,
      perKit,
    }));
  return old.filter((quantity) => quantity.perKit === usual).map((quantity) => ({ ...quantity, perKit }));
}

function changeLine(work: Work, row: LineRow, { line, differs }: TakenLine): PartRow | undefined {
  const part = differs.includes("part")
    ? partAgain(work, row.partId, partFields(line))
    : work.shelf.byId(row.partId);
  const change: LineChange = {};
  if (part && part.id !== row.partId) change.partId = part.id;
  if (differs.includes("designators")) change.designators = designatorText(line);
  if (differs.includes("mark")) change.mark = line.mark;
  if (differs.includes("note")) change.note = line.note ?? "";
  const set = differs.includes("quantity") ? newQuantities(work, row, pieces(line)) : [];
  if (Object.keys(change).length > 0 || set.length > 0)
    work.ledger.changeLine(row, work.quantities.get(row.id) ?? [], change, set);
  return part;
}

/**
 * Takes the lines of a list into a kit: adds, changes and removes as told, and puts them in the list's order. Parts
 * are those of the workshop where it has the same, so that a part of several lines is bought once.
 *
 * @returns what was done, and the part of each taken line, for its offers.
 */
export function takeLines(
  ledger: Ledger,
  kitId: string,
  taken: readonly TakenLine[],
  removed: readonly string[],
): { counts: LineCounts; partIds: string[] } {
  const { db, workshop } = ledger.by;
  const work: Work = {
    ledger,
    kitId,
    shelf: partShelf(db, workshop.id),
    editionIds: editionsOf(db, kitId).map(({ id }) => id),
    quantities: groupBy(lineQuantitiesOf(db, kitId), (row) => row.lineId),
  };
  const rows = new Map(linesOf(db, kitId).map(({ line }) => [line.id, line]));
  const counts: LineCounts = { added: 0, changed: 0, removed: removed.length, same: 0 };
  for (const id of removed) {
    const row = rows.get(id);
    if (row) ledger.removeLine(row, work.quantities.get(id) ?? []);
  }
  const partIds = taken.map((one, place) => {
    const row = one.existing === null ? undefined : rows.get(one.existing);
    if (!row) {
      counts.added++;
      return addLine(work, one.line, place).id;
    }
    ledger.before.positions[row.id] = row.position;
    if (row.position !== place) placeLine(db, row.id, place);
    counts[one.differs.length > 0 ? "changed" : "same"]++;
    return changeLine(work, row, one)?.id ?? row.partId;
  });
  return { counts, partIds };
}
