import type { Choice, Facts, Question } from "./draft.ts";
import type { QuestionCode } from "./question-codes.ts";

type Sentence = (facts: Facts) => string;
interface Words {
  /** What is the matter, in one or two short sentences. */
  says: Sentence;
  /** What each choice does, as the words of its button. */
  choices: Readonly<Record<string, Sentence>>;
}

const text = (facts: Facts, name: string): string => {
  const value = facts[name];
  return value === null || value === undefined ? "" : String(value);
};
const quoted = (facts: Facts, name: string): string => `“${text(facts, name)}”`;
const listOf = (facts: Facts, name: string): readonly (string | number)[] => {
  const value = facts[name];
  return Array.isArray(value) ? value : [];
};

/** "C2", "C2 and C3", "C2, C3 and 4 more". */
function few(facts: Facts, name: string): string {
  const all = listOf(facts, name);
  if (all.length <= 3) return all.join(", ").replace(/, ([^,]*)$/, " and $1");
  return `${all.slice(0, 2).join(", ")} and ${all.length - 2} more`;
}

const stands = (facts: Facts, name: string): string =>
  listOf(facts, name).length === 1 ? "stands" : "stand";
const span = (facts: Facts, name: string): string => {
  const [from, to] = listOf(facts, name);
  return `rows ${from} to ${to}`;
};
const upper = (words: string): string => words.slice(0, 1).toUpperCase() + words.slice(1);

const SIGNS: Readonly<Record<string, string>> = { EUR: "€", USD: "$", GBP: "£" };

/** An amount with its currency before it: "€0.66", "CHF 0.66"; without a currency the amount alone. */
function money(facts: Facts, name: string): string {
  const currency = text(facts, "currency");
  const sign = SIGNS[currency] ?? (currency === "" ? "" : `${currency}\u00a0`);
  const [whole = "0", fraction = ""] = text(facts, name).split(".");
  return `${sign}${whole}.${fraction.padEnd(2, "0")}`;
}

const LEAVE_OUT: Sentence = () => "Leave the row out";
const KEEP_LINE: Sentence = () => "Keep as a line";
const USE_ONE: Sentence = () => "Count it as 1";
const LEAVE_OPEN: Sentence = () => "Leave the quantity open";
const TYPE: Sentence = () => "Type another quantity";

