import type { CellRange } from "./cell-range.ts";
import type { ColumnKey } from "./cell-text.ts";
import type { DraftCells } from "./read-cell.ts";

/** An entry that cannot be taken: it stays in its cell until it is put right or dropped. */
export interface CellFault {
  row: string;
  column: ColumnKey;
  text: string;
  message: string;
}

export function faultKey(row: string, column: string): string {
  return `${row} ${column}`;
}

/** An offer that a line's part can be pinned to. */
export interface OfferChoice {
  id: string;
  words: string;
}

/** What the cells of the grid read while they are drawn; one object that lives as long as the grid. */
export interface GridContext {
  faults: ReadonlyMap<string, CellFault>;
  range: CellRange | null;
  draft: DraftCells;
  /** Whether part and offer stand on two lines. */
  folded: boolean;
  canEdit: boolean;
  /** Whether a line's form can be opened: it shows how its part is bought. */
  canOpen: boolean;
  canChoose: boolean;
  offersFor: (part: string) => OfferChoice[];
  pinnedFor: (part: string) => string | null;
  openLine: (line: string) => void;
  openWorking: (part: string) => void;
}
