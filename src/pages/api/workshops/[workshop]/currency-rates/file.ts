import { route } from "#src/server/route.ts";
import { takeReferenceRates } from "#src/server/take-reference-rates.ts";
import { RATES_FILE_BYTES } from "#src/shapes/limits.ts";

/** Takes a file of euro reference rates: its bytes as they are. */
export const POST = route({
  may: "change-supply",
  bytes: true,
  limit: RATES_FILE_BYTES,
  run: (given) => takeReferenceRates(given, given.bytes),
});
