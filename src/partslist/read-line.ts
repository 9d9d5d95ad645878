import type { PartClass } from "#src/shapes/limits.ts";
import { classFromColumn, guessClass } from "./classes.ts";
import { readDesignators } from "./designators.ts";
import type { DraftLine, PropertyName, ValueReading } from "./draft.ts";
import { cellAt, type ListColumns, textAt } from "./list-columns.ts";
import { maySayNotFitted, readDoNotPlace, readPlace, saysNotFitted, withoutMark } from "./marks.ts";
import { preferredHint } from "./preferred-values.ts";
import { recogniseProperties } from "./properties.ts";
import { type ReadQuantity, readQuantity } from "./quantities.ts";
import { type PriceProblem, readOffers } from "./read-offers.ts";
import type { DecimalMark } from "./sheet.ts";
import {
  findValue,
  guessBareCapacitance,
  guessSlippedValue,
  namesTwoValues,
  readValue,
  valueKind,
} from "./values.ts";

/** A line as read from its row, with what was doubtful on the way. */
export interface ReadLine {
  line: DraftLine;
  quantity: ReadQuantity;
  /** Pieces of the designator cell that could not be read. */
  unclear: string[];
  /** What a value without a unit is taken to be. */
  bareValue: ValueReading | null;
  /** A cell that may or may not mean "not fitted", and whether it stands in a column for that. */
  maybeMark: { text: string; column: number; fromColumn: boolean } | null;
  priceProblems: PriceProblem[];
}

/** Values read once, for the many rows of a list that say the same. */
export type ReadValues = Map<PartClass, Map<string | null, ReadPart>>;

interface Texts {
  value: string | null;
  description: string | null;
  partNumber: string | null;
  package: string | null;
  kind: string | null;
  note: string | null;
}

function joined(
  cells: readonly string[],
  columns: ListColumns,
  meaning: "description" | "note",
): string | null {
  let text: string | null = null;
  for (const { column } of columns.all(meaning)) {
    const one = textAt(cells, column);
    if (one !== null && one !== text) text = text === null ? one : `${text}, ${one}`;
  }
  return text;
}

function textsOf(cells: readonly string[], columns: ListColumns): Texts {
  const text = (meaning: "value" | "part-number" | "package" | "class") =>
    textAt(cells, columns.first(meaning));
  return {
    value: text("value"),
    description: joined(cells, columns, "description"),
    partNumber: text("part-number"),
    package: text("package"),
    kind: text("class"),
    note: joined(cells, columns, "note"),
  };
}

/** The texts of a row in one, parted so that no word runs over from one into the next. */
function wordsOf(texts: Texts): string {
  let words = "";
  for (const text of [texts.kind, texts.description, texts.value, texts.package])
    if (text !== null) words = words === "" ? text : `${words} ; ${text}`;
  return words;
}

function classOf(
  texts: Texts,
  designators: readonly string[],
  words: string,
): Pick<DraftLine, "class" | "classFrom"> {
  const guess = guessClass(designators, [words, texts.partNumber]);
  const column = texts.kind === null ? null : classFromColumn(texts.kind);
  if (column !== null && guess.from !== "designator") return { class: column, classFrom: "column" };
  return { class: guess.class, classFrom: guess.from };
}

interface ReadPart {
  value: string | null;
  reading: ValueReading | null;
  partNumber: string | null;
  bareValue: ValueReading | null;
}

