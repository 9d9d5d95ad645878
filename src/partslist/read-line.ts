import type { PartClass } from "#src/shapes/limits.ts";
import { classFromColumn, guessClass } from "./classes.ts";
import { readDesignators } from "./designators.ts";
import type { DraftLine, PropertyName, ValueReading } from "./draft.ts";
import { cellAt, type ListColumns, textAt } from "./list-columns.ts";
import { markOf, type ReadMark } from "./mark-cell.ts";
import { preferredHint } from "./preferred-values.ts";
import { recogniseProperties } from "./properties.ts";
import { type ReadQuantity, readQuantity } from "./quantities.ts";
import { type PriceProblem, readOffers } from "./read-offers.ts";
import { type Texts, textsOf, wordsOf } from "./row-texts.ts";
import { classFromUnit } from "./unit-class.ts";
import { type ReadValues, valueIn } from "./value-cell.ts";
import { valueKind } from "./values.ts";

/** A line as read from its row, with what was doubtful on the way. */
export interface ReadLine {
  line: DraftLine;
  quantity: ReadQuantity;
  /** Pieces of the designator cell that could not be read. */
  unclear: string[];
  /** What a value without a unit is taken to be. */
  bareValue: ValueReading | null;
  maybeMark: ReadMark["maybeMark"];
  priceProblems: PriceProblem[];
}

function classOf(
  texts: Texts,
  designators: readonly string[],
  words: string,
  section: PartClass | null,
): Pick<DraftLine, "class" | "classFrom"> {
  const guess = guessClass(designators, [words, texts.partNumber]);
  const column = texts.kind === null ? null : classFromColumn(texts.kind);
  if (column !== null && guess.from !== "designator") return { class: column, classFrom: "column" };
  if (guess.from !== "nothing") return { class: guess.class, classFrom: guess.from };
  const said = (texts.value === null ? null : classFromUnit(texts.value)) ?? section;
  return said === null ? { class: guess.class, classFrom: "nothing" } : { class: said, classFrom: "text" };
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

/**
 * Reads one row that is a part. Cells that are empty stay "not known"; nothing is filled in from elsewhere.
 * `section` is the class that the title over the row names; it counts where the row itself says none.
 */
export function readLine(
  cells: readonly string[],
  columns: ListColumns,
  values: ReadValues = new Map(),
  section: PartClass | null = null,
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
  const kind = classOf(texts, designators, words, section);
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
