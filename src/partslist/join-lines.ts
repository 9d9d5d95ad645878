import { compareDesignators } from "./designators.ts";
import type { DraftLine, JoinOffer, Row } from "./draft.ts";

/** What two lines must have in common to be the same part. */
function identity(line: DraftLine): string {
  const value = line.reading === null ? line.value : `${line.reading.si} ${line.reading.unit}`;
  const offers = line.offers.map((offer) => `${offer.supplier ?? ""} ${offer.orderCode ?? ""}`).join(";");
  return [
    line.class,
    value,
    line.package,
    line.partNumber,
    line.manufacturer,
    line.description,
    line.mark,
    line.note,
    line.tolerance,
    line.power,
    line.voltage,
    line.holeSpacing,
    line.drawer,
    offers,
  ].join("\u001f");
}

/** Groups of two and more lines that say the same part: one row for each designator, grown from a drawing. */
export function joinOffers(rows: readonly Row[]): JoinOffer[] {
  const alike = new Map<string, Placed[]>();
  for (const row of rows) {
    if ((row.kind !== "line" && row.kind !== "question") || row.line === null) continue;
    const { line } = row;
    if (line.designators.length === 0) continue;
    // Most lines of a list differ in one text; only those that do not are compared whole.
    const key = line.partNumber ?? line.description ?? line.reading?.si ?? line.value;
    if (key === null) continue;
    const group = alike.get(key);
    if (group) group.push({ row: row.row, line });
    else alike.set(key, [{ row: row.row, line }]);
  }
  return [...alike.values()]
    .filter((group) => group.length > 1)
    .flatMap(equalGroups)
    .map(offerOf)
    .sort((a, b) => (a.rows[0] ?? 0) - (b.rows[0] ?? 0));
}

interface Placed {
  row: number;
  line: DraftLine;
}

function equalGroups(candidates: readonly Placed[]): Placed[][] {
  const groups = new Map<string, Placed[]>();
  for (const one of candidates) {
    const key = identity(one.line);
    const group = groups.get(key);
    if (group) group.push(one);
    else groups.set(key, [one]);
  }
  return [...groups.values()].filter((group) => group.length > 1);
}

function offerOf(group: readonly Placed[]): JoinOffer {
  const quantities = group.map(({ line }) => line.quantity);
  return {
    rows: group.map(({ row }) => row),
    designators: group.flatMap(({ line }) => line.designators).sort(compareDesignators),
    quantity: quantities.includes(null)
      ? null
      : quantities.reduce<number>((sum, quantity) => sum + (quantity ?? 0), 0),
  };
}

/** The rows with the offered groups joined into their first rows; a row that has an open question stays for itself. */
export function joinEqualLines(rows: readonly Row[], offers: readonly JoinOffer[]): Row[] {
  const byRow = new Map(rows.map((row) => [row.row, row]));
  const joined = new Map<number, Row>();
  for (const offer of offers) {
    const members = offer.rows.map((row) => byRow.get(row)).filter((row) => row?.kind === "line");
    const first = members[0];
    if (first?.kind !== "line" || members.length < 2) continue;
    const lines = members.flatMap((row) => (row?.kind === "line" ? [row.line] : []));
    const { designators, quantity } = offerOf(lines.map((line) => ({ row: 0, line })));
    joined.set(first.row, {
      ...first,
      line: {
        ...first.line,
        designators,
        quantity,
        designatorText: lines.map((line) => line.designatorText).join(", "),
      },
    });
    for (const row of members.slice(1)) {
      if (row === undefined) continue;
      const { kind: _, ...place } = { ...row, line: undefined };
      joined.set(row.row, {
        row: place.row,
        record: place.record,
        text: place.text,
        questions: place.questions,
        kind: "joined",
        into: first.row,
      });
    }
  }
  return rows.map((row) => joined.get(row.row) ?? row);
}
