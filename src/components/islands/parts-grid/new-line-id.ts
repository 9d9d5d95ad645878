const LETTERS = "abcdefghijklmnopqrstuvwxyz0123456789";

/** An id for a line that is added here: sixteen random small letters and digits, as the server makes them. */
export function newLineId(): string {
  // 252 is the largest multiple of 36 that fits into a byte; larger values would favour the first letters.
  const bytes = crypto.getRandomValues(new Uint8Array(64)).filter((byte) => byte < 252);
  return [...bytes.slice(0, 16)].map((byte) => LETTERS[byte % 36]).join("");
}
