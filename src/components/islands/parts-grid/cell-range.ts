/** A place in the grid: row and column as they are seen, counted from 0. */
export interface CellPlace {
  row: number;
  column: number;
}

/** A selected rectangle: where it began and where it reaches. */
export interface CellRange {
  anchor: CellPlace;
  head: CellPlace;
}

export interface Rectangle {
  top: number;
  bottom: number;
  left: number;
  right: number;
}

export function rectangleOf({ anchor, head }: CellRange): Rectangle {
  return {
    top: Math.min(anchor.row, head.row),
    bottom: Math.max(anchor.row, head.row),
    left: Math.min(anchor.column, head.column),
    right: Math.max(anchor.column, head.column),
  };
}

export function isInRange(range: CellRange | null, { row, column }: CellPlace): boolean {
  if (!range) return false;
  const { top, bottom, left, right } = rectangleOf(range);
  return row >= top && row <= bottom && column >= left && column <= right;
}

const MOVES: Readonly<Record<string, CellPlace>> = {
  ArrowUp: { row: -1, column: 0 },
  ArrowDown: { row: 1, column: 0 },
  ArrowLeft: { row: 0, column: -1 },
  ArrowRight: { row: 0, column: 1 },
};

/** A range grown or shrunk by one of the arrow keys, inside so many rows and columns; `null` for any other key. */
export function grownRange(
  range: CellRange | null,
  from: CellPlace,
  key: string,
  size: { rows: number; columns: number },
): CellRange | null {
  const move = MOVES[key];
  if (!move) return null;
  const { anchor, head } = range ?? { anchor: from, head: from };
  const within = (place: number, most: number) => Math.min(Math.max(place, 0), most - 1);
  return {
    anchor,
    head: {
      row: within(head.row + move.row, size.rows),
      column: within(head.column + move.column, size.columns),
    },
  };
}
