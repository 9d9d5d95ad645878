import { route } from "#src/server/route.ts";
import { takePartsImport } from "#src/server/take-parts-import.ts";
import { TakeList } from "#src/shapes/import.ts";

/** Brings the list in: all of it in one step, or nothing. */
export const POST = route({
  may: "change-parts",
  input: TakeList,
  run: (given) => takePartsImport(given, given.params.import ?? "", given.input),
});
