import { and, asc, desc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { currencyRates } from "#db/schema/supply.ts";

export type CurrencyRateRow = typeof currencyRates.$inferSelect;

/** What tells a rate from the others of its workshop. */
export type RateKey = Pick<CurrencyRateRow, "workshopId" | "currency" | "dated">;

function is({ workshopId, currency, dated }: RateKey) {
  return and(
    eq(currencyRates.workshopId, workshopId),
    eq(currencyRates.currency, currency),
    eq(currencyRates.dated, dated),
  );
}

/** By currency, the newest first. */
export function currencyRatesOf(db: Db, workshopId: string): CurrencyRateRow[] {
  return db
    .select()
    .from(currencyRates)
    .where(eq(currencyRates.workshopId, workshopId))
    .orderBy(asc(currencyRates.currency), desc(currencyRates.dated))
    .all();
}

export function currencyRateOf(db: Db, key: RateKey): CurrencyRateRow | undefined {
  return db.select().from(currencyRates).where(is(key)).get();
}

/**
 * Sets the rate of a day, if it still has the version `seen`; `null` means that there was none yet. `undefined`
 * where it has moved on.
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
    .where(and(is(row), eq(currencyRates.version, seen)))
    .returning()
    .get();
}

/** Removes a rate that still has the version `seen`; whether it was there. */
export function removeCurrencyRate(db: Db, key: RateKey, seen: number): boolean {
  return (
    db
      .delete(currencyRates)
      .where(and(is(key), eq(currencyRates.version, seen)))
      .run().changes > 0
  );
}
