import { createHash } from "node:crypto";
import { WORKSHOP } from "./marsh-lane.ts";

const ALPHABET = "abcdefghijklmnopqrstuvwxyz234567";

/** An id that is the same each time for the same words, so that links into the demonstration keep. */
export function seedId(...words: string[]): string {
  const bytes = createHash("sha256").update(words.join("\n")).digest().subarray(0, 16);
  return [...bytes].map((byte) => ALPHABET[byte % 32]).join("");
}

export const WORKSHOP_ID = seedId("workshop", WORKSHOP.name);
