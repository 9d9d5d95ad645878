import { asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import { boardQuoteBreaks, boardQuotes } from "#db/schema/boards.ts";

export type BoardQuoteRow = typeof boardQuotes.$inferSelect;

/** A board house's quote with its prices, the smallest quantity first. */
export interface QuoteWithBreaks {
  quote: BoardQuoteRow;
  breaks: { quantity: number; price: string }[];
}

/** The quotes for a kit's board, by board house. */
export function boardQuotesOf(db: Db, kitId: string): QuoteWithBreaks[] {
  const rows = db
    .select()
    .from(boardQuotes)
    .where(eq(boardQuotes.kitId, kitId))
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
    .where(eq(boardQuotes.kitId, kitId))
    .orderBy(asc(boardQuoteBreaks.quantity))
    .all();
  const ladders = groupBy(breaks, (row) => row.quoteId);
  return rows.map((quote) => ({
    quote,
    breaks: (ladders.get(quote.id) ?? []).map(({ quantity, price }) => ({ quantity, price })),
  }));
}
