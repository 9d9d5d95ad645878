import type { z } from "zod";
import { currencyDecimals } from "#src/costing/currencies.ts";
import { CurrencyCode } from "./decimal-text.ts";

/** A currency one can pay in: three letters that stand on the ISO 4217 list. */
export const ListedCurrency = CurrencyCode.refine((code) => currencyDecimals(code) !== null, {
  error: "No currency of ISO 4217 has these letters. Euro is EUR, US dollar USD.",
});

function decimalsOf(amount: string): number {
  return amount.split(".")[1]?.replace(/0+$/, "").length ?? 0;
}

/**
 * Refuses amounts of money with more decimals than their currency is charged in, naming each field.
 * Unit prices are not such amounts: they may have six.
 */
export function checkMinorUnit<T extends { currency: string }>(fields: readonly (keyof T & string)[]) {
  return (value: T, context: z.RefinementCtx<T>): void => {
    const most = currencyDecimals(value.currency);
    if (most === null) return;
    for (const field of fields) {
      const amount = value[field];
      if (typeof amount !== "string" || decimalsOf(amount) <= most) continue;
      const message =
        most === 0
          ? `${value.currency} has no decimals. Write a whole amount.`
          : `${value.currency} has ${most} decimals. Write at most ${most}.`;
      context.addIssue({ code: "custom", path: [field], message });
    }
  };
}
