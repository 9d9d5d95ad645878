/** Where profit passes zero as runs get larger (section 11). */
export interface EvenRuns {
  /** Between the size before and this one; `up`: from loss to no loss. */
  turns: { kits: number; way: "up" | "down" }[];
  /** First run with no loss, and the run from which none up to the end loses; null: none. */
  first: number | null;
  safe: number | null;
}

/**
 * Every size from 1 to `upTo` is looked at, since costs go up in steps and profit may pass zero often.
 *
 * @example profit 150 a kit less 20 000: first and safe 134, one turn up
 */
export function evenRuns(profit: (kits: number) => bigint, upTo: number): EvenRuns {
  const turns: EvenRuns["turns"] = [];
  let first: number | null = null;
  let safe: number | null = null;
  let before = false;
  for (let kits = 1; kits <= upTo; kits += 1) {
    const pays = profit(kits) >= 0n;
    if (pays && first === null) first = kits;
    safe = pays ? (safe ?? kits) : null;
    if (kits > 1 && pays !== before) turns.push({ kits, way: pays ? "up" : "down" });
    before = pays;
  }
  return { turns, first, safe };
}
