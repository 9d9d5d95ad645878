import { createCipheriv, createDecipheriv, randomBytes } from "node:crypto";
import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { config } from "./config.ts";

const BYTES = 32;
const NONCE_BYTES = 12;
const TAG_BYTES = 16;

/**
 * The server's own key: made at the first use, kept in the data folder, readable by its owner only. A copy
 * of the database without this file does not give away what was sealed with it.
 */
function ownKey(): Buffer {
  const folder = config().dataFolder;
  const path = join(folder, "own.key");
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  try {
    writeFileSync(path, randomBytes(BYTES), { flag: "wx", mode: 0o600 });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== "EEXIST") throw error;
  }
  const key = readFileSync(path);
  if (key.length !== BYTES) throw new Error(`${path} is not a key of ${BYTES} bytes.`);
  return key;
}

/** Encrypts and signs a text (AES-256-GCM); it opens only for the same `purpose`. */
export function seal(text: string, purpose: string): string {
  const nonce = randomBytes(NONCE_BYTES);
  const cipher = createCipheriv("aes-256-gcm", ownKey(), nonce).setAAD(Buffer.from(purpose));
  const sealed = Buffer.concat([cipher.update(text, "utf8"), cipher.final()]);
  return Buffer.concat([nonce, cipher.getAuthTag(), sealed]).toString("base64url");
}

/** What was sealed for this purpose; `null` if it was not, or was changed. */
export function unseal(sealed: string, purpose: string): string | null {
  const bytes = Buffer.from(sealed, "base64url");
  if (bytes.length < NONCE_BYTES + TAG_BYTES) return null;
  const tag = bytes.subarray(NONCE_BYTES, NONCE_BYTES + TAG_BYTES);
  const decipher = createDecipheriv("aes-256-gcm", ownKey(), bytes.subarray(0, NONCE_BYTES))
    .setAAD(Buffer.from(purpose))
    .setAuthTag(tag);
  try {
    const text = decipher.update(bytes.subarray(NONCE_BYTES + TAG_BYTES));
    return Buffer.concat([text, decipher.final()]).toString("utf8");
  } catch {
    return null;
  }
}
