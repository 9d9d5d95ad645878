// @vitest-environment happy-dom
import { act, renderHook } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { CallFailed } from "#src/components/islands/call.ts";
import type { CellColumn, RowChange } from "#src/components/islands/cells/cell-column.ts";
import { type SheetStore, useSheet } from "#src/components/islands/cells/use-sheet.ts";
import { saving } from "#src/components/islands/plan/saving.ts";

interface Row {
  id: string;
  version: number;
  price: string;
  note: string;
}
type Fields = Pick<Row, "price" | "note">;

const COLUMNS: CellColumn<Row, Fields>[] = [
  {
    key: "price",
    head: "Price",
    fields: ["price"],
    text: ({ price }) => price,
    shown: ({ price }) => `€${price}`,
    read: (entry) =>
      /^\d+$/.test(entry)
        ? { ok: true, change: { price: entry } }
        : { ok: false, sentence: "Write a number." },
  },
  {
    key: "note",
    head: "Note",
    fields: ["note"],
    text: ({ note }) => note,
    read: (entry) => ({ ok: true, change: { note: entry } }),
  },
];

type Save = (changes: readonly RowChange<Fields>[]) => readonly Row[];

/** A store in memory; each save is answered as the test says, in turn. */
function sheetWith(...answers: Save[]) {
  let rows: readonly Row[] = [
    { id: "a", version: 1, price: "10", note: "" },
    { id: "b", version: 4, price: "20", note: "" },
  ];
  const sent: (readonly RowChange<Fields>[])[] = [];
  const store: SheetStore<Row, Fields> = {
    now: () => rows,
    put: (changed) => {
      rows = rows.map((row) => changed.find(({ id }) => id === row.id) ?? row);
    },
    async save(changes) {
      sent.push(changes);
      return (answers.shift() ?? saved)(changes);
    },
    refused: (at) => ({ place: Number(at.split(".")[1]), at: at.split(".").slice(2).join(".") }),
  };
  function saved(changes: readonly RowChange<Fields>[]): readonly Row[] {
    return changes.map(({ id, version, change }) => {
      const row = rows.find((one) => one.id === id) as Row;
      return { ...row, ...change, version: version + 1 };
    });
  }
  const { result } = renderHook(() => useSheet({ columns: COLUMNS, store }));
  return { sheet: result, sent, rows: () => rows };
}

function failure(problem: object): Save {
  return () => {
    throw new CallFailed({ title: "No.", detail: "Not so.", status: 422, ...problem } as never);
  };
}

describe("edits of a sheet", () => {
  it("are shown at once and saved with the version that was seen", async () => {
    const { sheet, sent, rows } = sheetWith();
    await act(async () => sheet.current.take([{ row: "b", column: "price", entry: "25" }]));
    expect(sent[0]).toMatchObject([{ id: "b", version: 4, change: { price: "25" } }]);
    expect(rows()[1]).toMatchObject({ price: "25", version: 5 });
  });

  it("of one row in a block are one change; what is unchanged is not sent", async () => {
    const { sheet, sent } = sheetWith();
    await act(async () =>
      sheet.current.take([
        { row: "a", column: "price", entry: "11" },
        { row: "a", column: "note", entry: "new" },
        { row: "b", column: "price", entry: "20" },
      ]),
    );
    expect(sent).toHaveLength(1);
    expect(sent[0]).toMatchObject([{ id: "a", change: { price: "11", note: "new" } }]);
  });

  it("that cannot be read stay in their cell with what is right, and the rest is saved", async () => {
    const { sheet, sent } = sheetWith();
    await act(async () =>
      sheet.current.take([
        { row: "a", column: "price", entry: "ten" },
        { row: "b", column: "price", entry: "30" },
      ]),
    );
    expect([...sheet.current.faults.values()]).toEqual([
      { row: "a", column: "price", entry: "ten", sentence: "Write a number." },
    ]);
    expect(sent[0]).toHaveLength(1);
    await act(async () => sheet.current.take([{ row: "a", column: "price", entry: "12" }]));
    expect(sheet.current.faults.size).toBe(0);
  });

  it("that the server refuses are put back, with its sentence at the cell", async () => {
    const refusal = failure({
      code: "wrong-input",
      errors: [{ at: "change.1.price", message: "Too dear." }],
    });
    const { sheet, rows } = sheetWith(refusal);
    await act(async () =>
      sheet.current.take([
        { row: "a", column: "price", entry: "11" },
        { row: "b", column: "price", entry: "99" },
      ]),
    );
    expect(rows().map(({ price }) => price)).toEqual(["10", "20"]);
    expect([...sheet.current.faults.values()]).toEqual([
      { row: "b", column: "price", entry: "99", sentence: "Too dear." },
    ]);
  });

  it("are undone and done again", async () => {
    const { sheet, rows } = sheetWith();
    await act(async () => sheet.current.take([{ row: "a", column: "price", entry: "11" }]));
    await act(async () => sheet.current.undo());
    expect(rows()[0]).toMatchObject({ price: "10", version: 3 });
    await act(async () => sheet.current.redo());
    expect(rows()[0]).toMatchObject({ price: "11", version: 4 });
    await act(async () => sheet.current.redo());
    expect(rows()[0]?.version).toBe(4);
  });

  it("that meet another's change show both values, and either can stay", async () => {
    const current = { id: "a", version: 2, price: "15", note: "", changedBy: "Tom" };
    const meets = failure({ code: "changed-meanwhile", status: 409, current });
    const { sheet, sent, rows } = sheetWith(meets);
    await act(async () => sheet.current.take([{ row: "a", column: "price", entry: "11" }]));
    const [clash] = sheet.current.clashes;
    expect(clash).toMatchObject({ yours: "€11", theirs: "€15", by: "Tom" });
    expect(rows()[0]?.price).toBe("10");
    if (clash) await act(async () => sheet.current.keepOurs(clash));
    expect(sent[1]).toMatchObject([{ id: "a", version: 2, change: { price: "11" } }]);
    expect(rows()[0]).toMatchObject({ price: "11", version: 3 });
    expect(sheet.current.clashes).toEqual([]);
  });

  it("that meet another's change can give way", async () => {
    const current = { id: "a", version: 2, price: "15", note: "" };
    const { sheet, rows } = sheetWith(failure({ code: "changed-meanwhile", status: 409, current }));
    await act(async () => sheet.current.take([{ row: "a", column: "price", entry: "11" }]));
    const [clash] = sheet.current.clashes;
    if (clash) await act(async () => sheet.current.takeTheirs(clash));
    expect(rows()[0]).toMatchObject({ price: "15", version: 2 });
  });

  it("that meet no connection stay as they are shown, and are sent when there is one", async () => {
    const lost = failure({ code: "no-connection", status: 0 });
    const { sheet, sent, rows } = sheetWith(lost);
    await act(async () => sheet.current.take([{ row: "a", column: "price", entry: "11" }]));
    expect(rows()[0]).toMatchObject({ price: "11", version: 1 });
    expect(saving.now()).toMatchObject({ waiting: 1 });
    expect(saving.now().lostAt).not.toBeNull();
    await act(async () => window.dispatchEvent(new Event("online")));
    expect(sent).toHaveLength(2);
    expect(rows()[0]).toMatchObject({ price: "11", version: 2 });
    expect(saving.now()).toMatchObject({ waiting: 0, lostAt: null });
  });
});
