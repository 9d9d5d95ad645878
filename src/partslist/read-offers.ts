import type { ReadOffer, ReadPrice } from "./draft.ts";
import { cellAt, type ListColumns, textAt } from "./list-columns.ts";
import type { ColumnMeaning } from "./mapping.ts";
import { readMoney } from "./prices.ts";

/** A price cell that is no plain price: per so many, or not to be read at all. */
export interface PriceProblem {
  column: number;
  text: string;
  /** From how many pieces the price holds, as heading or column say; 1 where they do not. */
  quantity: number;
  /** For "0,66/100". */
  per: { amount: string; per: number; each: string; currency: string | null } | null;
}

/**
 * The offers a row names: an order code under its supplier's name, or a supplier column beside it; prices
 * belong to the first offer unless their heading names a supplier.
 */
export function readOffers(
  cells: readonly string[],
  columns: ListColumns,
): { offers: ReadOffer[]; problems: PriceProblem[] } {
  const offers: ReadOffer[] = [];
  const suppliers = columns.all("supplier");
  columns.all("order-code").forEach((code, at) => {
    const orderCode = textAt(cells, code.column);
    const supplier = code.supplier ?? supplierFor(cells, suppliers, at);
    if (orderCode !== null && !/^dn[pf]$/i.test(orderCode)) offers.push({ supplier, orderCode, prices: [] });
  });
  if (offers.length === 0)
    for (const one of suppliers) {
      const supplier = textAt(cells, one.column);
      if (supplier !== null) offers.push({ supplier, orderCode: null, prices: [] });
    }
  const problems: PriceProblem[] = [];
  const prices = readPrices(cells, columns, problems);
  if (prices.length > 0 || problems.length > 0) {
    if (offers.length === 0) offers.push({ supplier: null, orderCode: null, prices: [] });
    offers[0]?.prices.push(...prices);
  }
  return { offers, problems };
}

/** The supplier column of the same rank as the order code; a single supplier column holds for all. */
function supplierFor(
  cells: readonly string[],
  suppliers: readonly ColumnMeaning[],
  at: number,
): string | null {
  const ranked = suppliers.length > 1 ? suppliers[at] : suppliers[0];
  return ranked === undefined ? null : textAt(cells, ranked.column);
}

function readPrices(cells: readonly string[], columns: ListColumns, problems: PriceProblem[]): ReadPrice[] {
  const prices: ReadPrice[] = [];
  const fromColumn = columns.first("break-quantity");
  const priced = [...columns.all("price-each"), ...columns.all("price-break")];
  for (const column of priced) {
    const text = cellAt(cells, column.column);
    const read = readMoney(text, column.decimalMark);
    const listed = textAt(cells, columns.first("currency")) ?? columns.currency;
    const quantity = column.breakQuantity ?? (Number(cellAt(cells, fromColumn)) || 1);
    if (read.kind === "price")
      prices.push({ quantity, amount: read.amount, currency: read.currency ?? listed });
    if (read.kind === "unclear") problems.push({ column: column.column, text, quantity, per: null });
    if (read.kind === "per") {
      const { amount, per, each, currency } = read;
      problems.push({
        column: column.column,
        text,
        quantity,
        per: { amount, per, each, currency: currency ?? listed },
      });
    }
  }
  return prices.sort((a, b) => a.quantity - b.quantity);
}