/** The value from its own column, else from the description, else from a part-number cell that is nothing but a value. */
function valueIn(texts: Texts, partClass: PartClass, columns: ListColumns, values: ReadValues): ReadPart {
  const { value, partNumber } = texts;
  const known = onceForClass(value, partClass, columns, values);
  if (known.reading !== null || known.bareValue !== null || /\d/.test(known.value ?? ""))
    return { ...known, partNumber };
  for (const text of [texts.description, texts.note === null ? null : texts.kind]) {
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
  const number = partClass === "capacitor" ? guessBareCapacitance(firstWord(written)) : null;
  return number ?? guessSlippedValue(written, partClass, mark);
}

function firstWord(text: string): string {
  return /^\S+/.exec(text)?.[0] ?? text;
}

/** A part-number cell that holds "47R" or "470ohm PTH" instead of a part number. */
function startsWithValue(text: string): boolean {
  return /^~?\d+(?:[.,]\d+)?\s?(?:[kKMRΩnpuµμ]|[kKM]?ohms?)(?:\d{1,2})?(?:\s|$)/i.test(text);
}

function markOf(
  cells: readonly string[],
  columns: ListColumns,
  texts: Texts,
): Pick<DraftLine, "mark" | "markFrom"> & Pick<ReadLine, "maybeMark"> {
  const notPlaced = columns.first("do-not-place");
  const placed = columns.first("place");
  const notPlacedText = cellAt(cells, notPlaced);
  const placedText = cellAt(cells, placed);
  if (readDoNotPlace(notPlacedText) === true)
    return { mark: "do-not-place", markFrom: notPlacedText, maybeMark: null };
  for (const text of [texts.value, texts.description, texts.note, texts.partNumber, texts.package])
    if (text !== null && saysNotFitted(text))
      return { mark: "do-not-place", markFrom: text, maybeMark: null };
  if (placed !== null && readPlace(placedText) === false) {
    if (/^place/i.test(columns.all("place")[0]?.heading ?? ""))
      return {
        mark: "in-kit",
        markFrom: null,
        maybeMark: { text: placedText, column: placed, fromColumn: true },
      };
    return { mark: "do-not-place", markFrom: placedText, maybeMark: null };
  }
  const value = columns.first("value");
  const raw = cellAt(cells, value);
  const maybe =
    value !== null && raw !== "" && maySayNotFitted(raw)
      ? { text: raw, column: value, fromColumn: false }
      : null;
  return { mark: "in-kit", markFrom: null, maybeMark: maybe };
}

function ownProperties(
  cells: readonly string[],
  columns: ListColumns,
): Pick<DraftLine, "tolerance" | "power" | "voltage" | "holeSpacing"> {
  return {
    tolerance: textAt(cells, columns.first("tolerance")),
    power: textAt(cells, columns.first("power")),
    voltage: textAt(cells, columns.first("voltage")),
    holeSpacing: textAt(cells, columns.first("hole-spacing")),
  };
}

const PACKAGE_KNOWN: ReadonlySet<PropertyName> = new Set(["package"]);
const NOTHING_KNOWN: ReadonlySet<PropertyName> = new Set();

function knownProperties(own: ReturnType<typeof ownProperties>, texts: Texts): ReadonlySet<PropertyName> {
  const named: PropertyName[] = [];
  if (own.tolerance !== null) named.push("tolerance");
  if (own.power !== null) named.push("power");
  if (own.voltage !== null) named.push("voltage");
  if (own.holeSpacing !== null) named.push("hole-spacing");
  if (texts.package !== null && texts.package.length <= 10) named.push("package");
  if (named.length === 0) return NOTHING_KNOWN;
  return named.length === 1 && named[0] === "package" ? PACKAGE_KNOWN : new Set(named);
}

function quantityOf(
  read: ReadQuantity,
  designators: readonly string[],
): Pick<DraftLine, "quantity" | "quantityFrom"> {
  if (read.kind === "number") return { quantity: read.quantity, quantityFrom: "column" };
  if (read.kind === "of-pack") return { quantity: read.quantity, quantityFrom: "column" };
  if (designators.length > 0 && read.kind === "empty")
    return { quantity: designators.length, quantityFrom: "designators" };
  return { quantity: null, quantityFrom: "nothing" };
}

/** Reads one row that is a part. Cells that are empty stay "not known"; nothing is filled in from elsewhere. */
export function readLine(
  cells: readonly string[],
  columns: ListColumns,
  values: ReadValues = new Map(),
): ReadLine {
  const texts = textsOf(cells, columns);
  const designatorText = cellAt(cells, columns.first("designators"));
  const { designators, unclear } = readDesignators(designatorText);
  const quantityColumn = columns.first("quantity");
  const quantity = readQuantity(
    cellAt(cells, quantityColumn),
    quantityColumn === null ? null : columns.mark(quantityColumn),
  );
  const words = wordsOf(texts);
  const kind = classOf(texts, designators, words);
  const part = valueIn(texts, kind.class, columns, values);
  const marked = markOf(cells, columns, texts);
  const own = ownProperties(cells, columns);
  const { offers, problems } = readOffers(cells, columns);
  const recognised = recogniseProperties([words, texts.note], kind.class, knownProperties(own, texts));
  const counted = quantityOf(quantity, designators);
  const line: DraftLine = {
    designators,
    designatorText,
    quantity: counted.quantity,
    quantityFrom: counted.quantityFrom,
    class: kind.class,
    classFrom: kind.classFrom,
    value: part.value,
    reading: part.reading,
    preferredHint: part.reading !== null && hints(kind.class) ? preferredHint(part.reading.si) : null,
    description: texts.description ?? leftOver(unclear, designators) ?? onlyKind(texts, part),
    package: texts.package,
    manufacturer: textAt(cells, columns.first("manufacturer")),
    partNumber: part.partNumber,
    offers,
    mark: marked.mark,
    markFrom: marked.markFrom,
    drawer: textAt(cells, columns.first("drawer")),
    note: texts.note,
    datasheet: textAt(cells, columns.first("datasheet")),
    tolerance: own.tolerance,
    power: own.power,
    voltage: own.voltage,
    holeSpacing: own.holeSpacing,
    recognised,
  };
  return {
    line,
    quantity,
    unclear,
    bareValue: part.bareValue,
    maybeMark: marked.maybeMark,
    priceProblems: problems,
  };
}

/** Potentiometers and crystals keep to other rows of values. */
function hints(partClass: PartClass): boolean {
  return (
    valueKind(partClass) !== null &&
    (partClass === "resistor" || partClass === "capacitor" || partClass === "inductor")
  );
}

/** Where nothing but the kind of part is written ("Gasket"), it is what the part is called. */
function onlyKind(texts: Texts, part: Pick<DraftLine, "value" | "partNumber">): string | null {
  return part.value === null && part.partNumber === null ? texts.kind : null;
}

/** Words in the designator cell of a row that says nothing else ("Cables") are its description. */
function leftOver(unclear: readonly string[], designators: readonly string[]): string | null {
  return designators.length === 0 && unclear.length > 0 ? unclear.join(" ") : null;
}
