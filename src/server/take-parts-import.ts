import type { z } from "zod";
import type { FieldChange } from "#src/partslist/difference.ts";
import type { TakeBack, TakeList } from "#src/shapes/import.ts";
import { PARTS_MOST } from "#src/shapes/limits.ts";
import { revisionLetter } from "#src/shapes/revision-letter.ts";
import { type CostEffect, costEffect } from "./bring-in/cost-effect.ts";
import { seenStamp } from "./bring-in/difference-view.ts";
import { existingLines } from "./bring-in/existing-lines.ts";
import { draftAt } from "./bring-in/import-at.ts";
import { keepTaken, refuseUnsettled } from "./bring-in/keep-taken.ts";
import { type Before, openLedger } from "./bring-in/ledger.ts";
import { pricesFromOf, wantedOffers } from "./bring-in/list-offers.ts";
import type { Outcome } from "./bring-in/outcome.ts";
import type { PartsTaking } from "./bring-in/parts-summary.ts";
import { readAside } from "./bring-in/read-aside.ts";
import { takeBack } from "./bring-in/take-back.ts";
import { type LineField, type TakenLine, takeLines } from "./bring-in/take-lines.ts";
import { takeOffers } from "./bring-in/take-offers.ts";
import { tryOut } from "./bring-in/try-out.ts";
import { type InKit, partsPlace, partsSource, partsTerms } from "./parts-import.ts";
import { planOf } from "./plan.ts";
import { Problem } from "./problem.ts";
import { endRevision } from "./revision.ts";
import type { ImportRow } from "./store/import.ts";
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

function refuseTooMany(lines: number): void {
  if (lines > PARTS_MOST) throw new Problem("too-many-lines", { parameters: { lines, most: PARTS_MOST } });
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
  refuseUnsettled(taking.mustRows);
  refuseTooMany(taking.lines.length);
  if (taking.seen !== input.seen) throw new Problem("difference-changed");
  return inTransaction(given.db, () => {
    // The reading may have waited for another thread: the kit is looked up anew.
    const kit = kitOf(given.db, given.workshop.id, given.kit.id);
    if (!kit) throw new Problem("not-found");
    if (!stillStands(given, compared)) throw new Problem("difference-changed");
    const { outcome, before } = apply({ ...given, kit }, row, taking);
    keepTaken(given, row, taking.mapping, outcome, before);
    const revision = kitOf(given.db, given.workshop.id, kit.id)?.revision ?? kit.revision;
    return { outcome, revision: revisionLetter(revision) };
  });
}

/** What taking the list as it reads now would do to the cost of one kit. Nothing is changed. */
export async function partsImportCost(given: InKit, id: string): Promise<CostEffect> {
  const { db, workshop, kit, now } = given;
  const row = draftAt(given, partsPlace(given), id);
  const source = partsSource(given, row);
  const taking = await readAside("parts-taking", source, row.rowCount);
  refuseTooMany(taking.lines.length);
  const asOf = new Date(now).toISOString().slice(0, 10);
  const before = planOf(db, workshop, kit, asOf);
  const after = tryOut(db, () => {
    apply(given, row, taking);
    return planOf(db, workshop, kit, asOf);
  });
  return costEffect(before, after);
}

export function takeBackPartsImport(given: InKit, id: string, input: z.infer<typeof TakeBack>): void {
  takeBack(given, partsPlace(given), given.kit, id, input);
}
