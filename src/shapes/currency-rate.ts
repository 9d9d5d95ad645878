import { z } from "zod";
import { ConversionRate, Day } from "./decimal-text.ts";
import { Version } from "./field.ts";

/** A rate set by hand: reporting units per one foreign unit, and its day. `version` is null for a first rate. */
export const CurrencyRateInput = z.strictObject({
  perForeignUnit: ConversionRate,
  dated: Day,
  version: Version.nullable(),
});
export type CurrencyRateInput = z.infer<typeof CurrencyRateInput>;
