import type { PartChange } from "#src/server/store/part.ts";
import { newId } from "../new-id.ts";
import type { Changing } from "../note-change.ts";
import {
  addLineQuantities,
  addLines,
  changeLine,
  type LineChange,
  type LineQuantityRow,
  type LineRow,
  type NewLine,
  removeLines,
  setLineQuantities,
} from "../store/line.ts";
import { addOffers, changeOffer, type OfferRow, type OfferWithBreaks } from "../store/offer.ts";
import { addParts, changePart, type PartRow } from "../store/part.ts";
import { addSupplier, type SupplierRow } from "../store/supplier.ts";

/** What stood before a list was taken, and what it left behind: enough to put everything back. */
export interface Before {
  /** Rows that were changed or removed, as they were. */
  lines: { line: LineRow; quantities: LineQuantityRow[] }[];
  /** Places of the lines that stayed. */
  positions: Record<string, number>;
  parts: PartRow[];
  offers: OfferWithBreaks[];
  /** Ids of what was added. */
  added: { lines: string[]; parts: string[]; offers: string[]; suppliers: string[] };
  /** The revision that ended, `null` where the list was the first. */
  revision: { id: string; number: number } | null;
  /** Versions of every row it touched, as it left them. */
  left: {
    lines: Record<string, number>;
    parts: Record<string, number>;
    offers: Record<string, number>;
    suppliers: Record<string, number>;
  };
}

/**
 * Writes what a list brings in and keeps the book of it. Rows that are added wait until `close`, so that
 * thousands go in together.
 */
export interface Ledger {
  by: Changing;
  before: Before;
  addPart(fields: Omit<PartRow, "id" | "workshopId" | "version" | "createdAt">): PartRow;
  changePart(part: PartRow, change: PartChange): PartRow;
  addLine(
    line: Omit<NewLine, "id" | "workshopId">,
    quantities: { editionId: string; perKit: number }[],
  ): void;
  changeLine(line: LineRow, quantities: LineQuantityRow[], change: LineChange, set: LineQuantityRow[]): void;
  removeLine(line: LineRow, quantities: LineQuantityRow[]): void;
  addSupplier(name: string, currency: string): SupplierRow;
  addOffer(
    fields: Omit<OfferRow, "id" | "workshopId" | "version">,
    breaks: OfferWithBreaks["breaks"],
  ): OfferWithBreaks;
  changeOffer(
    offer: OfferWithBreaks,
    change: Partial<OfferRow>,
    breaks: OfferWithBreaks["breaks"],
  ): OfferWithBreaks;
  /** Writes what waits. */
  close(): Before;
}

function emptyBefore(): Before {
  return {
    lines: [],
    positions: {},
    parts: [],
    offers: [],
    added: { lines: [], parts: [], offers: [], suppliers: [] },
    revision: null,
    left: { lines: {}, parts: {}, offers: {}, suppliers: {} },
  };
}

/** A row that was read in this transaction and has another version now: only a mistake of ours can do that. */
function must<T>(row: T | undefined): T {
  if (row === undefined) throw new Error("A row changed inside the transaction that read it.");
  return row;
}

/** Parts: added ones wait, a change of a waiting one changes what waits. */
function partBook({ db, workshop, now }: Changing, before: Before) {
  const waiting = new Map<string, PartRow>();
  return {
    add(fields: Omit<PartRow, "id" | "workshopId" | "version" | "createdAt">): PartRow {
      const part = { ...fields, id: newId(), workshopId: workshop.id, version: 1, createdAt: now };
      waiting.set(part.id, part);
      before.added.parts.push(part.id);
      before.left.parts[part.id] = 1;
      return part;
    },
    change(part: PartRow, change: PartChange): PartRow {
      if (waiting.has(part.id)) {
        const changed = { ...part, ...change };
        waiting.set(part.id, changed);
        return changed;
      }
      if (!(part.id in before.left.parts)) before.parts.push(part);
      const changed = must(changePart(db, workshop.id, part.id, part.version, change));
      before.left.parts[part.id] = changed.version;
      return changed;
    },
    write: () => addParts(db, [...waiting.values()]),
  };
}

/** Lines: additions and changes wait until the parts they point to are written. */
function lineBook({ db, workshop }: Changing, before: Before) {
  const added: NewLine[] = [];
  const quantities: LineQuantityRow[] = [];
  const changes: (() => void)[] = [];
  return {
    add(line: Omit<NewLine, "id" | "workshopId">, perKit: { editionId: string; perKit: number }[]): void {
      const id = newId();
      added.push({ ...line, id, workshopId: workshop.id });
      for (const quantity of perKit) quantities.push({ ...quantity, lineId: id, workshopId: workshop.id });
      before.added.lines.push(id);
      before.left.lines[id] = 1;
    },
    change(line: LineRow, old: LineQuantityRow[], change: LineChange, set: LineQuantityRow[]): void {
      before.lines.push({ line, quantities: old });
      before.left.lines[line.id] = line.version + 1;
      changes.push(() => {
        must(changeLine(db, line.kitId, line.id, line.version, change));
        setLineQuantities(db, set);
      });
    },
    remove(line: LineRow, old: LineQuantityRow[]): void {
      before.lines.push({ line, quantities: old });
      removeLines(db, line.kitId, [line.id]);
    },
    write(): void {
      addLines(db, added);
      addLineQuantities(db, quantities);
      for (const change of changes) change();
    },
  };
}

function offerBook({ db, workshop }: Changing, before: Before) {
  const waiting = new Map<string, OfferWithBreaks>();
  return {
    addSupplier(name: string, currency: string): SupplierRow {
      const terms = { freightTerm: "not-known", handlingFee: "0", smallOrderTerm: "none", note: "" } as const;
      const supplier = addSupplier(db, { id: newId(), workshopId: workshop.id, name, currency, ...terms });
      before.added.suppliers.push(supplier.id);
      before.left.suppliers[supplier.id] = supplier.version;
      return supplier;
    },
    add(
      fields: Omit<OfferRow, "id" | "workshopId" | "version">,
      breaks: OfferWithBreaks["breaks"],
    ): OfferWithBreaks {
      const added = { offer: { ...fields, id: newId(), workshopId: workshop.id, version: 1 }, breaks };
      waiting.set(added.offer.id, added);
      before.added.offers.push(added.offer.id);
      before.left.offers[added.offer.id] = 1;
      return added;
    },
    change(
      old: OfferWithBreaks,
      change: Partial<OfferRow>,
      breaks: OfferWithBreaks["breaks"],
    ): OfferWithBreaks {
      if (waiting.has(old.offer.id)) {
        const changed = { offer: { ...old.offer, ...change }, breaks };
        waiting.set(changed.offer.id, changed);
        return changed;
      }
      before.offers.push(old);
      const offer = must(changeOffer(db, old.offer.id, old.offer.version, change, breaks));
      before.left.offers[offer.id] = offer.version;
      return { offer, breaks };
    },
    write: () => addOffers(db, [...waiting.values()]),
  };
}

/** Opens the book of one taking; to be used inside its transaction. */
export function openLedger(by: Changing): Ledger {
  const before = emptyBefore();
  const [part, line, offer] = [partBook(by, before), lineBook(by, before), offerBook(by, before)];
  return {
    by,
    before,
    addPart: part.add,
    changePart: part.change,
    addLine: line.add,
    changeLine: line.change,
    removeLine: line.remove,
    addSupplier: offer.addSupplier,
    addOffer: offer.add,
    changeOffer: offer.change,
    close() {
      part.write();
      line.write();
      offer.write();
      return before;
    },
  };
}
