import { ONE } from "#src/costing/grains.ts";

/** How a price may end; `none`: on any minor unit. */
export const PRICE_ENDINGS = ["none", ".00", ".50", ".90", ".95", ".99"] as const;
/** One of them. */
export type PriceEnding = (typeof PRICE_ENDINGS)[number];

/** Prices one may ask: `first`, then every `step`, in grains. */
export interface PriceGrid {
  first: bigint;
  step: bigint;
}

/**
 * The prices with an ending, on whole minor units; null where the currency has no such amount, as yen
 * has no .99.
 *
 * @example gridOf(".99", cent) → 0.99, 1.99, 2.99 …
 */
export function gridOf(ending: PriceEnding, unit: bigint): PriceGrid | null {
  if (ending === "none") return { first: 0n, step: unit };
  const first = (BigInt(ending.slice(1)) * ONE) / 100n;
  return first % unit === 0n ? { first, step: ONE } : null;
}
