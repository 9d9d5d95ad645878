import { route } from "#src/server/route.ts";
import { takeBackPartsImport } from "#src/server/take-parts-import.ts";
import { TakeBack } from "#src/shapes/import.ts";

/** Takes a list back that was brought in last. */
export const POST = route({
  may: "change-parts",
  input: TakeBack,
  run: (given) => takeBackPartsImport(given, given.params.import ?? "", given.input),
});
