/** Reading and stepping what a person types into a money field, exactly: decimals are whole numbers of 10^-4. */

/** Unit prices take up to four decimals; everything else two. Both keep at least two. */
export type MoneyPlaces = 2 | 4;

export type MoneyEntry = { ok: true; value: string } | { ok: false; sentence: string };

const SCALE = 10_000n;

function scaled(value: string): bigint {
  const [whole = "0", part = ""] = value.split(".");
  return BigInt(whole || "0") * SCALE + BigInt(part.padEnd(4, "0").slice(0, 4));
}

function written(amount: bigint): string {
  const part = String(amount % SCALE).padStart(4, "0");
  return `${amount / SCALE}.${part.slice(0, 2)}${part.slice(2).replace(/0+$/, "")}`;
}

/**
 * Reads "34", "34,5", "34.50", "€34", "1 793.65" as decimal text with at least two decimals ("34.50").
 * An empty entry is the empty text: not known. What cannot be read comes back as a sentence saying what is right.
 */
export function readMoney(entry: string, places: MoneyPlaces = 2): MoneyEntry {
  const bare = entry.replace(/[\s\u00a0\u202f€$£]/g, "");
  if (bare === "") return { ok: true, value: "" };
  if (/^[-−]/.test(bare)) return { ok: false, sentence: "An amount here is never below zero." };
  if (!/^(\d+([.,]\d*)?|[.,]\d+)$/.test(bare))
    return { ok: false, sentence: "Write an amount such as 34.50." };
  const [whole = "", part = ""] = bare.split(/[.,]/);
  if (part.length > places)
    return { ok: false, sentence: `Write at most ${places === 2 ? "two" : "four"} decimals.` };
  if (whole.length > 12) return { ok: false, sentence: "Write an amount of at most twelve figures." };
  return { ok: true, value: written(scaled(`${whole}.${part}`)) };
}

/** The amount some steps of 0.01 on, never below zero: arrow keys step by 10, with Shift by 100. */
export function stepMoney(value: string, cents: number): string {
  const next = scaled(value === "" ? "0" : value) + BigInt(cents) * 100n;
  return written(next < 0n ? 0n : next);
}
