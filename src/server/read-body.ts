import { Problem } from "./problem.ts";

function inWords(bytes: number): string {
  return bytes >= 1024 * 1024 ? `${Math.round(bytes / 1024 / 1024)} MB` : `${Math.round(bytes / 1024)} kB`;
}

/**
 * Reads a request's body, counting: a body larger than `limit` bytes is refused before it is in memory,
 * whatever its Content-Length says.
 */
export async function readBytes(request: Request, limit: number): Promise<Uint8Array> {
  const tooLarge = () => new Problem("too-large", { parameters: { limit: inWords(limit) } });
  if (Number(request.headers.get("content-length") ?? 0) > limit) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let length = 0;
  for await (const chunk of (request.body ?? []) as AsyncIterable<Uint8Array>) {
    length += chunk.byteLength;
    if (length > limit) throw tooLarge();
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

/** Reads a JSON body of at most `limit` bytes; what it holds is still unknown. */
export async function readJson(request: Request, limit: number): Promise<unknown> {
  const type = request.headers.get("content-type")?.split(";")[0]?.trim().toLowerCase();
  if (type !== "application/json")
    throw new Problem("wrong-media-type", { parameters: { expected: "application/json" } });
  const text = new TextDecoder().decode(await readBytes(request, limit));
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new Problem("not-json", { parameters: { reason: (error as Error).message } });
  }
}