/** One row to a question: what it says, and what its choices are called. The only place with these words. */
export const QUESTION_WORDS: Readonly<Record<QuestionCode, Words>> = {
  "quantity-mismatch": {
    says: (f) => `The quantity says ${text(f, "quantity")}. The designators count ${text(f, "designators")}.`,
    choices: {
      "use-designators": (f) => `Use ${text(f, "designators")}, as the designators say`,
      "keep-quantity": (f) => `Keep ${text(f, "quantity")}`,
      type: TYPE,
    },
  },
  "quantity-missing": {
    says: () => "The row has no quantity and no designators.",
    choices: { "use-one": USE_ONE, "leave-open": LEAVE_OPEN },
  },
  "quantity-zero": {
    says: () => "The quantity is 0.",
    choices: {
      "do-not-place": () => "Keep the line, not fitted",
      "use-designators": (f) => `Use ${text(f, "designators")}, as the designators say`,
      "use-one": USE_ONE,
      "leave-row-out": LEAVE_OUT,
    },
  },
  "quantity-not-a-number": {
    says: (f) => `The quantity reads ${quoted(f, "text")}.`,
    choices: {
      "use-number": (f) => `Use ${text(f, "quantity")}`,
      "use-designators": (f) => `Use ${text(f, "designators")}, as the designators say`,
      "use-one": USE_ONE,
      "leave-open": LEAVE_OPEN,
      type: TYPE,
    },
  },
  "quantity-of-pack": {
    says: (f) => `The quantity reads ${quoted(f, "text")}.`,
    choices: {
      "use-quantity": (f) => `Use ${text(f, "quantity")} from a pack of ${text(f, "pack")}`,
      "use-pack": (f) => `Use ${text(f, "pack")}`,
      type: TYPE,
    },
  },
  "designator-in-two-rows": {
    says: (f) =>
      `${few(f, "designators")} ${stands(f, "designators")} in two rows, ${text(f, "otherRow")} and ${text(f, "row")}.`,
    choices: {
      "drop-here": (f) =>
        `Drop ${listOf(f, "designators").length === 1 ? "it" : "them"} from row ${text(f, "row")}`,
      "drop-there": (f) =>
        `Drop ${listOf(f, "designators").length === 1 ? "it" : "them"} from row ${text(f, "otherRow")}`,
      "keep-both": () => "Keep both rows",
      "leave-row-out": (f) => `Leave row ${text(f, "row")} out`,
      "leave-other-out": (f) => `Leave row ${text(f, "otherRow")} out`,
    },
  },
  "designator-twice-in-row": {
    says: (f) => `${few(f, "designators")} ${stands(f, "designators")} more than once in the row.`,
    choices: {
      "keep-all": (f) => `Count all ${text(f, "all")}`,
      "count-once": (f) => `Count each once: ${text(f, "once")}`,
    },
  },
  "designator-unclear": {
    says: (f) => `${upper(quoted(f, "text"))} is no clear list of designators.`,
    choices: {
      "take-read": (f) => `Read it as ${few(f, "designators")}`,
      "no-designators": () => "Take the row without designators",
      "take-as-name": () => "Take it as a designator",
    },
  },
  "price-unclear": {
    says: (f) => `The price reads ${quoted(f, "text")}.`,
    choices: {
      "read-from": (f) => `Read it as ${money(f, "amount")} each from ${text(f, "per")} up`,
      "read-for": (f) => `Read it as ${money(f, "amount")} for ${text(f, "per")}, ${money(f, "each")} each`,
      "leave-price-out": () => "Leave the price out",
    },
  },
  "value-without-unit": {
    says: (f) =>
      f.slipped === 1
        ? `${quoted(f, "text")} ends in letters that are no unit.`
        : `${quoted(f, "text")} has no unit.`,
    choices: { "read-as": (f) => `Read it as ${text(f, "reading")}`, "leave-text": () => "Leave as text" },
  },
  "spaces-only-difference": {
    says: (f) =>
      `${quoted(f, "text")} ${/\s$/.test(text(f, "text")) ? "ends in" : "begins with"} a space. Line ${text(f, "line")} of the list is ${quoted(f, "known")}.`,
    choices: { "same-part": () => "Treat as the same part", "new-line": () => "Make a new line" },
  },
  "looks-like-total": {
    says: () => "This looks like a total, not a part.",
    choices: { "leave-row-out": LEAVE_OUT, "keep-row": KEEP_LINE },
  },
  "looks-like-remark": {
    says: () => "This looks like a remark, not a part.",
    choices: { "leave-row-out": LEAVE_OUT, "keep-row": KEEP_LINE },
  },
  "hardly-a-part": {
    says: (f) => `${upper(quoted(f, "text"))} stands on the board and is hardly bought.`,
    choices: { "leave-row-out": LEAVE_OUT, "keep-row": KEEP_LINE },
  },
  "maybe-not-fitted": {
    says: (f) =>
      text(f, "heading") === ""
        ? `The value reads ${quoted(f, "text")}.`
        : `The column “${text(f, "heading")}” says ${quoted(f, "text")}.`,
    choices: { "do-not-place": () => "Mark as not fitted", "keep-in-kit": () => "Keep in the kit" },
  },
  "commented-out": {
    says: () => "The row is struck out with a comment sign.",
    choices: { "leave-row-out": LEAVE_OUT, "keep-row": KEEP_LINE },
  },
  "alternative-tables": {
    says: (f) =>
      `A second table begins here. ${text(f, "common")} of its designators stand in the first one too.`,
    choices: {
      "take-both": () => "Take both tables",
      "take-first": (f) => `Take ${span(f, "first")} only`,
      "take-second": (f) => `Take ${span(f, "second")} only`,
    },
  },
  "same-parts-twice": {
    says: (f) =>
      `${upper(span(f, "first"))} and ${span(f, "second")} list the same ${text(f, "parts")} parts.`,
    choices: {
      "take-second": (f) => `Take ${span(f, "second")}`,
      "take-first": (f) => `Take ${span(f, "first")}`,
      "take-both": () => "Take both",
    },
  },
  "part-not-found": {
    says: (f) => `No part of the workshop is known by ${quoted(f, "text")}.`,
    choices: { "leave-row-out": LEAVE_OUT, "take-part": (f) => `It is ${text(f, "name")}` },
  },
  "part-found-twice": {
    says: (f) => `${upper(quoted(f, "text"))} may be ${few(f, "names")}.`,
    choices: { "leave-row-out": LEAVE_OUT, "take-part": (f) => `It is ${text(f, "name")}` },
  },
  "ladder-not-rising": {
    says: (f) =>
      `Two prices hold from ${text(f, "quantity")} up: ${money(f, "first")} and ${money(f, "second")}.`,
    choices: {
      "keep-lower": () => "Keep the lower price",
      "keep-higher": () => "Keep the higher price",
      "leave-row-out": () => "Leave the offer out",
    },
  },
  "price-rises": {
    says: (f) =>
      `The price rises from ${money(f, "before")} to ${money(f, "after")} at ${text(f, "quantity")}.`,
    choices: {
      "keep-prices": () => "Keep the prices as they stand",
      "drop-step": (f) => `Leave the price from ${text(f, "quantity")} up out`,
      "leave-row-out": () => "Leave the offer out",
    },
  },
  "price-missing": {
    says: () => "The row has no price.",
    choices: { "keep-offer": () => "Keep the offer without a price", "leave-row-out": LEAVE_OUT },
  },
};

/** The sentence of a question, with the other rows it speaks for. */
export function questionSentence(question: Pick<Question, "code" | "facts" | "alsoRows">): string {
  const says = QUESTION_WORDS[question.code].says(question.facts);
  const also = question.alsoRows.length;
  if (also === 0) return says;
  return also === 1 ? `${says} So does row ${question.alsoRows[0]}.` : `${says} So do ${also} more rows.`;
}

/** The words of a choice. Part choices carry the part in their own facts. */
export function choiceLabel(code: QuestionCode, choice: Choice): string {
  const key = choice.choice.startsWith("take-part") ? "take-part" : choice.choice;
  return QUESTION_WORDS[code].choices[key]?.(choice.facts) ?? choice.choice;
}

/** Why a row was skipped, for the list of skipped rows. */
export const SKIP_WORDS = {
  blank: "blank",
  "above-the-heading": "above the heading",
  heading: "the heading",
  "repeated-heading": "the heading again",
  "section-title": "a title, not a part",
  total: "a total",
  remark: "a remark",
  separator: "a ruled line",
  "other-table": "in the table that is not taken",
  "left-out": "left out",
} as const;
