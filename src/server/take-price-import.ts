import type { z } from "zod";
import type { TakeBack, TakeList } from "#src/shapes/import.ts";
import { seenStamp } from "./bring-in/difference-view.ts";
import { draftAt } from "./bring-in/import-at.ts";
import { keepTaken, refuseUnsettled } from "./bring-in/keep-taken.ts";
import { openLedger } from "./bring-in/ledger.ts";
import type { Outcome } from "./bring-in/outcome.ts";
import { readAside } from "./bring-in/read-aside.ts";
import { takeBack } from "./bring-in/take-back.ts";
import { takeOffers } from "./bring-in/take-offers.ts";
import { type InWorkshop, pricesJob, pricesPlace } from "./price-import.ts";
import { Problem } from "./problem.ts";
import { inTransaction } from "./transaction.ts";

/**
 * Takes a price list in one step: all its offers are written or none. What its person saw of the difference must still
 * be so.
 *
 * @throws Problem rows-to-settle, supplier-not-said, difference-changed, changed-meanwhile, nothing-to-bring-in,
 * wrong-input for a ladder that cannot be.
 */
export async function takePriceImport(
  given: InWorkshop,
  id: string,
  input: z.infer<typeof TakeList>,
): Promise<{ outcome: Outcome }> {
  const row = draftAt(given, pricesPlace(given), id, input.version);
  const job = pricesJob(given, row);
  const taking = await readAside("prices-taking", job, row.rowCount);
  refuseUnsettled(taking.mustRows);
  if (taking.unnamed > 0) throw new Problem("supplier-not-said", { parameters: { count: taking.unnamed } });
  if (taking.seen !== input.seen) throw new Problem("difference-changed");
  const compared = seenStamp(job.supply);
  return inTransaction(given.db, () => {
    if (seenStamp(pricesJob(given, row).supply) !== compared) throw new Problem("difference-changed");
    const ledger = openLedger(given);
    const outcome = { lines: null, offers: takeOffers(ledger, taking.wanted, job.terms) };
    keepTaken(given, row, taking.mapping, outcome, ledger.close());
    return { outcome };
  });
}

export function takeBackPriceImport(given: InWorkshop, id: string, input: z.infer<typeof TakeBack>): void {
  takeBack(given, pricesPlace(given), null, id, input);
}
