/** SQLite takes 32,766 values in one statement; the widest table has 24 columns. */
const ROWS_AT_ONCE = 1000;

/** Rows in portions that one statement can carry. */
export function inChunks<T>(rows: T[]): T[][] {
  const chunks: T[][] = [];
  for (let from = 0; from < rows.length; from += ROWS_AT_ONCE)
    chunks.push(rows.slice(from, from + ROWS_AT_ONCE));
  return chunks;
}
