import { CLASS_WORDS, MARK_WORDS } from "#src/components/part-words.ts";
import { classFromColumn, classFromDesignator } from "#src/partslist/classes.ts";
import { readDesignators } from "#src/partslist/designators.ts";
import { readQuantity } from "#src/partslist/quantities.ts";
import { formatReading } from "#src/partslist/value-format.ts";
import { readValue } from "#src/partslist/values.ts";
import type { PricedPartsList } from "#src/server/present.ts";
import {
  type LineMark,
  NAME_LENGTH,
  type PartClass,
  QUANTITY_PER_KIT_MOST,
  TEXT_LENGTH,
} from "#src/shapes/limits.ts";
import type { PartFields } from "#src/shapes/part.ts";
import type { Line, Step } from "./steps.ts";

/** Columns in which one can write; a quantity column names its edition. */
export type CellColumn =
  | "designators"
  | `quantity:${string}`
  | "part"
  | "package"
  | "drawer"
  | "class"
  | "mark"
  | "note"
  | "partNumber";

/** What a cell's text comes to: steps, none where it says what is there already, or a sentence that says what is right. */
export type ReadCell = { ok: true; steps: Step[] } | { ok: false; message: string };

const nothing: ReadCell = { ok: true, steps: [] };
const wrong = (message: string): ReadCell => ({ ok: false, message });

/** A part whose value is told by this text: "4k7, 5 %" is named 4.7 kΩ, with the value in ohms. */
export function partFromText(
  text: string,
  kind: PartClass,
): Required<Pick<PartFields, "name" | "spec" | "value" | "unit">> {
  const comma = text.indexOf(",");
  const first = (comma < 0 ? text : text.slice(0, comma)).trim();
  const spec = comma < 0 ? "" : text.slice(comma + 1).trim();
  const read = readValue(first, kind);
  if (!read || read.unit === "W") return { name: first, spec, value: null, unit: null };
  const bare = first.replace(/[\s\u00a0]/g, "").length <= 8;
  return { name: bare ? formatReading(read) : first, spec, value: read.si, unit: read.unit };
}

/** How a part is written in one cell: name, then the rest after a comma. */
export function partText({ name, spec }: { name: string; spec: string }): string {
  return spec === "" ? name : `${name}, ${spec}`;
}

function tooLong(text: string, most: number): ReadCell | null {
  return text.length > most ? wrong(`Write at most ${most} characters.`) : null;
}

/** What tells one part from another belongs to this line alone where other lines or kits use the part. */
function identitySteps(list: PricedPartsList, line: Line, set: PartFields): Step[] {
  const shared =
    line.part.alsoIn.length > 0 || list.lines.some((one) => one !== line && one.part.id === line.part.id);
  return shared ? [{ do: "own-part", line: line.id, set }] : [{ do: "change-part", part: line.part.id, set }];
}

function readDesignatorCell(list: PricedPartsList, line: Line, text: string): ReadCell {
  const { designators, unclear } = readDesignators(text);
  if (unclear.length > 0)
    return wrong(`“${unclear.join(", ")}” is not a designator. Write them as R1, R2 or R4-R9.`);
  const written = [...new Set(designators)].join(", ");
  if (written === line.designators) return nothing;
  const before = line.designators === "" ? 0 : line.designators.split(", ").length;
  // A quantity that was the number of designators stays the number of designators.
  const follow = list.editions.filter(({ id }) => before > 0 && line.quantities[id] === before);
  const count = new Set(designators).size;
  const quantities = Object.fromEntries(follow.map(({ id }) => [id, count]));
  const set = { designators: written, ...(follow.length > 0 && count > 0 && { quantities }) };
  return { ok: true, steps: [{ do: "change-line", line: line.id, set }] };
}

function readQuantityCell(line: Line, edition: string, text: string): ReadCell {
  const read = readQuantity(text.replace(/[\u00a0\s]/g, ""));
  const quantity = read.kind === "empty" ? 0 : read.kind === "number" ? read.quantity : null;
  if (quantity === null) return wrong(`“${text}” is not a number of pieces. Write a whole number.`);
  if (quantity > QUANTITY_PER_KIT_MOST) return wrong(`Write at most ${QUANTITY_PER_KIT_MOST}.`);
  if (quantity === (line.quantities[edition] ?? 0)) return nothing;
  return {
    ok: true,
    steps: [{ do: "change-line", line: line.id, set: { quantities: { [edition]: quantity } } }],
  };
}

function readPartCell(list: PricedPartsList, line: Line, text: string): ReadCell {
  const plain = text.trim();
  if (plain === partText(line.part)) return nothing;
  if (plain === "") return wrong("A line has a part. Remove the line if it is not needed.");
  const set = partFromText(plain, line.part.class);
  if (set.name === "") return wrong("Begin with what the part is called, then the rest after a comma.");
  return (
    tooLong(set.name, NAME_LENGTH) ??
    tooLong(set.spec, TEXT_LENGTH) ?? { ok: true, steps: identitySteps(list, line, set) }
  );
}

