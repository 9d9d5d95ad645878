import { PASTED_NAME } from "#src/server/bring-in/begin-draft.ts";
import { beginPriceImport } from "#src/server/price-import.ts";
import { route } from "#src/server/route.ts";
import { PastedList } from "#src/shapes/import.ts";
import { PASTED_BYTES } from "#src/shapes/limits.ts";

/** Begins to bring in prices that were pasted. */
export const POST = route({
  may: "change-supply",
  input: PastedList,
  limit: PASTED_BYTES,
  status: 201,
  run: ({ input, ...given }) =>
    beginPriceImport(given, input.name ?? PASTED_NAME, new TextEncoder().encode(input.text)),
});
