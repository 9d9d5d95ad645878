import { crossRate } from "#src/costing/cross-rate.ts";
import { currencyDecimals } from "#src/costing/currencies.ts";
import { decodeUpload } from "./decode-upload.ts";
import { type Changing, noteChange } from "./note-change.ts";
import { Problem } from "./problem.ts";
import { type ReferenceRates, readReferenceRates } from "./read-reference-rates.ts";
import { type CurrencyRateRow, currencyRateOf, setCurrencyRate } from "./store/currency-rate.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { inTransaction } from "./transaction.ts";

/** What a file of reference rates did. */
export interface RatesTaken {
  /** ISO 8601. */
  day: string;
  /** Currencies whose rate of that day is now the file's. */
  set: string[];
  /** Currencies that had this very rate already. */
  same: string[];
  /** Entries of the file that are no rate, and currencies that cannot be reckoned with, as written. */
  left: string[];
}

/** Units for one euro of every currency of the file, the euro itself among them. */
function perEuro({ rates }: ReferenceRates): Map<string, string> {
  return new Map([["EUR", "1"], ...rates.map(({ currency, perEuro }) => [currency, perEuro] as const)]);
}

type Given = Changing & { workshop: WorkshopRow };

function setOne({ db, now }: Given, row: Omit<CurrencyRateRow, "version" | "setAt">): boolean {
  const before = currencyRateOf(db, row);
  if (before?.perForeignUnit === row.perForeignUnit) return false;
  setCurrencyRate(db, { ...row, setAt: now }, before?.version ?? null);
  return true;
}

function takeAll(given: Given, newest: ReferenceRates, reporting: string): RatesTaken {
  const workshopId = given.workshop.id;
  const taken: RatesTaken = { day: newest.day, set: [], same: [], left: [...newest.unread] };
  for (const [currency, foreign] of perEuro(newest)) {
    if (currency === given.workshop.currency) continue;
    const perForeignUnit = crossRate(reporting, foreign);
    if (perForeignUnit === null || currencyDecimals(currency) === null) taken.left.push(currency);
    else {
      const isNew = setOne(given, { workshopId, currency, perForeignUnit, dated: newest.day });
      (isNew ? taken.set : taken.same).push(currency);
    }
  }
  return taken;
}

/**
 * Takes the euro reference rates of a file of the European Central Bank as the workshop's rates of that day, each
 * through the euro into the workshop's currency. A rate of the same day is replaced; other days stay. All or nothing.
 */
export function takeReferenceRates(given: Given, bytes: Uint8Array): RatesTaken {
  const decoded = decodeUpload(bytes);
  const read = decoded.ok ? readReferenceRates(decoded.text) : null;
  if (!read?.ok) throw new Problem("rates-file-unreadable");
  const reporting = perEuro(read.newest).get(given.workshop.currency);
  if (reporting === undefined)
    throw new Problem("rates-lack-own-currency", { parameters: { currency: given.workshop.currency } });
  return inTransaction(given.db, () => {
    const taken = takeAll(given, read.newest, reporting);
    if (taken.set.length > 0)
      noteChange(given, {
        action: "rate.take",
        subjectId: given.workshop.id,
        subjectName: read.newest.day,
        detail: { set: taken.set },
      });
    return taken;
  });
}
