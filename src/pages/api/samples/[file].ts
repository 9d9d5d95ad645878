import { route } from "#src/server/route.ts";
import { sampleFile } from "#src/server/samples.ts";

/** One of the invented lists, to try bringing in. */
export const GET = route({ may: "anyone", run: ({ params }) => sampleFile(params.file ?? "") });
