import { repeatedDesignators } from "./designators.ts";
import type { DraftLine, ExistingLine } from "./draft.ts";
import type { ListColumns } from "./list-columns.ts";
import { askAboutPrice } from "./price-question.ts";
import type { ReadLine } from "./read-line.ts";
import { type Answers, ask, type RowWork } from "./row-work.ts";
import { formatReading } from "./value-format.ts";

/** What the questions of single rows share: answers given, columns, and rows that ask alike. */
export interface QuestionContext {
  answers: Answers;
  columns: ListColumns;
  existing: ReadonlyMap<string, ExistingLine>;
  /** First row that asked, by what it asked. */
  asked: Map<string, RowWork>;
}

const column = (at: number | null): number[] => (at === null ? [] : [at]);

/**
 * The questions one row raises. Where many rows would ask the same, only the first asks and names the
 * others, and its answer holds for all.
 */
export function askAboutLine(work: RowWork, read: ReadLine, context: QuestionContext): void {
  askQuantity(work, read, context);
  askDesignators(work, read, context);
  askValue(work, read, context);
  askMark(work, read, context);
  const [priceProblem] = read.priceProblems;
  if (priceProblem !== undefined)
    askAboutPrice(work, priceProblem, work.line?.offers[0]?.prices ?? [], context.answers);
  askSpaces(work, context);
  askHardlyAPart(work, context);
}

function askOnce(work: RowWork, key: string, context: QuestionContext, raise: () => void): void {
  const first = context.asked.get(key);
  if (first === undefined) {
    context.asked.set(key, work);
    raise();
    return;
  }
  const code = key.slice(0, key.indexOf(":"));
  first.questions.find((question) => question.code === code)?.alsoRows.push(work.record.row);
}

function askQuantity(work: RowWork, read: ReadLine, context: QuestionContext): void {
  const { line, quantity } = read;
  const columns = column(context.columns.first("quantity"));
  const designators = line.designators.length;
  const counted = new Set(line.designators).size;
  if (quantity.kind === "of-pack") {
    const facts = {
      text: `${quantity.quantity} of ${quantity.pack}`,
      quantity: quantity.quantity,
      pack: quantity.pack,
    };
    ask(
      work,
      {
        code: "quantity-of-pack",
        level: "look",
        columns,
        facts,
        choices: ["use-quantity", "use-pack", "type"],
      },
      context.answers,
    );
  } else if (quantity.kind === "measure" || quantity.kind === "word") {
    const number = quantity.kind === "measure" ? quantity.quantity : null;
    const facts = { text: quantity.text, quantity: number, designators };
    const choices =
      designators > 0
        ? ["use-designators", "leave-open", "type"]
        : number === null
          ? ["leave-open", "use-one", "type"]
          : ["use-number", "use-one", "leave-open", "type"];
    ask(work, { code: "quantity-not-a-number", level: "look", columns, facts, choices }, context.answers);
  } else if (quantity.kind === "empty" && designators === 0) {
    askOnce(work, "quantity-missing:", context, () => {
      ask(
        work,
        { code: "quantity-missing", level: "look", columns, facts: {}, choices: ["use-one", "leave-open"] },
        context.answers,
      );
    });
  } else if (quantity.kind === "number") askCount(work, quantity.quantity, designators, counted, context);
}

function askCount(
  work: RowWork,
  quantity: number,
  designators: number,
  counted: number,
  context: QuestionContext,
): void {
  const columns = [
    ...column(context.columns.first("quantity")),
    ...column(context.columns.first("designators")),
  ];
  const facts = { quantity, designators: counted };
  if (quantity === 0) {
    const choices = [
      "do-not-place",
      ...(designators > 0 ? ["use-designators"] : ["use-one"]),
      "leave-row-out",
    ];
    ask(work, { code: "quantity-zero", level: "look", columns, facts, choices }, context.answers);
  } else if (designators > 0 && quantity !== designators && quantity !== counted) {
    const unclear = (work.read?.unclear.length ?? 0) > 0;
    const choices = unclear
      ? ["keep-quantity", "use-designators", "type"]
      : ["use-designators", "keep-quantity", "type"];
    ask(work, { code: "quantity-mismatch", level: "must", columns, facts, choices }, context.answers);
  }
}

