import { type ComponentType, useEffect, useState } from "react";
import { ConflictBox } from "#src/components/islands/parts/ConflictBox.tsx";
import { ErrorBox } from "#src/components/islands/parts/ErrorBox.tsx";
import { Loading } from "#src/components/islands/parts/Loading.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import type { CellGridProps } from "./CellGrid.tsx";
import type { CellColumn, CellRow } from "./cell-column.ts";
import { type SheetStore, useSheet } from "./use-sheet.ts";

export interface SheetProps<Row extends CellRow, Fields> {
  label: string;
  rows: readonly Row[];
  columns: readonly CellColumn<Row, Fields>[];
  /** What a row is called in a sentence: its supplier, or part and supplier. */
  nameOf: (row: Row) => string;
  store: SheetStore<Row, Fields>;
  canEdit: boolean;
  styleNonce: string;
  /** The row below the last one, on which new rows can be pasted. */
  next?: CellGridProps<Row, Fields>["next"];
}

/** The grid is fetched when it is needed: it is the largest thing on the page. */
function useGrid<Row extends CellRow, Fields>() {
  const [Grid, setGrid] = useState<ComponentType<CellGridProps<Row, Fields>>>();
  useEffect(() => {
    void import("./CellGrid.tsx").then((loaded) => setGrid(() => loaded.default));
  }, []);
  return Grid;
}

/** A sheet with what went wrong below it: entries that cannot be taken, and rows that two people changed. */
export function Sheet<Row extends CellRow, Fields>(props: SheetProps<Row, Fields>) {
  const { label, rows, columns, nameOf, canEdit, styleNonce, next } = props;
  const Grid = useGrid<Row, Fields>();
  const sheet = useSheet(props);
  const nameIn = (id: string) => {
    const row = rows.find((one) => one.id === id);
    return row ? nameOf(row) : "A row";
  };
  const faults = [...sheet.faults.values()];
  return (
    <div className="flex flex-col gap-4">
      {Grid ? (
        <Grid
          {...{ label, rows, columns, canEdit, styleNonce, next }}
          faults={sheet.faults}
          onEdits={sheet.take}
          onUndo={sheet.undo}
          onRedo={sheet.redo}
        />
      ) : (
        <Loading what={label} rows={Math.min(rows.length, 8) + 1} />
      )}
      {sheet.clashes.map(({ change, current, yours, theirs, by }) => (
        <ConflictBox
          key={change.id}
          happened={`${by ?? "Somebody"} changed ${nameIn(change.id)} in the meantime.`}
          yours={yours}
          theirs={theirs}
          theirWord="Theirs"
          onKeepYours={() => sheet.keepOurs({ change, current })}
          onTakeTheirs={() => sheet.takeTheirs({ change, current })}
        />
      ))}
      {faults.length > 0 && (
        <ErrorBox
          title={faults.length === 1 ? "One cell is not saved" : `${faults.length} cells are not saved`}
          alert
          causes={faults.map((fault) => ({
            key: `${fault.row} ${fault.column}`,
            place: nameIn(fault.row),
            what: columns.find(({ key }) => key === fault.column)?.head,
            reason: fault.sentence,
            detail: fault.entry === "" ? "It is empty." : `It says “${fault.entry}”.`,
            ways: <QuietButton onClick={() => sheet.drop(fault)}>Leave it as it was</QuietButton>,
          }))}
        />
      )}
    </div>
  );
}
