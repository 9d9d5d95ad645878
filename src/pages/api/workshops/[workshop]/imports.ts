import { uploadName } from "#src/server/bring-in/begin-draft.ts";
import { beginPriceImport, priceImports } from "#src/server/price-import.ts";
import { route } from "#src/server/route.ts";
import { UPLOAD_BYTES } from "#src/shapes/limits.ts";

/** The price lists begun and brought in, the newest first. */
export const GET = route({ may: "change-supply", run: priceImports });

/** Begins to bring in a price list: its bytes as they are, its name in the header `x-file-name`. */
export const POST = route({
  may: "change-supply",
  bytes: true,
  limit: UPLOAD_BYTES,
  status: 201,
  run: (given) => beginPriceImport(given, uploadName(given.request), given.bytes),
});