function askDesignators(work: RowWork, read: ReadLine, context: QuestionContext): void {
  const columns = column(context.columns.first("designators"));
  const repeated = repeatedDesignators(read.line.designators);
  if (repeated.length > 0) {
    const facts = {
      designators: repeated,
      all: read.line.designators.length,
      once: new Set(read.line.designators).size,
    };
    const agree = read.quantity.kind === "number" && read.quantity.quantity === facts.all;
    const choices = agree ? ["keep-all", "count-once"] : ["count-once", "keep-all"];
    ask(work, { code: "designator-twice-in-row", level: "look", columns, facts, choices }, context.answers);
  }
  if (read.unclear.length > 0) {
    const facts = {
      text: read.line.designatorText,
      unclear: read.unclear,
      designators: read.line.designators,
    };
    const choices =
      read.line.designators.length > 0 ? ["take-read", "no-designators"] : ["no-designators", "take-as-name"];
    ask(work, { code: "designator-unclear", level: "look", columns, facts, choices }, context.answers);
  }
}

function askValue(work: RowWork, read: ReadLine, context: QuestionContext): void {
  const { line, bareValue } = read;
  const taken =
    bareValue ??
    (line.class !== "resistor" && line.class !== "potentiometer" && line.reading?.unitWritten === false
      ? line.reading
      : null);
  if (taken === null || line.value === null) return;
  const slipped = bareValue !== null && /[^\d.,\s]/.test(line.value);
  const facts = { text: line.value, reading: formatReading(taken), slipped: slipped ? 1 : 0 };
  askOnce(work, `value-without-unit:${line.class} ${line.value}`, context, () => {
    ask(
      work,
      {
        code: "value-without-unit",
        level: "look",
        columns: column(context.columns.first("value")),
        facts,
        choices: ["read-as", "leave-text"],
      },
      context.answers,
    );
  });
}

function askMark(work: RowWork, read: ReadLine, context: QuestionContext): void {
  const maybe = read.maybeMark;
  if (maybe === null || (work.line?.mark ?? "in-kit") !== "in-kit") return;
  const facts = { text: maybe.text, heading: context.columns.all("place")[0]?.heading ?? "" };
  const choices = maybe.fromColumn ? ["keep-in-kit", "do-not-place"] : ["do-not-place", "keep-in-kit"];
  askOnce(work, `maybe-not-fitted:${maybe.column} ${maybe.text.toLowerCase()}`, context, () => {
    ask(
      work,
      { code: "maybe-not-fitted", level: "look", columns: [maybe.column], facts, choices },
      context.answers,
    );
  });
}

/** A value that differs from one of the present list by blanks only. */
function askSpaces(work: RowWork, context: QuestionContext): void {
  const at = context.columns.first("value") ?? context.columns.first("part-number");
  const raw = at === null ? "" : (work.record.cells[at] ?? "");
  if (at === null || raw === raw.trim() || raw.trim() === "") return;
  const known = context.existing.get(raw.trim());
  if (known === undefined || known.value !== raw.trim()) return;
  const facts = { text: raw, known: known.value, line: known.line };
  ask(
    work,
    {
      code: "spaces-only-difference",
      level: "look",
      columns: [at],
      facts,
      choices: ["same-part", "new-line"],
    },
    context.answers,
  );
}

const HARDLY =
  /mount(?:ing)?[ _-]?holes?|\bfiducial|fiducialu|test[ _-]?(?:pad|point)|\btp\d*sq|tpsqpad|tooling[ _-]?hole|logo|montagelöcher|bohrung|passermarke|testpunkt|trou de fixation/i;
const HARDLY_LETTERS = /^(?:FID|MH|TP|LOGO)\d/;

/** Holes, fiducials and test points stand on the board and are not bought. */
function askHardlyAPart(work: RowWork, context: QuestionContext): void {
  const line = work.line;
  if (line === null || line.partNumber !== null) return;
  const said = [line.value, line.description, line.package].find(
    (text) => text !== null && HARDLY.test(text),
  );
  if ((said === undefined || said === null) && !namedAsHole(line)) return;
  if (line.offers.some((offer) => offer.orderCode !== null)) return;
  const facts = { text: said ?? line.designatorText };
  const choices = ["leave-row-out", "keep-row"];
  ask(work, { code: "hardly-a-part", level: "look", columns: [], facts, choices }, context.answers);
}

/** FID1, MH2, TP3 with no other text than a body. */
function namedAsHole(line: DraftLine): boolean {
  if (!HARDLY_LETTERS.test(line.designators[0] ?? "") || line.value !== null || line.description !== null)
    return false;
  return line.designators.every((name) => HARDLY_LETTERS.test(name));
}
