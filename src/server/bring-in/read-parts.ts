import { type ComparableLine, type ListDifference, listDifference } from "#src/partslist/difference.ts";
import type { DraftLine, ExistingLine, ReadResult, Row } from "#src/partslist/draft.ts";
import { readList } from "#src/partslist/read-list.ts";
import { NAME_LENGTH, TEXT_LENGTH } from "#src/shapes/limits.ts";
import { type ListDraft, type ListSource, openList } from "./list-draft.ts";

/** A parts list and what it is compared with. */
export interface PartsSource extends ListSource {
  existing: ExistingLine[];
}

/** A line that would be taken, with the row it stands in. */
export interface ReadPartsLine {
  row: number;
  line: DraftLine;
}

/** Everything that follows from a parts list, its decisions, and the list as it stands. */
export interface PartsReading {
  draft: ListDraft;
  result: ReadResult;
  /** The lines there will be, in the list's order, suggestions carried out where a question is open. */
  lines: ReadPartsLine[];
  difference: ListDifference;
}

function clipped(text: string | null, most: number): string | null {
  return text === null ? null : text.slice(0, most);
}

/** A line within the limits of what can be kept; longer texts are cut before they are compared. */
function withinLimits(line: DraftLine): DraftLine {
  return {
    ...line,
    value: clipped(line.value, NAME_LENGTH),
    description: clipped(line.description, TEXT_LENGTH),
    package: clipped(line.package, NAME_LENGTH),
    manufacturer: clipped(line.manufacturer, NAME_LENGTH),
    partNumber: clipped(line.partNumber, NAME_LENGTH),
    drawer: clipped(line.drawer, NAME_LENGTH),
    note: clipped(line.note, TEXT_LENGTH),
    datasheet: clipped(line.datasheet, TEXT_LENGTH),
    offers: line.offers.map((offer) => ({
      ...offer,
      supplier: clipped(offer.supplier, NAME_LENGTH),
      orderCode: clipped(offer.orderCode, NAME_LENGTH),
    })),
  };
}

function lineOf(row: Row): ReadPartsLine[] {
  const line = row.kind === "line" || row.kind === "question" ? row.line : null;
  return line === null ? [] : [{ row: row.row, line: withinLimits(line) }];
}

/** Incoming lines for the comparison. Marks count only where the list speaks of them at all. */
function comparable(lines: readonly ReadPartsLine[]): ComparableLine[] {
  const marked = lines.some(({ line }) => line.markFrom !== null);
  return lines.map(({ row, line }) => ({
    id: String(row),
    designators: line.designators,
    quantity: line.quantity,
    class: line.class,
    value: line.value,
    description: line.description,
    package: line.package,
    manufacturer: line.manufacturer,
    partNumber: line.partNumber,
    mark: marked ? line.mark : null,
    note: line.note,
    drawer: line.drawer,
  }));
}

/** Reads a parts list as far as the difference to the list that stands. The same source gives the same reading. */
export function readParts(source: PartsSource): PartsReading {
  const draft = openList(source);
  const result = readList({
    records: draft.sheet.records,
    mapping: draft.mapping,
    answers: source.decisions.answers,
    join: source.decisions.join,
    existingLines: source.existing,
  });
  const lines = result.rows.flatMap(lineOf);
  return { draft, result, lines, difference: listDifference(source.existing, comparable(lines)) };
}
