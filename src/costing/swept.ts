import { grainShare } from "./grains.ts";
import type { Change } from "./sweep-result.ts";

/** The sweep in grains; entry n belongs to a run of n, entry 0 is empty. */
export interface Swept {
  to: number;
  spent: bigint[];
  used: bigint[];
  /** Kept from the sales less the time to sell. */
  brings: bigint[];
  leftOver: bigint[];
  parcels: number[];
  missing: number[];
  /** What makes a kit of n cheaper than one of n − 1 by a step; found only where it is that much cheaper. */
  steps: Change[][];
  /** All that changed from n − 1 to n, reckoned again when it is asked. */
  changesAt: (kits: number) => Change[];
}

/** Value over kits, to the nearest grain. */
export function perKitOf(value: bigint, kits: number): bigint {
  return grainShare(value, 1n, BigInt(kits));
}
