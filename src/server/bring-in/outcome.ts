import type { LineCounts } from "./take-lines.ts";
import type { OfferCounts } from "./take-offers.ts";

/** What taking a list did; `lines` is `null` for a price list. */
export interface Outcome {
  lines: LineCounts | null;
  offers: OfferCounts;
}
