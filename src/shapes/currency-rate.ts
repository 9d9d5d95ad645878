import { z } from "zod";
import { ConversionRate, Day } from "./decimal-text.ts";
import { RemovalQuery, Version } from "./field.ts";

/** A rate set by hand: reporting units per one foreign unit, and its day. `version` is null for a new day. */
export const CurrencyRateInput = z.strictObject({
  perForeignUnit: ConversionRate,
  dated: Day,
  version: Version.nullable(),
});
export type CurrencyRateInput = z.infer<typeof CurrencyRateInput>;

/** Which rate of a currency goes. */
export const RateRemoval = RemovalQuery.extend({ dated: Day });
export type RateRemoval = z.infer<typeof RateRemoval>;
