import { grainText } from "./grains.ts";
import type { StepDown, SweetSpot } from "./sweep-result.ts";
import { perKitOf, type Swept } from "./swept.ts";
import { divideDown } from "./whole.ts";

/**
 * Largest run a sweet spot at `kits` must not be beaten by: a tenth more (section 9), and at least
 * the next kit, since below ten a tenth more is no whole kit.
 *
 * @example windowOf(120) === 132; windowOf(5) === 6
 */
export function windowOf(kits: number): number {
  return Math.max(kits + 1, divideDown(11 * kits, 10));
}

/**
 * Cost per kit falls by at least half a per cent: `C(n)/n ≤ 0.995 · C(n − 1)/(n − 1)`.
 *
 * @example from 10.00 at 99 kits to 9.95 at 100: true
 */
export function fellByStep(earlier: bigint, now: bigint, kits: number): boolean {
  return now * BigInt(kits - 1) * 1000n <= 995n * earlier * BigInt(kits);
}

/** Sizes at which a kit gets cheaper by a step, each with what changed (section 9). */
export function stepDowns({ used, steps, to }: Swept): StepDown[] {
  const found: StepDown[] = [];
  for (let kits = 2; kits <= to; kits += 1) {
    const changes = steps[kits] ?? [];
    if (changes.length === 0) continue;
    const perKit = perKitOf(used[kits] as bigint, kits);
    const before = perKitOf(used[kits - 1] as bigint, kits - 1);
    found.push({ kits, perKit: grainText(perKit), fellBy: grainText(before - perKit), changes });
  }
  return found;
}

/** Record lows of used cost per kit that no run up to a tenth larger beats (section 9). */
export function sweetSpots({ used, changesAt, to }: Swept, beyond: number): SweetSpot[] {
  const found: SweetSpot[] = [];
  const cheaper = (a: number, b: number) => (used[a] as bigint) * BigInt(b) < (used[b] as bigint) * BigInt(a);
  let lowest = 0;
  for (let kits = 1; kits <= to; kits += 1) {
    if (lowest > 0 && !cheaper(kits, lowest)) continue;
    lowest = kits;
    let beaten = false;
    for (let more = kits + 1; more <= Math.min(windowOf(kits), beyond); more += 1)
      beaten ||= cheaper(more, kits);
    if (beaten) continue;
    const nextKit = (used[kits + 1] as bigint) - (used[kits] as bigint);
    found.push({
      kits,
      perKit: grainText(perKitOf(used[kits] as bigint, kits)),
      nextKit: grainText(nextKit),
      changes: changesAt(kits + 1),
    });
  }
  return found;
}
