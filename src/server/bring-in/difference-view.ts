import { createHash } from "node:crypto";
import { compressDesignators } from "#src/partslist/designators.ts";
import type { FieldChange, LineChange } from "#src/partslist/difference.ts";
import type { ExistingLine } from "#src/partslist/draft.ts";
import type { PartsReading, PartsSource } from "./read-parts.ts";

/** One line of a difference, in the words of the list that has it. */
export interface DifferenceLine {
  /** Row of the incoming list; `null` for a line that leaves. */
  row: number | null;
  /** Number in the list that stands; `null` for a new one. */
  line: number | null;
  subject: string;
  part: string;
  quantity: number | null;
  changes: FieldChange[];
}

export interface DifferenceView {
  counts: { added: number; removed: number; changed: number; revalued: number; unchanged: number };
  /** The first of each where there are very many. */
  added: DifferenceLine[];
  removed: DifferenceLine[];
  changed: DifferenceLine[];
  revalued: DifferenceLine[];
}

const SHOWN = 200;

type Worded = Pick<ExistingLine, "designators" | "value" | "description" | "package" | "partNumber">;

function subjectOf(line: Worded): string {
  return (
    compressDesignators(line.designators) || line.description || line.value || line.partNumber || "no name"
  );
}

function partOf({ value, package: body, partNumber, description, designators }: Worded): string {
  const name = value ?? partNumber ?? (designators.length > 0 ? description : null);
  return [name, body].filter(Boolean).join(", ");
}

/** The difference as the page shows it. */
export function differenceView(
  { existing }: PartsSource,
  { lines, difference }: PartsReading,
): DifferenceView {
  const standing = new Map(existing.map((line) => [line.id, line]));
  const incoming = new Map(lines.map((line) => [String(line.row), line]));
  const added = (id: string): DifferenceLine[] => {
    const found = incoming.get(id);
    if (!found) return [];
    const { row, line } = found;
    return [
      { row, line: null, subject: subjectOf(line), part: partOf(line), quantity: line.quantity, changes: [] },
    ];
  };
  const removed = (id: string): DifferenceLine[] => {
    const line = standing.get(id);
    if (!line) return [];
    return [
      {
        row: null,
        line: line.line,
        subject: subjectOf(line),
        part: partOf(line),
        quantity: line.quantity,
        changes: [],
      },
    ];
  };
  const changed = ({ current, incoming: row, changes }: LineChange): DifferenceLine[] =>
    removed(current).map((line) => ({ ...line, row: Number(row), changes }));
  return {
    counts: {
      added: difference.added.length,
      removed: difference.removed.length,
      changed: difference.changed.length,
      revalued: difference.revalued.length,
      unchanged: difference.unchanged.length,
    },
    added: difference.added.slice(0, SHOWN).flatMap(added),
    removed: difference.removed.slice(0, SHOWN).flatMap(removed),
    changed: difference.changed.slice(0, SHOWN).flatMap(changed),
    revalued: difference.revalued.slice(0, SHOWN).flatMap(changed),
  };
}

/** What a person has seen of a difference: another text where anything about it is otherwise. */
export function seenStamp(seen: unknown): string {
  return createHash("sha256").update(JSON.stringify(seen)).digest("hex");
}
