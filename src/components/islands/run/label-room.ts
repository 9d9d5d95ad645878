/** A label that wants to stand somewhere along an axis, in pixels. */
export interface WantedLabel {
  at: number;
  /** Half of the room it needs. */
  half: number;
  /** The smaller, the sooner it gets its place. */
  rank: number;
}

/** Which labels are shown so that none touches another: by rank, then from the left. */
export function labelsWithRoom<T extends WantedLabel>(wanted: readonly T[]): T[] {
  const byRank = [...wanted].sort((one, other) => one.rank - other.rank || one.at - other.at);
  const shown: T[] = [];
  for (const label of byRank)
    if (shown.every((other) => Math.abs(other.at - label.at) >= other.half + label.half)) shown.push(label);
  return shown;
}
