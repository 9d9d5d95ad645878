import { fetchReferenceRates } from "#src/server/fetch-reference-rates.ts";
import { route } from "#src/server/route.ts";
import { takeReferenceRates } from "#src/server/take-reference-rates.ts";

/** Takes the euro reference rates that stand at the address in the settings. */
export const POST = route({
  may: "change-supply",
  run: async (given) => takeReferenceRates(given, await fetchReferenceRates()),
});
