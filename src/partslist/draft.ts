import type { LineMark, PartClass } from "#src/shapes/limits.ts";
import type { QuestionCode } from "./question-codes.ts";

/** Units a value is brought to. */
export type ValueUnit = "ohm" | "F" | "H" | "Hz" | "V" | "A" | "W";

/** A value read from its text: exact decimal text in the SI unit, without prefix. `"4k7"` is `"4700"`, ohm. */
export interface ValueReading {
  si: string;
  unit: ValueUnit;
  /** Whether the unit was written ("100nF") or inferred from the class ("100n" on a capacitor). */
  unitWritten: boolean;
}

export const PROPERTY_NAMES = [
  "tolerance",
  "power",
  "voltage",
  "hole-spacing",
  "row-spacing",
  "package",
  "dielectric",
  "diameter",
] as const;
export type PropertyName = (typeof PROPERTY_NAMES)[number];

/** A property recognised in free text. Shown as recognised; a column of the list's own always stands before it. */
export interface RecognisedProperty {
  name: PropertyName;
  /** In the unit of the name: per cent, W, V, mm; a package or dielectric as its usual name. Exact decimal text. */
  value: string;
  /** The words it was read from. */
  from: string;
}

export interface ReadPrice {
  /** From so many pieces up; 1 where the list gives one price. */
  quantity: number;
  /** Exact decimal text, per piece. */
  amount: string;
  /** Three letters of ISO 4217, or `null` where the list does not say. */
  currency: string | null;
}

export interface ReadOffer {
  supplier: string | null;
  orderCode: string | null;
  prices: ReadPrice[];
}

/** A line of the list as it would be taken. Texts are trimmed; `null` is "the list does not say". */
export interface DraftLine {
  /** Expanded, in the order written: `"R1-R3"` is R1, R2, R3. Empty for screws, the board, the enclosure. */
  designators: string[];
  /** The cell as written. */
  designatorText: string;
  /** Pieces in a kit. `null`: the list does not say. */
  quantity: number | null;
  /** Where the quantity comes from. */
  quantityFrom: "column" | "designators" | "answer" | "nothing";
  class: PartClass;
  classFrom: "column" | "designator" | "text" | "nothing";
  /** As written; where no column holds it, the words of the description it was read from. */
  value: string | null;
  reading: ValueReading | null;
  /** Nearest preferred value (IEC 60063) in SI units where this one is not preferred and looks like a slip. */
  preferredHint: string | null;
  description: string | null;
  package: string | null;
  manufacturer: string | null;
  partNumber: string | null;
  offers: ReadOffer[];
  mark: LineMark;
  /** The cell that says "not fitted", as written. */
  markFrom: string | null;
  drawer: string | null;
  note: string | null;
  datasheet: string | null;
  tolerance: string | null;
  power: string | null;
  voltage: string | null;
  holeSpacing: string | null;
  recognised: RecognisedProperty[];
}

export type QuestionLevel = "must" | "look";

/** Values a sentence is built from. */
export type Facts = Readonly<Record<string, string | number | null | readonly string[] | readonly number[]>>;

export interface Choice {
  /** Stable within its question code: `"use-designators"`. */
  choice: string;
  facts: Facts;
}

export interface Question {
  code: QuestionCode;
  /** `must`: nothing is brought in before it is answered. `look`: the suggestion holds unless changed. */
  level: QuestionLevel;
  row: number;
  /** What the row is about: its designators, or its first words. */
  subject: string;
  /** Columns whose cells are in question. */
  columns: number[];
  facts: Facts;
  suggested: Choice;
  alternatives: Choice[];
  /** Later rows that ask the same; the answer given here holds for them. */
  alsoRows: number[];
  /** The choice already made, or `null` while open. */
  answer: string | null;
}

export interface Answer {
  row: number;
  code: QuestionCode;
  choice: string;
  /** For the choice `"type"`: what the person wrote instead. */
  typed?: string | undefined;
}

export const SKIP_REASONS = [
  "blank",
  "above-the-heading",
  "heading",
  "repeated-heading",
  "section-title",
  "total",
  "remark",
  "separator",
  "other-table",
  "left-out",
] as const;
export type SkipReason = (typeof SKIP_REASONS)[number];

interface RowPlace {
  row: number;
  record: number;
  /** The cells that are not empty, joined, for showing the row in one line. */
  text: string;
  /** Open and answered questions of this row. */
  questions: Question[];
}

export type LineRow = RowPlace & { kind: "line"; line: DraftLine };
export type SkippedRow = RowPlace & { kind: "skipped"; reason: SkipReason };
/** A row with an open question; `line` or `reason` is what it becomes if the suggestions are taken. */
export type QuestionRow = RowPlace & { kind: "question"; line: DraftLine | null; reason: SkipReason | null };
/** A row whose line was joined with an equal one above, or that carries on the designators of the row above. */
export type JoinedRow = RowPlace & { kind: "joined"; into: number };
export type Row = LineRow | SkippedRow | QuestionRow | JoinedRow;

export interface RowCounts {
  rows: number;
  lines: number;
  skipped: number;
  /** Rows with an open question; rows = lines + skipped + questions + joined. */
  questions: number;
  joined: number;
  /** Open questions by level. */
  must: number;
  look: number;
  /** Lines there will be when every suggestion is taken. */
  linesWithSuggestions: number;
}

/** Rows that say the same part and could stand as one line. */
export interface JoinOffer {
  rows: number[];
  designators: string[];
  quantity: number | null;
}

export interface ReadResult {
  rows: Row[];
  counts: RowCounts;
  joinOffers: JoinOffer[];
}

/** A line that is already in the kit, for recognising it again. */
export interface ExistingLine {
  id: string;
  /** Its number in the list, for sentences. */
  line: number;
  designators: string[];
  quantity: number | null;
  class: PartClass;
  value: string | null;
  description: string | null;
  package: string | null;
  manufacturer: string | null;
  partNumber: string | null;
  mark: LineMark;
  note: string | null;
  drawer: string | null;
}
