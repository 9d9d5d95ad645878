import { guessColumns } from "./columns.ts";
import type { Answer, ReadPrice } from "./draft.ts";
import { type ListColumns, listColumns } from "./list-columns.ts";
import type { ColumnGuesses, ColumnMapping } from "./mapping.ts";
import { indexParts, type PartIndex } from "./match-part.ts";
import { askLadder, askPart, askPrice } from "./offer-questions.ts";
import type { KnownPart, PriceDraft, PriceReadResult, PriceRow } from "./price-draft.ts";
import { draftOf, keyOf } from "./price-row.ts";
import type { PriceProblem } from "./read-offers.ts";
import { type ListShape, listShape, rowKind } from "./row-kind.ts";
import { type Answers, indexAnswers, type RowWork } from "./row-work.ts";
import type { SheetRecord } from "./sheet.ts";

export interface ReadPricesInput {
  records: readonly SheetRecord[];
  mapping: ColumnMapping;
  answers: readonly Answer[];
  parts: readonly KnownPart[];
  /** The supplier whose list it is, where no column says. */
  supplier: string | null;
}

/** As `guessColumns`, for a price list: a quantity column tells from how many pieces a price holds. */
export function guessPriceColumns(records: readonly SheetRecord[], header?: number | null): ColumnGuesses {
  const guesses = guessColumns(records, header);
  const hasBreaks = guesses.columns.some(
    (one) => one.meaning === "break-quantity" || one.meaning === "price-break",
  );
  return {
    ...guesses,
    columns: guesses.columns.map((one) =>
      one.meaning === "quantity" && !hasBreaks ? { ...one, meaning: "break-quantity" } : one,
    ),
  };
}

interface PriceWork extends RowWork {
  kind: PriceRow["kind"];
  offer: PriceDraft | null;
  /** The row of the offer this row is a break of. */
  breakOf: PriceWork | null;
  problems: PriceProblem[];
}

/**
 * Reads a supplier's price list: one row to a break (rows of the same order code or part number, or rows
 * that leave the name out, belong together), or breaks in columns. Each offer is matched to a part of the
 * workshop by order code, part number, or value and package; what cannot be matched, or a ladder that
 * contradicts itself, is a question. Every record ends as an offer, a break of an offer above, a skipped
 * row or a question.
 */
export function readPrices(input: ReadPricesInput): PriceReadResult {
  const columns = listColumns(input.mapping);
  const answers = indexAnswers(input.answers);
  const shape = listShape(input.records, columns);
  const works: PriceWork[] = [];
  const open = new Map<string, PriceWork>();
  for (const record of input.records)
    works.push(startRow(record, shape, columns, input.supplier, open, works.at(-1)));
  const index = indexParts(input.parts);
  for (const work of works)
    if (work.kind === "offer" && work.offer) finishOffer(work, work.offer, index, answers);
  const rows = works.map(rowOf);
  return { rows, counts: countRows(rows) };
}

function startRow(
  record: SheetRecord,
  shape: ListShape,
  columns: ListColumns,
  supplier: string | null,
  open: Map<string, PriceWork>,
  above: PriceWork | undefined,
): PriceWork {
  const { draft, problems } = draftOf(record, columns, supplier);
  const work: PriceWork = {
    record,
    line: null,
    reason: null,
    read: null,
    questions: [],
    kind: "offer",
    offer: draft,
    breakOf: null,
    problems,
  };
  const kind = rowKind(record, shape);
  const key = keyOf(draft);
  const continues =
    key === null &&
    (draft.breaks.length > 0 || problems.length > 0) &&
    above !== undefined &&
    above.kind !== "skipped";
  const into =
    key === null ? (continues ? (above?.breakOf ?? above ?? null) : null) : (open.get(key) ?? null);
  if (into?.offer && kind.kind !== "skip") return joinInto(work, into, into.offer);
  if (kind.kind === "skip" || key === null)
    return {
      ...work,
      kind: "skipped",
      offer: null,
      reason:
        kind.kind === "skip"
          ? kind.reason
          : kind.kind === "doubtful" && kind.code === "looks-like-total"
            ? "total"
            : "remark",
    };
  open.set(key, work);
  return work;
}

function joinInto(work: PriceWork, into: PriceWork, offer: PriceDraft): PriceWork {
  offer.rows.push(work.record.row);
  offer.breaks.push(...(work.offer?.breaks ?? []));
  into.problems.push(...work.problems);
  return { ...work, kind: "break", breakOf: into };
}

function finishOffer(work: PriceWork, offer: PriceDraft, index: PartIndex, answers: Answers): void {
  const settled = [
    askPrice(work, work.problems[0], offer, answers),
    askLadder(work, offer, answers),
    askPart(work, offer, index, answers),
  ];
  if (settled.includes("leave-row-out")) work.offer = null;
}

function rowOf(work: PriceWork): PriceRow {
  const text = work.record.cells
    .map((cell) => cell.trim())
    .filter((cell) => cell !== "")
    .join(" · ")
    .slice(0, 200);
  const place = { row: work.record.row, record: work.record.record, text, questions: work.questions };
  if (work.kind === "break") return { ...place, kind: "break", into: work.breakOf?.record.row ?? 0 };
  if (work.questions.some((question) => question.answer === null))
    return { ...place, kind: "question", offer: work.offer };
  if (work.offer !== null) return { ...place, kind: "offer", offer: sorted(work.offer) };
  return { ...place, kind: "skipped", reason: work.reason ?? "left-out" };
}

function sorted(offer: PriceDraft): PriceDraft {
  const byQuantity = (a: ReadPrice, b: ReadPrice) => a.quantity - b.quantity;
  return { ...offer, breaks: [...offer.breaks].sort(byQuantity) };
}

function countRows(rows: readonly PriceRow[]): PriceReadResult["counts"] {
  const counts = { rows: rows.length, offers: 0, breaks: 0, skipped: 0, questions: 0, must: 0, look: 0 };
  for (const row of rows) {
    if (row.kind === "offer") counts.offers++;
    else if (row.kind === "break") counts.breaks++;
    else if (row.kind === "skipped") counts.skipped++;
    else counts.questions++;
    for (const question of row.questions) if (question.answer === null) counts[question.level]++;
  }
  return counts;
}
