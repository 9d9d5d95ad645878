import type { LineMark, PartClass } from "#src/shapes/limits.ts";
import { readValue } from "./values.ts";

/** A line as the comparison sees it, of the list as it stands or of the incoming one. */
export interface ComparableLine {
  /** Of the present list: its id; of an incoming one: any key of its own, such as its row. */
  id: string;
  designators: readonly string[];
  quantity: number | null;
  class: PartClass;
  value: string | null;
  description: string | null;
  package: string | null;
  manufacturer: string | null;
  partNumber: string | null;
  /** `null`: the list does not speak of marks. */
  mark: LineMark | null;
  note: string | null;
  drawer: string | null;
}

export const COMPARED_FIELDS = [
  "designators",
  "quantity",
  "value",
  "class",
  "package",
  "description",
  "manufacturer",
  "partNumber",
  "mark",
  "note",
  "drawer",
] as const;
export type ComparedField = (typeof COMPARED_FIELDS)[number];

export interface FieldChange {
  field: ComparedField;
  from: string | null;
  to: string | null;
}

export interface LineChange {
  current: string;
  incoming: string;
  changes: FieldChange[];
}

export interface ListDifference {
  /** Ids of incoming lines that are new. */
  added: string[];
  /** Ids of present lines that are no longer in the list. */
  removed: string[];
  /** Same place on the board, another value: what a revision is usually about. */
  revalued: LineChange[];
  /** Anything else changed. */
  changed: LineChange[];
  unchanged: { current: string; incoming: string }[];
}

/**
 * Compares an incoming list with the present one. Lines are matched by the designators they share, most
 * first; what is left by part identity (part number, then value, package and description). Fields the
 * incoming list does not speak of (`null`) change nothing: a list without prices or drawers does not wipe
 * them. The same list twice leaves every line unchanged. Values are compared by what they mean, so "4k7"
 * and "4.7 kΩ" are equal.
 */
export function listDifference(
  current: readonly ComparableLine[],
  incoming: readonly ComparableLine[],
): ListDifference {
  const pairs = matchLines(current, incoming);
  const result: ListDifference = { added: [], removed: [], revalued: [], changed: [], unchanged: [] };
  const matched = new Set<string>();
  for (const line of incoming) {
    const before = pairs.get(line);
    if (before === undefined) {
      result.added.push(line.id);
      continue;
    }
    matched.add(before.id);
    const changes = changesBetween(before, line);
    if (changes.length === 0) result.unchanged.push({ current: before.id, incoming: line.id });
    else
      (changes.some((change) => change.field === "value") ? result.revalued : result.changed).push({
        current: before.id,
        incoming: line.id,
        changes,
      });
  }
  result.removed = current.filter((line) => !matched.has(line.id)).map((line) => line.id);
  return result;
}

type Pairs = Map<ComparableLine, ComparableLine>;

function matchLines(current: readonly ComparableLine[], incoming: readonly ComparableLine[]): Pairs {
  const pairs: Pairs = new Map();
  const free = new Set(current);
  matchByDesignators(current, incoming, pairs, free);
  for (const identity of [fullIdentity, partIdentity, nameIdentity])
    matchByIdentity(incoming, pairs, free, identity);
  return pairs;
}

interface Candidate {
  line: ComparableLine;
  before: ComparableLine;
  shared: number;
  alike: boolean;
}

/** Pairs that share designators, strongest first: a line split in two keeps its larger part. */
function matchByDesignators(
  current: readonly ComparableLine[],
  incoming: readonly ComparableLine[],
  pairs: Pairs,
  free: Set<ComparableLine>,
): void {
  const home = new Map<string, ComparableLine>();
  for (const line of current)
    for (const name of line.designators)
      if (!home.has(name.toUpperCase())) home.set(name.toUpperCase(), line);
  const candidates: Candidate[] = [];
  for (const line of incoming) {
    const shared = new Map<ComparableLine, number>();
    for (const name of line.designators) {
      const before = home.get(name.toUpperCase());
      if (before) shared.set(before, (shared.get(before) ?? 0) + 1);
    }
    for (const [before, count] of shared)
      candidates.push({ line, before, shared: count, alike: partIdentity(line) === partIdentity(before) });
  }
  candidates.sort((a, b) => Number(b.alike) - Number(a.alike) || b.shared - a.shared);
  for (const { line, before } of candidates)
    if (free.has(before) && !pairs.has(line)) pair(line, before, pairs, free);
}

function pair(line: ComparableLine, before: ComparableLine, pairs: Pairs, free: Set<ComparableLine>): void {
  pairs.set(line, before);
  free.delete(before);
}

