import { uploadName } from "#src/server/bring-in/begin-draft.ts";
import { beginPartsImport, partsImports } from "#src/server/parts-import.ts";
import { route } from "#src/server/route.ts";
import { UPLOAD_BYTES } from "#src/shapes/limits.ts";

/** The lists begun and brought in, the newest first. */
export const GET = route({ may: "change-parts", run: partsImports });

/** Begins to bring in a list: its bytes as they are, its name in the header `x-file-name`. */
export const POST = route({
  may: "change-parts",
  bytes: true,
  limit: UPLOAD_BYTES,
  status: 201,
  run: (given) => beginPartsImport(given, uploadName(given.request), given.bytes),
});
