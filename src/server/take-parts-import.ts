import type { z } from "zod";
import type { FieldChange } from "#src/partslist/difference.ts";
import type { TakeBack, TakeList } from "#src/shapes/import.ts";
import { PARTS_MOST } from "#src/shapes/limits.ts";
import { revisionLetter } from "#src/shapes/revision-letter.ts";
import { type CostEffect, costEffect } from "./bring-in/cost-effect.ts";
import { seenStamp } from "./bring-in/difference-view.ts";
import { existingLines } from "./bring-in/existing-lines.ts";
import { draftAt, importAt } from "./bring-in/import-at.ts";
import { laterChanges } from "./bring-in/later-changes.ts";
import { type Before, openLedger } from "./bring-in/ledger.ts";
import { pricesFromOf, wantedOffers } from "./bring-in/list-offers.ts";
import type { Outcome } from "./bring-in/outcome.ts";
import type { PartsTaking } from "./bring-in/parts-summary.ts";
import { putBack } from "./bring-in/put-back.ts";
import { readAside } from "./bring-in/read-aside.ts";
import { type LineField, type TakenLine, takeLines } from "./bring-in/take-lines.ts";
import { takeOffers } from "./bring-in/take-offers.ts";
import { tryOut } from "./bring-in/try-out.ts";
import { noteChange } from "./note-change.ts";
import { type InKit, partsPlace, partsSource, partsTerms } from "./parts-import.ts";
import { planOf } from "./plan.ts";
import { Problem } from "./problem.ts";
import { endRevision } from "./revision.ts";
import { rememberMapping } from "./store/column-memory.ts";
import { type ImportRow, lastTaken, moveImport } from "./store/import.ts";
import { kitOf } from "./store/kit.ts";
import { inTransaction } from "./transaction.ts";

const FIELDS: Readonly<Partial<Record<FieldChange["field"], LineField>>> = {
  designators: "designators",
  quantity: "quantity",
  mark: "mark",
  note: "note",
};

function takenLines({ lines, difference }: PartsTaking): TakenLine[] {
  const changed = [...difference.changed, ...difference.revalued];
  const differs = new Map(
    changed.map(({ incoming, changes }) => [incoming, changes.map(({ field }) => FIELDS[field] ?? "part")]),
  );
  const pairs = [...changed, ...difference.unchanged];
  const existing = new Map(pairs.map(({ incoming, current }) => [incoming, current]));
  return lines.map(({ row, line }) => ({
    line,
    existing: existing.get(String(row)) ?? null,
    differs: differs.get(String(row)) ?? [],
  }));
}

function changesLines({ difference }: PartsTaking): boolean {
  const { added, removed, changed, revalued } = difference;
  return added.length + removed.length + changed.length + revalued.length > 0;
}

/** Does what taking a list does; to be called inside a transaction. */
function apply(given: InKit, row: ImportRow, taking: PartsTaking): { outcome: Outcome; before: Before } {
  const ledger = openLedger(given);
  const hadLines = taking.difference.removed.length + taking.lines.length > taking.difference.added.length;
  if (hadLines && changesLines(taking)) {
    const { ended } = endRevision(given, given.kit);
    ledger.before.revision = { id: ended.id, number: ended.number };
  }
  const { counts, partIds } = takeLines(ledger, given.kit.id, takenLines(taking), taking.difference.removed);
  const { wanted } = wantedOffers(taking.lines, pricesFromOf(row), partIds);
  const offers = takeOffers(ledger, wanted, partsTerms(given));
  return { outcome: { lines: counts, offers }, before: ledger.close() };
}

function refuseUnready(taking: PartsTaking): void {
  if (taking.mustRows.length > 0)
    throw new Problem("rows-to-settle", { parameters: { rows: taking.mustRows.slice(0, 10).join(", ") } });
  if (taking.lines.length > PARTS_MOST)
    throw new Problem("too-many-lines", { parameters: { lines: taking.lines.length, most: PARTS_MOST } });
}

