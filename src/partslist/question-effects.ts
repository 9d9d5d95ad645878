import type { Answer, DraftLine, Facts, Question } from "./draft.ts";
import type { QuestionCode } from "./question-codes.ts";
import type { RowWork } from "./row-work.ts";

/** The rows of the list by row number, for answers that reach other rows. */
export type WorkByRow = ReadonlyMap<number, RowWork>;

interface Settling {
  work: RowWork;
  line: DraftLine;
  choice: string;
  typed: string | undefined;
  facts: Facts;
  rows: WorkByRow;
}
type Effect = (settling: Settling) => void;

function leaveOut(work: RowWork): void {
  work.line = null;
  work.reason = "left-out";
}

function setQuantity({ line, choice, typed, facts }: Settling): void {
  const to = (quantity: number | null) => {
    line.quantity = quantity;
    line.quantityFrom = quantity === null ? "nothing" : "answer";
  };
  if (choice === "use-designators") to(new Set(line.designators).size);
  else if (choice === "keep-quantity" || choice === "use-number" || choice === "use-quantity")
    to(Number(facts.quantity));
  else if (choice === "use-pack") to(Number(facts.pack));
  else if (choice === "use-one") to(1);
  else if (choice === "leave-open") to(null);
  else if (choice === "type" && /^\d{1,5}$/.test(typed?.trim() ?? "")) to(Number(typed));
}

function setMark(settling: Settling): void {
  const { line, choice, facts } = settling;
  if (choice !== "do-not-place") {
    if (choice === "leave-row-out") leaveOut(settling.work);
    else setQuantity(settling);
    return;
  }
  line.mark = "do-not-place";
  line.markFrom = String(facts.text ?? facts.quantity ?? "");
  if (line.designators.length > 0 && !line.quantity) line.quantity = new Set(line.designators).size;
}

function drop(line: DraftLine, names: ReadonlySet<string>): void {
  const before = line.designators.length;
  line.designators = line.designators.filter((name) => !names.has(name.toUpperCase()));
  const dropped = before - line.designators.length;
  if (line.quantity !== null && dropped > 0)
    line.quantity = Math.max(line.designators.length, line.quantity - dropped);
}

function settleTwoRows({ work, line, choice, facts, rows }: Settling): void {
  const names = new Set((facts.designators as readonly string[]).map((name) => name.toUpperCase()));
  const other = rows.get(Number(facts.otherRow));
  if (choice === "drop-here") drop(line, names);
  else if (choice === "drop-there" && other?.line) drop(other.line, names);
  else if (choice === "leave-row-out") leaveOut(work);
  else if (choice === "leave-other-out" && other) leaveOut(other);
}

function settlePrice({ line, choice, facts }: Settling): void {
  const offer = line.offers[0];
  if (offer === undefined || facts.per === undefined || choice === "leave-price-out") return;
  const currency = typeof facts.currency === "string" ? facts.currency : null;
  const price =
    choice === "read-from"
      ? { quantity: Number(facts.per), amount: String(facts.amount), currency }
      : { quantity: Number(facts.per), amount: String(facts.each), currency };
  offer.prices = [...offer.prices, price].sort((a, b) => a.quantity - b.quantity);
}

function settleDesignators({ line, choice }: Settling): void {
  if (choice === "no-designators") line.designators = [];
  else if (choice === "take-as-name") line.designators = [line.designatorText.replace(/\s+/g, "_")];
  else if (choice === "count-once") {
    line.designators = [...new Set(line.designators)];
    if (line.quantity !== null) line.quantity = line.designators.length;
  }
}

function leaveRowOut({ work, choice }: Settling): void {
  if (choice === "leave-row-out") leaveOut(work);
}

function settleValue({ work, line, choice }: Settling): void {
  if (choice === "leave-text") line.reading = null;
  else if (line.reading === null) line.reading = work.read?.bareValue ?? null;
}

function settleSpaces({ line, choice, facts }: Settling): void {
  if (choice === "new-line") line.value = String(facts.text);
}

const EFFECTS: Readonly<Partial<Record<QuestionCode, Effect>>> = {
  "quantity-mismatch": setQuantity,
  "quantity-missing": setQuantity,
  "quantity-not-a-number": setQuantity,
  "quantity-of-pack": setQuantity,
  "quantity-zero": setMark,
  "maybe-not-fitted": setMark,
  "designator-in-two-rows": settleTwoRows,
  "designator-twice-in-row": settleDesignators,
  "designator-unclear": settleDesignators,
  "price-unclear": settlePrice,
  "value-without-unit": settleValue,
  "spaces-only-difference": settleSpaces,
  "looks-like-total": leaveRowOut,
  "looks-like-remark": leaveRowOut,
  "hardly-a-part": leaveRowOut,
  "commented-out": leaveRowOut,
};

/** Carries out the answer to a question, or its suggestion while it is open, on its row and the rows that ask alike. */
export function settle(question: Question, answer: Answer | undefined, rows: WorkByRow): void {
  const effect = EFFECTS[question.code];
  if (effect === undefined) return;
  const choice = question.answer ?? question.suggested.choice;
  for (const row of [question.row, ...question.alsoRows]) {
    const work = rows.get(row);
    if (!work?.line) continue;
    effect({ work, line: work.line, choice, typed: answer?.typed, facts: question.facts, rows });
  }
}
