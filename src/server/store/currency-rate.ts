import { asc, eq } from "drizzle-orm";
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
