import { currencyDecimals } from "#src/costing/currencies.ts";
import type { CurrencyRateInput, RateRemoval } from "#src/shapes/currency-rate.ts";
import { beforeAndAfter } from "./before-and-after.ts";
import { type Changing, clash, noteChange, type Where } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import {
  type CurrencyRateRow,
  currencyRateOf,
  currencyRatesOf,
  type RateKey,
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

/** The rates of a workshop, by currency, the newest first. */
export function rates({ db, workshop }: Where): RateView[] {
  return currencyRatesOf(db, workshop.id).map(view);
}

/** The log knows a rate by its workshop, currency and day. */
function subject({ workshopId, currency, dated }: RateKey): string {
  return `${workshopId}:${currency}:${dated}`;
}

/** Sets what one unit of a foreign currency is worth, by hand, from a day on. Earlier rates stay. */
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
    const row = { workshopId: workshop.id, currency, ...input, setAt: now };
    const before = currencyRateOf(db, row);
    const after = setCurrencyRate(db, row, version);
    if (!after) throw before ? clash(given, subject(row), view(before)) : new Problem("not-found");
    const detail = before ? beforeAndAfter(before, input) : input;
    noteChange(given, {
      action: "rate.set",
      subjectId: subject(row),
      subjectName: currency,
      detail: { ...detail },
    });
    return view(after);
  });
}

/** Removes the rate of a day: an earlier one holds again, or figures that need one say so. */
export function removeRate(given: Changing, currency: string, { dated, version }: RateRemoval): void {
  const { db, workshop } = given;
  const key = { workshopId: workshop.id, currency, dated };
  inTransaction(db, () => {
    const before = currencyRateOf(db, key);
    if (!before) throw new Problem("not-found");
    if (!removeCurrencyRate(db, key, version)) throw clash(given, subject(key), view(before));
    noteChange(given, { action: "rate.remove", subjectId: subject(key), subjectName: currency });
  });
}
