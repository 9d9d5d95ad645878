import { useEffect, useRef, useState } from "react";
import { CallFailed } from "#src/components/islands/call.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { connected, connectionTried, lostConnection } from "#src/components/islands/plan/connection.ts";
import { watchLeaving } from "#src/components/islands/plan/leaving.ts";
import { countUnsaved } from "#src/components/islands/plan/saving.ts";
import {
  type CellColumn,
  type CellEdit,
  type CellFault,
  type CellRow,
  cellKey,
  type RowChange,
} from "./cell-column.ts";
import { faultOf, readEdits, takenBack } from "./read-edits.ts";

/** Where the rows of a sheet are kept and how they reach the server. */
export interface SheetStore<Row extends CellRow, Fields> {
  /** The rows as they are now, not as they were drawn. */
  now: () => readonly Row[];
  /** Puts rows in place of those with the same ids. */
  put: (rows: readonly Row[]) => void;
  /** Saves all of it or nothing, and returns the rows as they stand. @throws CallFailed */
  save: (changes: readonly RowChange<Fields>[]) => Promise<readonly Row[]>;
  /** Rows do not depend on each other: each change is saved, or refused, alone. */
  oneByOne?: boolean;
  /** Which change a refused field belongs to, and the field's path in it. */
  refused: (at: string) => { place: number; at: string };
}

/** A row that somebody else changed after we saw it. */
export interface SheetClash<Row, Fields> {
  change: RowChange<Fields>;
  current: Row & { changedBy?: string | null };
  yours: string;
  theirs: string;
  by: string | null;
}

interface SheetOf<Row extends CellRow, Fields> {
  columns: readonly CellColumn<Row, Fields>[];
  store: SheetStore<Row, Fields>;
}

type Settled<Row, Fields> = Pick<SheetClash<Row, Fields>, "change" | "current">;
type Undoing<Fields> = Omit<RowChange<Fields>, "version">[];

/** Counts a sheet's edits that have not been answered, and has the browser ask before those that wait are left. */
function useUnsavedCount(asks: boolean): { add: (edits: 1 | -1) => void } {
  const count = useRef({ held: 0, asks });
  count.current.asks = asks;
  useEffect(
    () =>
      watchLeaving({
        flush() {},
        holds: () => count.current.held > 0,
        atRisk: () => count.current.held > 1 || count.current.asks,
      }),
    [],
  );
  return {
    add(edits) {
      count.current.held += edits;
      countUnsaved("sheet", count.current.held);
    },
  };
}

/** Edits of a sheet: shown at once, saved one action after the other, taken back where the server refuses. */
export function useSheet<Row extends CellRow, Fields>({ columns, store }: SheetOf<Row, Fields>) {
  const [faults, setFaults] = useState<ReadonlyMap<string, CellFault>>(new Map());
  const [clashes, setClashes] = useState<SheetClash<Row, Fields>[]>([]);
  const history = useRef({ undo: [] as Undoing<Fields>[], redo: [] as Undoing<Fields>[] });
  const queue = useRef<Promise<void>>(Promise.resolve());
  const unsaved = useUnsavedCount(clashes.length > 0);

  function mark(edits: readonly CellEdit[], found: readonly CellFault[]): void {
    setFaults((before) => {
      const after = new Map(before);
      for (const edit of edits) after.delete(cellKey(edit));
      for (const fault of found) after.set(cellKey(fault), fault);
      return after;
    });
  }

  async function send(changes: RowChange<Fields>[], before: readonly Row[]): Promise<boolean> {
    const versions = new Map(store.now().map(({ id, version }) => [id, version]));
    const current = changes.map((change) => ({
      ...change,
      version: versions.get(change.id) ?? change.version,
    }));
    try {
      store.put(await store.save(current));
      return true;
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      if (error.problem.code === "no-connection") return sendLater(changes, before, error);
      store.put(before);
      failed(current, error);
      return false;
    }
  }

  /** What met no connection stays on the screen and is sent when there is one. */
  async function sendLater(
    changes: RowChange<Fields>[],
    before: readonly Row[],
    { problem }: CallFailed,
  ): Promise<boolean> {
    if (lostConnection())
      showToast({ kind: "caution", text: `${problem.title} Your changes are kept here.` });
    await connectionTried();
    const isSaved = await send(changes, before);
    if (isSaved) connected();
    return isSaved;
  }

  function failed(changes: RowChange<Fields>[], { problem }: CallFailed): void {
    if (problem.code === "changed-meanwhile") clash(changes, problem.current as Row);
    else if (!problem.errors) showToast({ kind: "fault", text: `${problem.title} ${problem.detail}` });
    const found = (problem.errors ?? []).flatMap((error) => {
      const { place, at } = store.refused(error.at);
      const change = changes[place];
      return change ? [faultOf({ at, message: error.message }, change, columns, store.now())] : [];
    });
    mark([], found);
  }

  function clash(changes: RowChange<Fields>[], current: SheetClash<Row, Fields>["current"]): void {
    const change = changes.find(({ id }) => id === current.id);
    if (!change) return;
    const edited = columns.filter(({ key }) => change.columns.includes(key));
    const words = (row: Row) =>
      edited.map((column) => (column.shown ?? column.text)(row) || "nothing").join(", ");
    const mine = store.now().find(({ id }) => id === current.id);
    const yours = mine ? words({ ...mine, ...change.change }) : "";
    const one = { change, current, yours, theirs: words(current), by: current.changedBy ?? null };
    setClashes((others) => [...others.filter((other) => other.change.id !== change.id), one]);
    if (changes.length > 1)
      showToast({
        kind: "caution",
        text: "Nothing of the block was saved. Choose a value, then paste again.",
      });
  }

  /** Shows changes at once and saves them after those before. */
  function apply(changes: RowChange<Fields>[], inverse: "undo" | "redo"): void {
    if (changes.length === 0) return;
    const before = store.now().filter(({ id }) => changes.some((change) => change.id === id));
    const back = changes.map((change) => takenBack(change, before));
    store.put(before.map((row) => ({ ...row, ...changes.find(({ id }) => id === row.id)?.change })));
    unsaved.add(1);
    queue.current = queue.current.then(async () => {
      if (await send(changes, before)) history.current[inverse].push(back);
      unsaved.add(-1);
    });
  }

  function travel(from: "undo" | "redo", to: "undo" | "redo"): void {
    const step = history.current[from].pop();
    if (step)
      apply(
        step.map((change) => ({ ...change, version: 0 })),
        to,
      );
  }

  return {
    faults,
    clashes,
    take(edits: CellEdit[]) {
      const { changes, faults: found } = readEdits(edits, store.now(), columns);
      mark(edits, found);
      history.current.redo = [];
      if (store.oneByOne) for (const change of changes) apply([change], "undo");
      else apply(changes, "undo");
    },
    undo: () => travel("undo", "redo"),
    redo: () => travel("redo", "undo"),
    drop: (fault: CellFault) => mark([fault], []),
    keepOurs({ change, current }: Settled<Row, Fields>) {
      setClashes((others) => others.filter((other) => other.change.id !== change.id));
      store.put([current]);
      apply([{ ...change, version: current.version }], "undo");
    },
    takeTheirs({ change, current }: Settled<Row, Fields>) {
      setClashes((others) => others.filter((other) => other.change.id !== change.id));
      store.put([current]);
    },
  };
}