function matchByIdentity(
  incoming: readonly ComparableLine[],
  pairs: Pairs,
  free: Set<ComparableLine>,
  identity: (line: ComparableLine) => string | null,
): void {
  const waiting = new Map<string, ComparableLine[]>();
  for (const line of free) {
    const key = identity(line);
    if (key !== null) waiting.set(key, [...(waiting.get(key) ?? []), line]);
  }
  for (const line of incoming) {
    if (pairs.has(line)) continue;
    const key = identity(line);
    const before =
      key === null
        ? undefined
        : waiting.get(key)?.find((other) => free.has(other) && mayBeTheSame(line, other));
    if (before) pair(line, before, pairs, free);
  }
}

/**
 * Two lines with designators of which none is free for both are two lines, unless they say the same part in the same
 * number: some lists name a designator in several rows.
 */
function mayBeTheSame(line: ComparableLine, other: ComparableLine): boolean {
  return (
    line.designators.length === 0 ||
    other.designators.length === 0 ||
    (fullIdentity(line) === fullIdentity(other) && sameWords(line.description, other.description))
  );
}

/** A list that gives no description does not contradict one. */
function sameWords(a: string | null, b: string | null): boolean {
  return a === null || b === null || plain(a) === plain(b);
}

function fullIdentity(line: ComparableLine): string | null {
  const part = partIdentity(line);
  return part === null ? null : `${part}\u001f${line.quantity}`;
}

function partIdentity(line: ComparableLine): string | null {
  if (line.partNumber !== null) return `n\u001f${plain(line.partNumber)}`;
  return line.value === null && line.description === null
    ? null
    : `v\u001f${line.class}\u001f${line.value === null ? plain(line.description) : meaning(line)}\u001f${plain(line.package)}`;
}

function nameIdentity(line: ComparableLine): string | null {
  return line.designators.length > 0 || (line.description === null && line.value === null)
    ? null
    : `d\u001f${plain(line.description ?? line.value)}`;
}

function plain(text: string | null): string {
  return (text ?? "").trim().toLowerCase().replace(/\s+/g, " ");
}

function meaning(line: ComparableLine): string {
  if (line.value === null) return "";
  const { value, rest } = valueMeaning(line.value, line.class);
  return `${value} ${rest}`.trim();
}

/** Words of a value cell: blanks, slashes and commas part them, but not the comma of "4,7k". */
export function valueCellWords(text: string): string[] {
  return text
    .trim()
    .split(/[\s/]+|(?<!\d),|,(?!\d)/)
    .filter((word) => word !== "");
}

/**
 * A value cell by what it means: its reading in SI units, else its letters; and what else stands in the cell, such as
 * the "50v" of "100n 50V", which counts as well.
 */
export function valueMeaning(text: string, partClass: PartClass): { value: string; rest: string } {
  const reading = readValue(text, partClass);
  if (reading === null) return { value: plain(text), rest: "" };
  const rest = valueCellWords(plain(text))
    .slice(1)
    .filter((word) => !/^(?:[kmunpµ]?(?:ω|ohms?|f|h))$/.test(word));
  return { value: `${reading.si} ${reading.unit}`, rest: rest.join(" ") };
}

/** Whether a value that is stated says the same as one that is known; saying less is no contradiction. */
export function sameValue(known: string, stated: string, partClass: PartClass): boolean {
  const [before, after] = [valueMeaning(known, partClass), valueMeaning(stated, partClass)];
  return before.value === after.value && (after.rest === "" || after.rest === before.rest);
}

function changesBetween(before: ComparableLine, after: ComparableLine): FieldChange[] {
  const changes: FieldChange[] = [];
  for (const field of COMPARED_FIELDS) {
    if (equal(field, before, after)) continue;
    changes.push({ field, from: shown(before, field), to: shown(after, field) });
  }
  return changes;
}

function equal(field: ComparedField, before: ComparableLine, after: ComparableLine): boolean {
  if (field === "designators") return sameNames(before.designators, after.designators);
  if (field === "quantity") return after.quantity === null || before.quantity === after.quantity;
  if (field === "value")
    return (
      after.value === null || (before.value !== null && sameValue(before.value, after.value, after.class))
    );
  if (field === "mark") return sameMark(before.mark, after.mark);
  if (field === "class") return before.class === after.class || after.class === "other";
  return after[field] === null || plain(before[field]) === plain(after[field]);
}

/** A list tells fitted from not fitted; options and what the builder brings are marked by hand and stay. */
function sameMark(before: LineMark | null, after: LineMark | null): boolean {
  return after === null || before === after || (after === "in-kit" && before !== "do-not-place");
}

function sameNames(a: readonly string[], b: readonly string[]): boolean {
  if (a.length !== b.length) return false;
  const sort = (names: readonly string[]) =>
    names
      .map((name) => name.toUpperCase())
      .sort()
      .join(",");
  return sort(a) === sort(b);
}

function shown(line: ComparableLine, field: ComparedField): string | null {
  const value = line[field];
  if (value === null) return null;
  return Array.isArray(value) ? value.join(", ") : String(value);
}
