/** A line as it is compared: by what stands on paper, not by who keeps it. */
export interface ComparedLine {
  id: string;
  designators: string;
  mark: string;
  note: string;
  quantities: Readonly<Record<string, number>>;
  part: Readonly<Record<(typeof PART_FIELDS)[number], string>>;
}

/** What of a part is compared; where it lies in a drawer is no part of a revision. */
const PART_FIELDS = ["class", "name", "spec", "package", "manufacturer", "manufacturerPartNumber"] as const;

export type ComparedField =
  | "designators"
  | "mark"
  | "note"
  | (typeof PART_FIELDS)[number]
  | `quantity:${string}`;

export interface FieldChange {
  field: ComparedField;
  before: string;
  after: string;
}

export interface ChangedLine<Line> {
  before: Line;
  after: Line;
  fields: FieldChange[];
}

export interface ListChange<Line> {
  added: Line[];
  removed: Line[];
  changed: ChangedLine<Line>[];
}

function fieldsOf(line: ComparedLine): Map<ComparedField, string> {
  const fields = new Map<ComparedField, string>([
    ["designators", line.designators],
    ["mark", line.mark],
    ["note", line.note],
  ]);
  for (const field of PART_FIELDS) fields.set(field, line.part[field]);
  for (const [edition, perKit] of Object.entries(line.quantities))
    if (perKit > 0) fields.set(`quantity:${edition}`, String(perKit));
  return fields;
}

/** The fields in which two lines differ, each with what stood and what stands; a quantity of none is "0". */
export function lineChanges(before: ComparedLine, after: ComparedLine): FieldChange[] {
  const [old, now] = [fieldsOf(before), fieldsOf(after)];
  const none = (field: ComparedField) => (field.startsWith("quantity:") ? "0" : "");
  return [...new Set([...old.keys(), ...now.keys()])]
    .map((field) => ({ field, before: old.get(field) ?? none(field), after: now.get(field) ?? none(field) }))
    .filter((change) => change.before !== change.after);
}

/** What is different between a parts list as it stood and as it stands: lines added, removed, changed. */
export function compareLists<Line extends ComparedLine>(
  before: readonly Line[],
  after: readonly Line[],
): ListChange<Line> {
  const byId = new Map(before.map((line) => [line.id, line]));
  const kept = new Set(after.filter(({ id }) => byId.has(id)).map(({ id }) => id));
  // Lines with the same designators are the same line written anew; without any it is known by its id alone.
  const rewritten = new Map(
    before
      .filter(({ id, designators }) => !kept.has(id) && designators !== "")
      .map((line) => [line.designators, line]),
  );
  const met = new Set<string>();
  const result: ListChange<Line> = { added: [], removed: [], changed: [] };
  for (const line of after) {
    const old = byId.get(line.id) ?? rewritten.get(line.designators);
    if (!old || met.has(old.id)) result.added.push(line);
    else {
      met.add(old.id);
      const fields = lineChanges(old, line);
      if (fields.length > 0) result.changed.push({ before: old, after: line, fields });
    }
  }
  result.removed = before.filter(({ id }) => !met.has(id));
  return result;
}
