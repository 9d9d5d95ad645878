import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { z } from "zod";
import { IMPORT_KINDS, type ImportKind } from "#src/shapes/limits.ts";
import { Problem } from "./problem.ts";

/** Invented lists that show what can be read; each a file of the folder `samples`. */
const Sample = z.object({
  file: z.string().regex(/^[\w-]+\.(csv|tsv|txt)$/),
  kind: z.enum(IMPORT_KINDS),
  title: z.string(),
  shows: z.string(),
});
export type Sample = z.infer<typeof Sample>;

const FOLDER = "samples";

/** The samples of one kind, in the order in which they are worth looking at. */
export function samplesOf(kind: ImportKind): Sample[] {
  const listed = readFileSync(join(FOLDER, "samples.json"), "utf8");
  return z
    .array(Sample)
    .parse(JSON.parse(listed))
    .filter((sample) => sample.kind === kind);
}

/** A sample as a file to keep: its bytes as they are, whatever letters they are in. */
export function sampleFile(name: string): Response {
  const path = join(FOLDER, name);
  if (!Sample.shape.file.safeParse(name).success || !existsSync(path)) throw new Problem("not-found");
  return new Response(new Uint8Array(readFileSync(path)), {
    headers: {
      "content-type": "application/octet-stream",
      "content-disposition": `attachment; filename="${name}"`,
      "cache-control": "public, max-age=3600",
    },
  });
}
