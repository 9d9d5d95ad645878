import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { currencyRates } from "#db/schema/supply.ts";

export type CurrencyRateRow = typeof currencyRates.$inferSelect;

export function currencyRatesOf(db: Db, workshopId: string): CurrencyRateRow[] {
  return db
    .select()
    .from(currencyRates)
    .where(eq(currencyRates.workshopId, workshopId))
    .orderBy(asc(currencyRates.currency))
    .all();
}

export function currencyRateOf(db: Db, workshopId: string, currency: string): CurrencyRateRow | undefined {
  return db
    .select()
    .from(currencyRates)
    .where(and(eq(currencyRates.workshopId, workshopId), eq(currencyRates.currency, currency)))
    .get();
}

/**
 * Sets a rate, if it still has the version `seen`; `null` means that there was none yet. `undefined` where
 * it has moved on.
 */
export function setCurrencyRate(
  db: Db,
  row: Omit<CurrencyRateRow, "version">,
  seen: number | null,
): CurrencyRateRow | undefined {
  if (seen === null) return db.insert(currencyRates).values(row).onConflictDoNothing().returning().get();
  return db
    .update(currencyRates)
    .set({ ...row, version: seen + 1 })
    .where(
      and(
        eq(currencyRates.workshopId, row.workshopId),
        eq(currencyRates.currency, row.currency),
        eq(currencyRates.version, seen),
      ),
    )
    .returning()
    .get();
}

/** Removes a rate that still has the version `seen`; whether it was there. */
export function removeCurrencyRate(db: Db, workshopId: string, currency: string, seen: number): boolean {
  const gone = db
    .delete(currencyRates)
    .where(
      and(
        eq(currencyRates.workshopId, workshopId),
        eq(currencyRates.currency, currency),
        eq(currencyRates.version, seen),
      ),
    )
    .run();
  return gone.changes > 0;
}
