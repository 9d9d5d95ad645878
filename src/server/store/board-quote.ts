import { and, asc, eq, type SQL } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import { boardQuoteBreaks, boardQuotes } from "#db/schema/boards.ts";

export type BoardQuoteRow = typeof boardQuotes.$inferSelect;
type NewBoardQuoteRow = typeof boardQuotes.$inferInsert;

/** A board house's quote with its prices, the smallest quantity first. */
export interface QuoteWithBreaks {
  quote: BoardQuoteRow;
  breaks: { quantity: number; price: string }[];
}

/** By board house, then by id, so that the order is always the same. */
function quotesWhere(db: Db, which: SQL | undefined): QuoteWithBreaks[] {
  const rows = db
    .select()
    .from(boardQuotes)
    .where(which)
    .orderBy(asc(boardQuotes.boardHouse), asc(boardQuotes.id))
    .all();
  const breaks = db
    .select({
      quoteId: boardQuoteBreaks.quoteId,
      quantity: boardQuoteBreaks.quantity,
      price: boardQuoteBreaks.price,
    })
    .from(boardQuoteBreaks)
    .innerJoin(boardQuotes, eq(boardQuotes.id, boardQuoteBreaks.quoteId))
    .where(which)
    .orderBy(asc(boardQuoteBreaks.quantity))
    .all();
  const ladders = groupBy(breaks, (row) => row.quoteId);
  return rows.map((quote) => ({
    quote,
    breaks: (ladders.get(quote.id) ?? []).map(({ quantity, price }) => ({ quantity, price })),
  }));
}

/** The quotes for a kit's board. */
export function boardQuotesOf(db: Db, kitId: string): QuoteWithBreaks[] {
  return quotesWhere(db, eq(boardQuotes.kitId, kitId));
}

/** A quote of this kit; one of another kit is not found. */
export function boardQuoteOf(db: Db, kitId: string, quoteId: string): QuoteWithBreaks | undefined {
  return quotesWhere(db, and(eq(boardQuotes.kitId, kitId), eq(boardQuotes.id, quoteId)))[0];
}

function setBreaks(db: Db, quote: BoardQuoteRow, breaks: QuoteWithBreaks["breaks"]): void {
  db.delete(boardQuoteBreaks).where(eq(boardQuoteBreaks.quoteId, quote.id)).run();
  const rows = breaks.map(({ quantity, price }) => ({
    workshopId: quote.workshopId,
    quoteId: quote.id,
    quantity,
    price,
  }));
  if (rows.length > 0) db.insert(boardQuoteBreaks).values(rows).run();
}

export function addBoardQuote(
  db: Db,
  row: NewBoardQuoteRow,
  breaks: QuoteWithBreaks["breaks"],
): BoardQuoteRow {
  const quote = db.insert(boardQuotes).values(row).returning().get();
  setBreaks(db, quote, breaks);
  return quote;
}

/** Changes a quote and its prices if it still has the version `seen`; `undefined` where it has moved on. */
export function changeBoardQuote(
  db: Db,
  quoteId: string,
  seen: number,
  change: Partial<BoardQuoteRow>,
  breaks: QuoteWithBreaks["breaks"],
): BoardQuoteRow | undefined {
  const quote = db
    .update(boardQuotes)
    .set({ ...change, version: seen + 1 })
    .where(and(eq(boardQuotes.id, quoteId), eq(boardQuotes.version, seen)))
    .returning()
    .get();
  if (quote) setBreaks(db, quote, breaks);
  return quote;
}

/** Removes a quote that still has the version `seen`; whether it was there. */
export function removeBoardQuote(db: Db, quoteId: string, seen: number): boolean {
  const gone = db
    .delete(boardQuotes)
    .where(and(eq(boardQuotes.id, quoteId), eq(boardQuotes.version, seen)))
    .run();
  return gone.changes > 0;
}

/** Currencies that quotes of a workshop are in. */
export function quotedCurrencies(db: Db, workshopId: string): string[] {
  const rows = db
    .selectDistinct({ currency: boardQuotes.currency })
    .from(boardQuotes)
    .where(eq(boardQuotes.workshopId, workshopId))
    .all();
  return rows.map(({ currency }) => currency).sort();
}
