import { copyKit } from "#src/server/kit-changes.ts";
import { presentKit } from "#src/server/present.ts";
import { route } from "#src/server/route.ts";
import { KitCopy } from "#src/shapes/kit.ts";

/** Makes a kit like this one. */
export const POST = route({
  may: "change-parts",
  input: KitCopy,
  status: 201,
  run: (given) => presentKit(copyKit(given, given.input.name)),
});
