import { readLeadTime } from "./lead-time.ts";
import { cellAt, type ListColumns, textAt } from "./list-columns.ts";
import type { PriceDraft } from "./price-draft.ts";
import { readQuantity } from "./quantities.ts";
import { type PriceProblem, readOffers } from "./read-offers.ts";
import type { SheetRecord } from "./sheet.ts";

/** Rows of one supplier with the same order code, else part number, else description, are one offer. */
export function keyOf(draft: PriceDraft): string | null {
  const name = draft.orderCode ?? draft.partNumber ?? draft.value ?? draft.description;
  return name === null
    ? null
    : `${draft.supplier ?? ""}\u001f${name.toUpperCase()}\u001f${draft.orderCode === null ? (draft.package ?? "") : ""}`;
}

/** What one row of a price list says, before rows that belong together are joined. */
export function draftOf(
  record: SheetRecord,
  columns: ListColumns,
  supplier: string | null,
): { draft: PriceDraft; problems: PriceProblem[] } {
  const { cells, row } = record;
  const { offers, problems } = readOffers(cells, columns);
  const [offer] = offers;
  const leadTime = columns.first("lead-time");
  const inWeeks = /week|woche|semaine|semana|týd|tyg/i.test(columns.all("lead-time")[0]?.heading ?? "");
  const draft: PriceDraft = {
    rows: [row],
    supplier: offer?.supplier ?? textAt(cells, columns.first("supplier")) ?? supplier,
    orderCode: offer?.orderCode ?? null,
    manufacturer: textAt(cells, columns.first("manufacturer")),
    partNumber: textAt(cells, columns.first("part-number")),
    description: textAt(cells, columns.first("description")),
    value: textAt(cells, columns.first("value")),
    package: textAt(cells, columns.first("package")),
    currency: offer?.prices[0]?.currency ?? columns.currency,
    breaks: offer?.prices ?? [],
    minimumOrder: countAt(cells, columns, "minimum-order"),
    orderMultiple: countAt(cells, columns, "order-multiple"),
    stockShown: countAt(cells, columns, "stock"),
    leadTimeDays: leadTime === null ? null : readLeadTime(cellAt(cells, leadTime), inWeeks),
    part: null,
    matchedBy: null,
  };
  return { draft, problems };
}

function countAt(
  cells: readonly string[],
  columns: ListColumns,
  meaning: "minimum-order" | "order-multiple" | "stock",
): number | null {
  const column = columns.first(meaning);
  const read = readQuantity(
    cellAt(cells, column).replace(/^[>≥<≤+]\s*|\s*\+$/g, ""),
    column === null ? null : columns.mark(column),
  );
  return read.kind === "number" || read.kind === "measure" ? read.quantity : null;
}
