import type { DraftLine } from "./draft.ts";
import type { QuestionContext } from "./line-questions.ts";
import { ask, type RowWork } from "./row-work.ts";

/** Finds designators that stand in two rows, and asks at the later one. Rows that repeat a name alike ask once. */
export function askAboutTwoRows(works: readonly RowWork[], context: QuestionContext): void {
  const seen = new Map<string, RowWork>();
  const asked = new Map<string, RowWork>();
  const column = context.columns.first("designators");
  for (const work of works) {
    const line = work.line;
    if (line === null) continue;
    let clashes: Map<RowWork, string[]> | null = null;
    for (const name of line.designators) {
      const key = name.toUpperCase();
      const other = seen.get(key);
      if (other === undefined) seen.set(key, work);
      else if (other !== work) {
        clashes ??= new Map();
        const names = clashes.get(other) ?? [];
        if (!names.includes(name)) clashes.set(other, [...names, name]);
      }
    }
    if (clashes === null) continue;
    const first = [...clashes][0];
    if (first === undefined) continue;
    const designators = [...clashes.values()].flat();
    askAboutClash(work, first[0], designators, { column, asked, seen, context });
  }
}

interface Clashing {
  column: number | null;
  /** First row that asked about the same designators of the same row. */
  asked: Map<string, RowWork>;
  /** First row of each designator. */
  seen: ReadonlyMap<string, RowWork>;
  context: QuestionContext;
}

function askAboutClash(
  work: RowWork,
  other: RowWork,
  designators: string[],
  { column, asked, seen, context }: Clashing,
): void {
  const key = `${other.record.row} ${designators.join(",")}`;
  const first = asked.get(key);
  if (first !== undefined) {
    first.questions
      .find((question) => question.code === "designator-in-two-rows")
      ?.alsoRows.push(work.record.row);
    return;
  }
  asked.set(key, work);
  const facts = { designators, row: work.record.row, otherRow: other.record.row };
  const choices =
    work.line?.designators.length === 1 && skipsANumber(designators, seen)
      ? ["keep-both", "leave-row-out"]
      : choicesFor(work.line, other.line, designators);
  ask(
    work,
    {
      code: "designator-in-two-rows",
      level: "look",
      columns: column === null ? [] : [column],
      facts,
      choices,
    },
    context.answers,
  );
}

/** R4, R6, R6: the number before is missing, so the name is more likely a slip than the row a repetition. */
function skipsANumber(designators: readonly string[], seen: ReadonlyMap<string, RowWork>): boolean {
  const found = designators.length === 1 ? /^(\D+)(\d+)$/.exec(designators[0] ?? "") : null;
  const number = Number(found?.[2] ?? 0);
  return number > 1 && !seen.has(`${found?.[1]}${number - 1}`.toUpperCase());
}

/** A row that is nothing but the repetition of another is suggested for leaving out; two different parts are both kept. */
function choicesFor(
  line: DraftLine | null,
  other: DraftLine | null,
  designators: readonly string[],
): string[] {
  if (line === null || other === null) return ["keep-both"];
  const whole = new Set(line.designators).size === designators.length;
  if (!whole) return ["drop-here", "drop-there", "keep-both"];
  if (!designators.every((name) => /\d$/.test(name)))
    return ["keep-both", "leave-row-out", "leave-other-out"];
  const covered = designators.length === new Set(other.designators).size || !sameText(line, other);
  if (sameText(line, other) && line.quantity === other.quantity) return ["leave-row-out", "keep-both"];
  return covered
    ? ["keep-both", "leave-row-out", "leave-other-out"]
    : ["leave-row-out", "drop-there", "keep-both"];
}

function sameText(a: DraftLine, b: DraftLine): boolean {
  return (
    a.value === b.value &&
    a.description === b.description &&
    a.package === b.package &&
    a.partNumber === b.partNumber
  );
}
