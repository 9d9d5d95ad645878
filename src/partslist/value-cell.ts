import type { PartClass } from "#src/shapes/limits.ts";
import type { ValueReading } from "./draft.ts";
import type { ListColumns } from "./list-columns.ts";
import { withoutMark } from "./marks.ts";
import type { Texts } from "./row-texts.ts";
import type { DecimalMark } from "./sheet.ts";
import { findValue, guessBareCapacitance, guessSlippedValue, namesTwoValues, readValue } from "./values.ts";

/** Values read once, for the many rows of a list that say the same. */
export type ReadValues = Map<PartClass, Map<string | null, ReadPart>>;

/** The value of a row, and its part number where the value did not stand in that cell. */
export interface ReadPart {
  value: string | null;
  reading: ValueReading | null;
  partNumber: string | null;
  /** What a value without a unit is taken to be, until it is confirmed. */
  bareValue: ValueReading | null;
}

/** The value from its own column, else from the description, else from a part-number cell that is nothing but a value. */
export function valueIn(
  texts: Texts,
  partClass: PartClass,
  columns: ListColumns,
  values: ReadValues,
): ReadPart {
  const { value, partNumber } = texts;
  const known = onceForClass(value, partClass, columns, values);
  if (known.reading !== null || known.bareValue !== null || /\d/.test(known.value ?? ""))
    return { ...known, partNumber };
  for (const text of [texts.description, texts.kind]) {
    const found = text === null || namesTwoValues(text, partClass) ? null : findValue(text, partClass);
    if (found)
      return { value: known.value ?? found.from.trim(), reading: found.reading, partNumber, bareValue: null };
  }
  const inNumber =
    partNumber === null || !startsWithValue(partNumber) ? null : findValue(partNumber, partClass);
  if (inNumber)
    return { value: known.value ?? partNumber, reading: inNumber.reading, partNumber: null, bareValue: null };
  return { ...known, partNumber };
}

function onceForClass(
  value: string | null,
  partClass: PartClass,
  columns: ListColumns,
  values: ReadValues,
): ReadPart {
  let ofClass = values.get(partClass);
  if (ofClass === undefined) {
    ofClass = new Map();
    values.set(partClass, ofClass);
  }
  let part = ofClass.get(value);
  if (part === undefined) {
    part = ownValue(value, partClass, columns);
    ofClass.set(value, part);
  }
  return part;
}

/** What the value cell says by itself: a value, a number whose unit must be confirmed, or a text. */
function ownValue(value: string | null, partClass: PartClass, columns: ListColumns): ReadPart {
  const column = columns.first("value");
  const mark = column === null ? null : columns.mark(column);
  const written = value === null ? null : withoutMark(value) || value;
  const reading = written === null ? null : readValue(written, partClass, mark);
  const bare = written === null || reading !== null ? null : bareValue(written, partClass, mark);
  return { value: written, reading, partNumber: null, bareValue: bare };
}

function bareValue(written: string, partClass: PartClass, mark: DecimalMark | null): ValueReading | null {
  const number = partClass === "capacitor" ? guessBareCapacitance(firstNumber(written)) : null;
  return number ?? guessSlippedValue(written, partClass, mark);
}

/** The number a cell begins with: "104" of "104/50V". */
function firstNumber(text: string): string {
  return /^\d*[.,]?\d+[A-Z]?(?=$|[\s/;,])/.exec(text)?.[0] ?? text;
}

/** A part-number cell that holds "47R" or "470ohm PTH" instead of a part number. */
function startsWithValue(text: string): boolean {
  return /^~?\d+(?:[.,]\d+)?\s?(?:[kKMRΩnpuµμ]|[kKM]?ohms?)(?:\d{1,2})?(?:\s|$)/i.test(text);
}
