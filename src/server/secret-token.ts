import { createHash } from "node:crypto";
import { alphabet, generateRandomString } from "oslo/crypto";

/** A token that opens something: forty random letters and digits (238 bits), given to one person only. */
export function newSecretToken(): string {
  return generateRandomString(40, alphabet("a-z", "A-Z", "0-9"));
}

/** What is stored of a token: its SHA-256, so that a stolen database opens nothing. */
export function tokenHash(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}
