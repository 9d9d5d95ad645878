import { alphabet, generateRandomString } from "oslo/crypto";

/** A new row's id: sixteen random small letters and digits (82 bits). */
export function newId(): string {
  return generateRandomString(16, alphabet("a-z", "0-9"));
}
