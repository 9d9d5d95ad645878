import { Argon2id } from "oslo/password";
import { newSecretToken } from "./secret-token.ts";

/** Argon2id with oslo's defaults (19 MiB, two passes, one lane), which are those OWASP recommends. */
const argon2id = new Argon2id();

export function hashPassword(password: string): Promise<string> {
  return argon2id.hash(password);
}

let nobodys: Promise<string> | undefined;

/**
 * Whether this is the password. Where there is none to compare with, a hash that nothing matches is
 * compared all the same, so that the answer takes as long for an address nobody has.
 */
export async function isPassword(hash: string | null | undefined, password: string): Promise<boolean> {
  nobodys ??= argon2id.hash(newSecretToken());
  const other = await nobodys;
  const same = await argon2id.verify(hash ?? other, password);
  return same && hash != null;
}