/** Whether the list a reading was compared with still stands. */
function stillStands({ db, kit }: InKit, compared: string): boolean {
  return seenStamp(existingLines(db, kit.id)) === compared;
}

export interface Taken {
  outcome: Outcome;
  /** The revision the list now is. */
  revision: string;
}

/**
 * Takes a parts list in one step: all of it is written or nothing. What its person saw of the difference must
 * still be so.
 *
 * @throws Problem rows-to-settle, too-many-lines, difference-changed, changed-meanwhile, nothing-to-bring-in,
 * wrong-input for an offer that cannot be.
 */
export async function takePartsImport(
  given: InKit,
  id: string,
  input: z.infer<typeof TakeList>,
): Promise<Taken> {
  const row = draftAt(given, partsPlace(given), id, input.version);
  const source = partsSource(given, row);
  const compared = seenStamp(source.existing);
  const taking = await readAside("parts-taking", source, row.rowCount);
  refuseUnready(taking);
  if (taking.seen !== input.seen) throw new Problem("difference-changed");
  return inTransaction(given.db, () => {
    // The reading may have waited for another thread: the kit is looked up anew.
    const kit = kitOf(given.db, given.workshop.id, given.kit.id);
    if (!kit) throw new Problem("not-found");
    if (!stillStands(given, compared)) throw new Problem("difference-changed");
    const { outcome, before } = apply({ ...given, kit }, row, taking);
    return keepTaken(given, row, taking, outcome, before);
  });
}

function didNothing({ lines, offers }: Outcome): boolean {
  const ofLines = lines === null ? 0 : lines.added + lines.changed + lines.removed;
  return ofLines + offers.added + offers.changed + offers.confirmed === 0;
}

function keepTaken(
  given: InKit,
  row: ImportRow,
  taking: PartsTaking,
  outcome: Outcome,
  before: Before,
): Taken {
  const { db, now, user, workshop, kit } = given;
  if (didNothing(outcome)) throw new Problem("nothing-to-bring-in");
  const ending = { state: "taken", takenAt: now, takenBy: user.id, outcome, before } as const;
  if (!moveImport(db, row.id, "draft", row.version, ending)) throw new Problem("changed-meanwhile");
  rememberMapping(db, {
    workshopId: workshop.id,
    kind: row.kind,
    fingerprint: row.fingerprint,
    mapping: taking.mapping,
    usedAt: now,
  });
  noteChange(given, {
    action: "list.take",
    subjectId: row.id,
    subjectName: row.fileName,
    detail: { ...outcome },
  });
  return { outcome, revision: revisionLetter(kitOf(db, workshop.id, kit.id)?.revision ?? kit.revision) };
}

/** What taking the list as it reads now would do to the cost of one kit. Nothing is changed. */
export async function partsImportCost(given: InKit, id: string): Promise<CostEffect> {
  const { db, workshop, kit, now } = given;
  const row = draftAt(given, partsPlace(given), id);
  const source = partsSource(given, row);
  const taking = await readAside("parts-taking", source, row.rowCount);
  if (taking.lines.length > PARTS_MOST) refuseUnready({ ...taking, mustRows: [] });
  const asOf = new Date(now).toISOString().slice(0, 10);
  const before = planOf(db, workshop, kit, asOf);
  const after = tryOut(db, () => {
    apply(given, row, taking);
    return planOf(db, workshop, kit, asOf);
  });
  return costEffect(before, after);
}

/**
 * Takes a list back: what stood before stands again. Where something it touched was changed since, only when told to
 * do it even so.
 *
 * @throws Problem later-list-first, changed-since-taken (with what was changed), changed-meanwhile.
 */
export function takeBackPartsImport(given: InKit, id: string, input: z.infer<typeof TakeBack>): void {
  const { db, kit } = given;
  const place = partsPlace(given);
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
