/** Pads of parts that lie across a board: the same columns in each row. */
export function padRows(xs: readonly number[], ys: readonly number[]): [number, number][] {
  return ys.flatMap((y) => xs.map((x): [number, number] => [x, y]));
}