function readClassCell(line: Line, text: string): ReadCell {
  const plain = text.trim().toLowerCase();
  const named = (Object.keys(CLASS_WORDS) as PartClass[]).find(
    (kind) =>
      kind === plain ||
      CLASS_WORDS[kind].one.toLowerCase() === plain ||
      CLASS_WORDS[kind].many.toLowerCase() === plain,
  );
  const kind = named ?? classFromColumn(plain);
  if (kind === null) return wrong(`“${text}” is no kind of part that is known here.`);
  if (kind === line.part.class) return nothing;
  const read = readValue(line.part.name, kind);
  const value = read && read.unit !== "W" ? { value: read.si, unit: read.unit } : { value: null, unit: null };
  return { ok: true, steps: [{ do: "change-part", part: line.part.id, set: { class: kind, ...value } }] };
}

function readMarkCell(line: Line, text: string): ReadCell {
  const plain = text.trim().toLowerCase();
  const mark = (Object.keys(MARK_WORDS) as LineMark[]).find(
    (one) => one === plain || MARK_WORDS[one].toLowerCase() === plain.replace("'", "’"),
  );
  if (!mark) return wrong(`“${text}” is none of: ${Object.values(MARK_WORDS).join(", ")}.`);
  if (mark === line.mark) return nothing;
  return { ok: true, steps: [{ do: "change-line", line: line.id, set: { mark } }] };
}

/** What somebody wrote into a cell of a line. */
export function readCell(list: PricedPartsList, line: Line, column: CellColumn, text: string): ReadCell {
  if (column.startsWith("quantity:")) return readQuantityCell(line, column.slice(9), text);
  const plain = text.trim();
  const part = line.part;
  switch (column) {
    case "designators":
      return tooLong(plain, TEXT_LENGTH) ?? readDesignatorCell(list, line, plain);
    case "part":
      return readPartCell(list, line, text);
    case "class":
      return readClassCell(line, text);
    case "mark":
      return readMarkCell(line, text);
    case "package":
      if (plain === part.package) return nothing;
      return (
        tooLong(plain, NAME_LENGTH) ?? { ok: true, steps: identitySteps(list, line, { package: plain }) }
      );
    case "partNumber":
      if (plain === part.manufacturerPartNumber) return nothing;
      return (
        tooLong(plain, NAME_LENGTH) ?? {
          ok: true,
          steps: identitySteps(list, line, { manufacturerPartNumber: plain }),
        }
      );
    case "drawer":
      if (plain === part.drawer) return nothing;
      return (
        tooLong(plain, NAME_LENGTH) ?? {
          ok: true,
          steps: [{ do: "change-part", part: part.id, set: { drawer: plain } }],
        }
      );
    case "note":
      if (plain === line.note) return nothing;
      return (
        tooLong(plain, TEXT_LENGTH) ?? {
          ok: true,
          steps: [{ do: "change-line", line: line.id, set: { note: plain } }],
        }
      );
    default:
      return wrong("This column is worked out and cannot be written in.");
  }
}

/** A line that is being written: what stands in its cells so far. */
export type DraftCells = Partial<Record<CellColumn, string>>;

/** The kind of part its first designator or the words themselves tell. */
function kindOf(designators: readonly string[], part: string): PartClass {
  const first = designators[0];
  return (first === undefined ? null : classFromDesignator(first)) ?? classFromColumn(part) ?? "other";
}

/** The editions a new line goes into unless somebody says otherwise: those that have at least half of the list. */
function usualEditions(list: PricedPartsList): string[] {
  const holds = (edition: string) => list.lines.filter(({ quantities }) => quantities[edition]).length;
  return list.editions.map(({ id }) => id).filter((id) => holds(id) * 2 >= list.lines.length);
}

/**
 * A new line from what was written into its cells. A quantity that was not written is the number of designators,
 * or one, in the editions that have most of the list; a bare board does not get every resistor.
 */
export function lineFromCells(list: PricedPartsList, id: string, cells: DraftCells, at?: number): ReadCell {
  const { designators, unclear } = readDesignators(cells.designators ?? "");
  if (unclear.length > 0)
    return wrong(`“${unclear.join(", ")}” is not a designator. Write them as R1, R2 or R4-R9.`);
  const part = (cells.part ?? "").trim();
  if (part === "") return wrong("A new line needs its part, such as 10 kΩ, 5 %.");
  const kind = kindOf(designators, part);
  const quantities: Record<string, number> = {};
  const usual = usualEditions(list);
  for (const { id: edition } of list.editions) {
    const text = (cells[`quantity:${edition}`] ?? "").replace(/[\u00a0\s]/g, "");
    const read = readQuantity(text);
    if (read.kind !== "number" && read.kind !== "empty")
      return wrong(`“${text}” is not a number of pieces. Write a whole number.`);
    const unsaid = usual.includes(edition) ? Math.max(1, designators.length) : 0;
    quantities[edition] = read.kind === "number" ? read.quantity : unsaid;
  }
  const step: Step = {
    do: "add-line",
    line: id,
    at,
    designators: [...new Set(designators)].join(", "),
    mark: "in-kit",
    note: cells.note ?? "",
    quantities,
    part: {
      ...partFromText(part, kind),
      class: kind,
      package: (cells.package ?? "").trim(),
      drawer: (cells.drawer ?? "").trim(),
    },
  };
  return { ok: true, steps: [step] };
}
