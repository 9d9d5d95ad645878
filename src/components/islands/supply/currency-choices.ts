import { CURRENCY_DECIMALS } from "#src/costing/currencies.ts";

/** Every currency that amounts can be in, for a field to choose from. */
export const CURRENCY_CHOICES = [...CURRENCY_DECIMALS.keys()]
  .sort()
  .map((code) => ({ value: code, label: code }));
