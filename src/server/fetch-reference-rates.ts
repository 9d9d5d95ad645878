import { RATES_FILE_BYTES } from "#src/shapes/limits.ts";
import { config } from "./config.ts";
import { Problem } from "./problem.ts";

const PATIENCE_MS = 10_000;

/**
 * The bytes of the file of reference rates at the address in the settings.
 *
 * @throws Problem "rates-not-configured", or "rates-unreachable" where the address does not answer in time, answers
 * with an error, or sends more than such a file can be.
 */
export async function fetchReferenceRates(): Promise<Uint8Array> {
  const { ratesUrl } = config();
  if (ratesUrl === null) throw new Problem("rates-not-configured");
  try {
    const reply = await fetch(ratesUrl, { redirect: "error", signal: AbortSignal.timeout(PATIENCE_MS) });
    if (!reply.ok) throw new Error(`answered ${reply.status}`);
    return await most(reply, RATES_FILE_BYTES);
  } catch (error) {
    console.error("Reference rates:", error);
    throw new Problem("rates-unreachable", { parameters: { host: new URL(ratesUrl).host } });
  }
}

/** The body, given up as soon as it is too long: its length is known only when it has come. */
async function most(reply: Response, limit: number): Promise<Uint8Array> {
  const chunks: Uint8Array[] = [];
  let length = 0;
  for await (const chunk of reply.body ?? []) {
    length += chunk.byteLength;
    if (length > limit) throw new Error(`sent more than ${limit} bytes`);
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}
