import { type ApiModule, openApi } from "#src/server/openapi.ts";
import { route } from "#src/server/route.ts";
import ownSource from "./openapi.json.ts?raw";

const modules = import.meta.glob<Record<string, unknown>>("./**/*.ts");
const sources = import.meta.glob<string>("./**/*.ts", { query: "?raw", import: "default" });

async function everyModule(): Promise<ApiModule[]> {
  const others = Object.entries(modules).map(async ([file, load]) => ({
    file,
    routes: await load(),
    source: (await sources[file]?.()) ?? "",
  }));
  return [...(await Promise.all(others)), { file: "./openapi.json.ts", routes: { GET }, source: ownSource }];
}

/** Describes every address below /api, in OpenAPI 3.1. */
export const GET = route({
  may: "anyone",
  run: async ({ url }) => openApi(await everyModule(), url.origin),
});
