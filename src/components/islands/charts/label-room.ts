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

/** The room a name takes, in pixels. */
export interface NameBox {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** Room for a name of one or more lines at 15 px, by its longest line. */
export function nameWidth(...lines: readonly string[]): number {
  return Math.max(...lines.map(({ length }) => length)) * 7.8;
}

export function overlaps(one: NameBox, other: NameBox): boolean {
  return one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom;
}

/** The first of the wanted places whose box is free of all that is taken; the first where none is. */
export function freePlace<T extends NameBox>(wanted: readonly T[], taken: readonly NameBox[]): T | undefined {
  return wanted.find((box) => taken.every((other) => !overlaps(box, other))) ?? wanted[0];
}
