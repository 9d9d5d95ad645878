/** Counting boards on a panel the slow way: every cut position tried, boards counted one by one. Whole millimetres. */

/** Boards of one side along a length, laid one after another. */
function alongPlainly(length: number, side: number, gap: number): number {
  let count = 0;
  for (let end = side; end <= length; end += gap + side) count += 1;
  return count;
}

/** The most of the two grids, as drawn and turned. */
export function plainGrid(width: number, height: number, w: number, h: number, gap: number): number {
  const grid = (a: number, b: number) => alongPlainly(width, a, gap) * alongPlainly(height, b, gap);
  return Math.max(grid(w, h), grid(h, w));
}

/** The most of one grid, or of two on either side of any straight cut as wide as the gap. */
export function plainTwoBlocks(width: number, height: number, w: number, h: number, gap: number): number {
  let most = plainGrid(width, height, w, h, gap);
  for (let cut = 1; cut + gap < width; cut += 1) {
    const count = plainGrid(cut, height, w, h, gap) + plainGrid(width - cut - gap, height, w, h, gap);
    most = Math.max(most, count);
  }
  for (let cut = 1; cut + gap < height; cut += 1) {
    const count = plainGrid(width, cut, w, h, gap) + plainGrid(width, height - cut - gap, w, h, gap);
    most = Math.max(most, count);
  }
  return most;
}
