import { currencyDecimals } from "#src/costing/currencies.ts";
import type { CurrencyRateInput } from "#src/shapes/currency-rate.ts";
import { beforeAndAfter } from "./before-and-after.ts";
import { type Changing, clash, noteChange, type Where } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import {
  type CurrencyRateRow,
  currencyRateOf,
  currencyRatesOf,
  removeCurrencyRate,
  setCurrencyRate,
} from "./store/currency-rate.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { inTransaction } from "./transaction.ts";

/** A rate as people see it. */
export type RateView = Omit<CurrencyRateRow, "workshopId">;

function view({ workshopId: _, ...row }: CurrencyRateRow): RateView {
  return row;
}

/** The rates of a workshop, by currency. */
export function rates({ db, workshop }: Where): RateView[] {
  return currencyRatesOf(db, workshop.id).map(view);
}

/** The log knows a rate by its workshop and currency. */
function subject({ workshop }: Changing, currency: string): string {
  return `${workshop.id}:${currency}`;
}

/** Sets what one unit of a foreign currency is worth, by hand, as of a day. */
export function setRate(
  given: Changing & { workshop: WorkshopRow },
  currency: string,
  { version, ...input }: CurrencyRateInput,
): RateView {
  const { db, workshop, now } = given;
  if (currencyDecimals(currency) === null)
    throw wrongField("currency", "No currency of ISO 4217 has these letters. US dollar is USD.");
  if (currency === workshop.currency)
    throw wrongField("currency", `The workshop reckons in ${currency}; it needs no rate for that.`);
  return inTransaction(db, () => {
    const before = currencyRateOf(db, workshop.id, currency);
    const row = { workshopId: workshop.id, currency, ...input, setAt: now };
    const after = setCurrencyRate(db, row, version);
    if (!after)
      throw before ? clash(given, subject(given, currency), view(before)) : new Problem("not-found");
    const detail = before ? beforeAndAfter(before, input) : input;
    noteChange(given, {
      action: "rate.set",
      subjectId: subject(given, currency),
      subjectName: currency,
      detail: { ...detail },
    });
    return view(after);
  });
}

/** Removes a rate: figures that need it then say so. */
export function removeRate(given: Changing, currency: string, version: number): void {
  const { db, workshop } = given;
  inTransaction(db, () => {
    const before = currencyRateOf(db, workshop.id, currency);
    if (!before) throw new Problem("not-found");
    if (!removeCurrencyRate(db, workshop.id, currency, version))
      throw clash(given, subject(given, currency), view(before));
    const subjectId = subject(given, currency);
    noteChange(given, { action: "rate.remove", subjectId, subjectName: currency });
  });
}
