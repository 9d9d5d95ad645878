import { guessColumns } from "./columns.ts";
import type { Answer, Question, ReadPrice } from "./draft.ts";
import { readLeadTime } from "./lead-time.ts";
import { cellAt, type ListColumns, listColumns, textAt } from "./list-columns.ts";
import type { ColumnGuesses, ColumnMapping } from "./mapping.ts";
import { indexParts, type Match, matchPart, type PartIndex } from "./match-part.ts";
import type { KnownPart, PriceDraft, PriceReadResult, PriceRow } from "./price-draft.ts";
import { checkLadder, mendLadder } from "./price-ladder.ts";
import { askAboutPrice } from "./price-question.ts";
import { readQuantity } from "./quantities.ts";
import { type PriceProblem, readOffers } from "./read-offers.ts";
import { type ListShape, listShape, rowKind } from "./row-kind.ts";
import { type Answers, ask, indexAnswers, type RowWork } from "./row-work.ts";
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

/** Rows of one supplier with the same order code, else part number, else description, are one offer. */
function keyOf(draft: PriceDraft): string | null {
  const name = draft.orderCode ?? draft.partNumber ?? draft.value ?? draft.description;
  return name === null
    ? null
    : `${draft.supplier ?? ""}\u001f${name.toUpperCase()}\u001f${draft.orderCode === null ? (draft.package ?? "") : ""}`;
}

function draftOf(
  record: SheetRecord,
  columns: ListColumns,
  supplier: string | null,
): { draft: PriceDraft; problems: PriceProblem[] } {
  const { cells, row } = record;
  const { offers, problems } = readOffers(cells, columns);
  const [offer] = offers;
  const leadTime = columns.first("lead-time");
  const inWeeks = /week|woche|semaine|semana|týd|tyg/i.test(columns.all("lead-time")[0]?.heading ?? "");
  const draft: PriceDraft = {
    rows: [row],
    supplier: offer?.supplier ?? textAt(cells, columns.first("supplier")) ?? supplier,
    orderCode: offer?.orderCode ?? null,
    manufacturer: textAt(cells, columns.first("manufacturer")),
    partNumber: textAt(cells, columns.first("part-number")),
    description: textAt(cells, columns.first("description")),
    value: textAt(cells, columns.first("value")),
    package: textAt(cells, columns.first("package")),
    currency: offer?.prices[0]?.currency ?? columns.currency,
    breaks: offer?.prices ?? [],
    minimumOrder: countAt(cells, columns, "minimum-order"),
    orderMultiple: countAt(cells, columns, "order-multiple"),
    stockShown: countAt(cells, columns, "stock"),
    leadTimeDays: leadTime === null ? null : readLeadTime(cellAt(cells, leadTime), inWeeks),
    part: null,
    matchedBy: null,
  };
  return { draft, problems };
}

function countAt(
  cells: readonly string[],
  columns: ListColumns,
  meaning: "minimum-order" | "order-multiple" | "stock",
): number | null {
  const column = columns.first(meaning);
  const read = readQuantity(
    cellAt(cells, column).replace(/^[>≥<≤+]\s*|\s*\+$/g, ""),
    column === null ? null : columns.mark(column),
  );
  return read.kind === "number" || read.kind === "measure" ? read.quantity : null;
}

function finishOffer(work: PriceWork, offer: PriceDraft, index: PartIndex, answers: Answers): void {
  const settled = [
    askPrice(work, offer, answers),
    askLadder(work, offer, answers),
    askPart(work, offer, index, answers),
  ];
  if (settled.includes("leave-row-out")) work.offer = null;
}

/** The choice that holds for a question: the answer, else the suggestion. */
function choiceOf(question: Question): string {
  return question.answer ?? question.suggested.choice;
}

function askPrice(work: PriceWork, offer: PriceDraft, answers: Answers): string | null {
  const [problem] = work.problems;
  if (problem === undefined) {
    if (offer.breaks.length > 0) return null;
    return choiceOf(
      ask(
        work,
        {
          code: "price-missing",
          level: "look",
          columns: [],
          facts: {},
          choices: ["keep-offer", "leave-row-out"],
        },
        answers,
      ),
    );
  }
  const { per } = problem;
  const choice = choiceOf(askAboutPrice(work, problem, offer.breaks, answers));
  if (per !== null && choice !== "leave-price-out")
    offer.breaks.push({
      quantity: per.per,
      amount: choice === "read-from" ? per.amount : per.each,
      currency: per.currency ?? offer.currency,
    });
  return choice;
}

function askLadder(work: PriceWork, offer: PriceDraft, answers: Answers): string | null {
  const { breaks, problem } = checkLadder(offer.breaks);
  offer.breaks = breaks;
  if (problem === null) return null;
  const { code, ...facts } = problem;
  const must = code === "ladder-not-rising";
  const choices = must
    ? ["keep-lower", "keep-higher", "leave-row-out"]
    : ["keep-prices", "drop-step", "leave-row-out"];
  const choice = choiceOf(
    ask(
      work,
      {
        code,
        level: must ? "must" : "look",
        columns: [],
        facts: { ...facts, currency: offer.currency },
        choices,
      },
      answers,
    ),
  );
  offer.breaks = mendLadder(breaks, problem, choice);
  return choice;
}

/** A person may name any part of the workshop, not only those offered: `take-part:<id>`. */
function askPart(work: PriceWork, offer: PriceDraft, index: PartIndex, answers: Answers): string | null {
  const match = matchPart(offer, index);
  if (match.kind === "one") {
    offer.part = match.part.id;
    offer.matchedBy = match.by;
    return null;
  }
  const question = askWhichPart(work, offer, match, index, answers);
  const id = choiceOf(question).replace(/^take-part:/, "");
  if (!index.byId.has(id)) return choiceOf(question);
  offer.part = id;
  offer.matchedBy = "answer";
  return null;
}

function askWhichPart(
  work: PriceWork,
  offer: PriceDraft,
  match: Match & { kind: "several" | "none" },
  index: PartIndex,
  answers: Answers,
): Question {
  const offered = match.kind === "several" ? match.parts : match.near;
  const code = match.kind === "several" ? "part-found-twice" : "part-not-found";
  const given = answers.get(`${work.record.row} ${code}`)?.choice ?? "";
  const named = index.byId.get(given.replace(/^take-part:/, ""));
  const parts = named && !offered.includes(named) ? [...offered, named] : offered;
  const facts = {
    text:
      [offer.orderCode, offer.partNumber, offer.value, offer.description].find((text) => text !== null) ?? "",
    names: parts.map((part) => part.name),
  };
  const choices = ["leave-row-out", ...parts.map((part) => `take-part:${part.id}`)];
  const question = ask(work, { code, level: "look", columns: [], facts, choices }, answers);
  question.alternatives = question.alternatives.map((choice) => ({
    choice: choice.choice,
    facts: { name: index.byId.get(choice.choice.replace(/^take-part:/, ""))?.name ?? "" },
  }));
  return question;
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
