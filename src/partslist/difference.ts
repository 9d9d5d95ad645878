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

/** Two lines with designators of which none is shared are two lines, except where one side has none. */
function mayBeTheSame(line: ComparableLine, other: ComparableLine): boolean {
  return (
    line.designators.length === 0 ||
    other.designators.length === 0 ||
    fullIdentity(line) === fullIdentity(other)
  );
}

function fullIdentity(line: ComparableLine): string | null {
  const part = partIdentity(line);
  return part === null ? null : `${part}\u001f${plain(line.description)}\u001f${line.quantity}`;
}

function partIdentity(line: ComparableLine): string | null {
  if (line.partNumber !== null) return `n\u001f${plain(line.partNumber)}`;
  return line.value === null && line.description === null
    ? null
    : `v\u001f${line.class}\u001f${meaning(line)}\u001f${plain(line.package)}\u001f${line.value === null ? plain(line.description) : ""}`;
}

function nameIdentity(line: ComparableLine): string | null {
  return line.designators.length > 0 || (line.description === null && line.value === null)
    ? null
    : `d\u001f${plain(line.description ?? line.value)}`;
}

function plain(text: string | null): string {
  return (text ?? "").trim().toLowerCase().replace(/\s+/g, " ");
}

/** A value by what it means, else by its letters. */
function meaning(line: ComparableLine): string {
  return line.value === null ? "" : textMeaning(line.value, line.class);
}

function textMeaning(value: string, partClass: PartClass): string {
  const reading = readValue(value, partClass);
  return reading === null ? plain(value) : `${reading.si} ${reading.unit} ${afterValue(value)}`;
}

/** What else stands in a value cell ("100n 50V") counts as well. */
function afterValue(value: string): string {
  return plain(value)
    .split(/[\s,/]+/)
    .slice(1)
    .filter((word) => !/^(?:[kmunpµ]?(?:ω|ohms?|f|h))$/.test(word))
    .join(" ");
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
    return after.value === null || (before.value !== null && meaning(before) === meaning(after));
  if (field === "mark") return sameMark(before.mark, after.mark);
  if (field === "class") return before.class === after.class || after.class === "other";
  return after[field] === null || plain(before[field]) === plain(after[field]);
}

/** A list tells fitted from not fitted; options and what the builder brings are marked by hand and stay. */
function sameMark(before: LineMark | null, after: LineMark | null): boolean {
  return after === null || before === after || (after === "in-kit" && before !== "do-not-place");
}

/** Whether two texts mean the same value for a part of this class: "4k7" and "4.7 kΩ". */
export function sameValue(a: string, b: string, partClass: PartClass): boolean {
  return textMeaning(a, partClass) === textMeaning(b, partClass);
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
