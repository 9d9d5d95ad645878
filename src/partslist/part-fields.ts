import type { PartClass, ValueUnit } from "#src/shapes/limits.ts";
import { sameValue, valueCellWords, valueMeaning } from "./difference.ts";
import type { DraftLine, PropertyName } from "./draft.ts";
import { compareDecimals } from "./exact-decimal.ts";
import { formatReading } from "./value-format.ts";

/** What a line of a list says about its part. Empty text and `null` are "the list does not say". */
export interface PartFields {
  class: PartClass;
  name: string;
  spec: string;
  value: string | null;
  unit: ValueUnit | null;
  tolerance: string | null;
  power: string | null;
  voltage: string | null;
  package: string;
  /** Millimetres, exact decimal text. */
  holeSpacing: string | null;
  manufacturer: string;
  manufacturerPartNumber: string;
  datasheet: string;
  drawer: string;
}

const NAME_LENGTH = 120;
const UNITS: Readonly<Record<string, string>> = { tolerance: " %", power: " W", voltage: " V" };

/** A property of its own column, else as it was recognised in free text. */
function property(line: DraftLine, name: PropertyName, own: string | null): string | null {
  if (own !== null) return own;
  const found = line.recognised.find((one) => one.name === name)?.value;
  return found === undefined ? null : found + (UNITS[name] ?? "");
}

function millimetres(line: DraftLine): string | null {
  const text = property(line, "hole-spacing", line.holeSpacing);
  return /\d+(?:\.\d+)?/.exec((text ?? "").replace(",", "."))?.[0] ?? null;
}

/**
 * The value as people write it, with what stands behind it in its cell. Where the cell begins with other words it
 * stays as it is, so that the name always means what the list said.
 */
function valueName(line: DraftLine): string | null {
  const { value, reading } = line;
  if (value === null || reading === null) return value;
  const plain = formatReading(reading).replace("\u00a0", " ");
  const [first = "", ...rest] = valueCellWords(value);
  const begins =
    sameValue(plain, first, line.class) || sameValue(plain, `${first} ${rest[0] ?? ""}`, line.class);
  const names = [plain, begins ? `${plain} ${rest.join(" ")}` : value];
  const said = valueMeaning(value, line.class);
  return names.find((name) => equalMeaning(valueMeaning(name, line.class), said)) ?? value;
}

type Meaning = ReturnType<typeof valueMeaning>;

function equalMeaning(a: Meaning, b: Meaning): boolean {
  return a.value === b.value && a.rest === b.rest;
}

function nameOf(line: DraftLine): string {
  const name =
    valueName(line) ??
    line.partNumber ??
    line.description ??
    line.package ??
    (line.designatorText || "not named");
  return name.slice(0, NAME_LENGTH);
}

function specOf(line: DraftLine, name: string, properties: string): string {
  if (line.description === null) return properties;
  return line.description === name ? "" : line.description;
}

/**
 * The part a line of a list speaks of, as it would be kept: `"4k7"` becomes the name "4.7 kΩ" with its value in ohms;
 * what only stands in free text fills what no column says.
 */
export function partFields(line: DraftLine): PartFields {
  const unit = line.reading?.unit ?? null;
  const tolerance = property(line, "tolerance", line.tolerance);
  const power = property(line, "power", line.power);
  const voltage = property(line, "voltage", line.voltage);
  const name = nameOf(line);
  const properties = [tolerance, power, voltage, property(line, "dielectric", null)]
    .filter(Boolean)
    .join(", ");
  return {
    class: line.class,
    name,
    spec: specOf(line, name, properties),
    value: unit === null || unit === "W" ? null : (line.reading?.si ?? null),
    unit: unit === "W" ? null : unit,
    tolerance,
    power,
    voltage,
    package: property(line, "package", line.package) ?? "",
    holeSpacing: millimetres(line),
    manufacturer: line.manufacturer ?? "",
    manufacturerPartNumber: line.partNumber ?? "",
    datasheet: line.datasheet ?? "",
    drawer: line.drawer ?? "",
  };
}

/** Upper and lower case, blanks and hyphens do not make another part. */
function folded(text: string | null): string {
  return (text ?? "").toLowerCase().replace(/[\s\u00a0_-]+/g, "");
}

function valueKey(part: PartFields): string {
  const { value, rest } = valueMeaning(part.name, part.class);
  return `${folded(value)}:${folded(rest)}`;
}

type Said = Pick<
  PartFields,
  "package" | "manufacturerPartNumber" | "manufacturer" | "tolerance" | "power" | "voltage" | "holeSpacing"
>;
const SAID: readonly (keyof Said)[] = [
  "package",
  "manufacturerPartNumber",
  "manufacturer",
  "tolerance",
  "power",
  "voltage",
  "holeSpacing",
];

/** Two parts with one key are the same part: everything that tells parts apart is equal, what is not said included. */
export function partKey(part: PartFields): string {
  return [part.class, valueKey(part), folded(part.spec), ...SAID.map((field) => folded(part[field]))].join(
    "|",
  );
}

function agree(a: string | null, b: string | null): boolean {
  const [left, right] = [folded(a), folded(b)];
  if (left === "" || right === "" || left === right) return true;
  const [x, y] = [Number.parseFloat(left), Number.parseFloat(right)];
  return (
    /^\d+(\.\d+)?\D*$/.test(left) &&
    /^\d+(\.\d+)?\D*$/.test(right) &&
    x === y &&
    unitOf(left) === unitOf(right)
  );
}

function unitOf(text: string): string {
  return text.replace(/^[\d.]+/, "");
}

/**
 * Whether what a list says can be said of a part that is there already: nothing contradicts it, though either may say
 * more than the other. Another value is another part, whatever else is equal.
 */
export function canBeSamePart(part: PartFields, said: PartFields): boolean {
  const sameClass = part.class === said.class || part.class === "other" || said.class === "other";
  const [known, stated] = [valueMeaning(part.name, said.class), valueMeaning(said.name, said.class)];
  const equalValue =
    part.value !== null && said.value !== null
      ? part.unit === said.unit && compareDecimals(part.value, said.value) === 0
      : folded(known.value) === folded(stated.value);
  const sameWords = equalValue && agree(known.rest, stated.rest);
  return sameClass && sameWords && SAID.every((field) => agree(part[field], said[field]));
}

const TAKEN_OVER = ["spec", "datasheet", "drawer"] as const;

/**
 * What a part becomes when a list that speaks of it is taken: the list's words for its description, datasheet and
 * drawer, and what was not known before. Empty where nothing changes.
 */
export function partChanges(part: PartFields, said: PartFields): Partial<PartFields> {
  const changes: Record<string, string | null> = {};
  for (const field of TAKEN_OVER)
    if (said[field] !== "" && said[field] !== part[field]) changes[field] = said[field];
  for (const field of SAID) if (!part[field] && said[field]) changes[field] = said[field];
  if (sameValue(said.name, part.name, said.class) && !sameValue(part.name, said.name, said.class))
    changes.name = said.name;
  if (part.class === "other" && said.class !== "other") changes.class = said.class;
  return changes as Partial<PartFields>;
}
