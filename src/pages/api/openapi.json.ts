import { openApi } from "#src/server/openapi.ts";
import { route } from "#src/server/route.ts";

const modules = import.meta.glob<Record<string, unknown>>("./**/*.ts");
const sources = import.meta.glob<string>("./**/*.ts", { query: "?raw", import: "default" });

/** Describes every address below /api, in OpenAPI 3.1. */
export const GET = route({
  may: "anyone",
  run: async ({ url }) =>
    openApi(
      await Promise.all(
        Object.entries(modules).map(async ([file, load]) => ({
          file,
          routes: await load(),
          source: (await sources[file]?.()) ?? "",
        })),
      ),
      url.origin,
    ),
});
