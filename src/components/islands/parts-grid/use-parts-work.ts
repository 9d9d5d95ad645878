import { useMemo, useRef, useState } from "react";
import { listed } from "#src/components/count-words.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { noteEdit } from "#src/components/islands/plan/edit-log.ts";
import { heldPlan } from "#src/components/islands/plan/save-edits.ts";
import type { PartsList, PricedPartsList } from "#src/server/present.ts";
import type { ColumnKey } from "./cell-text.ts";
import { cellText, isCellColumn } from "./cell-text.ts";
import { CHEAPEST, columnHead } from "./column-defs.ts";
import { lineName } from "./edit-words.ts";
import { type CellFault, faultKey } from "./grid-context.ts";
import type { LineRow } from "./grid-rows.ts";
import { editList, redoList, shownList, undoList } from "./list-editor.ts";
import { newLineId } from "./new-line-id.ts";
import type { PastePlace } from "./PartsGrid.tsx";
import type { Misfit } from "./paste-lines.ts";
import { type CellColumn, type DraftCells, lineFromCells, readCell } from "./read-cell.ts";
import type { Line, Step } from "./steps.ts";

/** The line that is being written, and where it will stand; `null`: last. */
export interface Draft {
  cells: DraftCells;
  at: number | null;
}
/** Fetched when the first block is pasted. */
const pasting = () => import("./paste-lines.ts");

const EMPTY_DRAFT: Draft = { cells: {}, at: null };

/** Makes an edit and tells the strip of figures what it is called and how it is taken back. */
export function editAndTell(address: KitAddress, name: string, steps: readonly Step[]): void {
  if (steps.length === 0) return;
  const before = heldPlan(address);
  editList(address, name, steps);
  if (before)
    noteEdit({
      before,
      from: null,
      at: Date.now(),
      field: `parts ${name}`,
      nameFrom: () => name,
      undo: () => undoList(address),
    });
}

/** Says where else a change is felt: in other kits, or that other lines keep the part as it was. */
function tellOthers(address: KitAddress, list: PricedPartsList, name: string, steps: readonly Step[]): void {
  const own = steps.find((step) => step.do === "own-part");
  const line = own && list.lines.find(({ id }) => id === own.line);
  if (own?.do === "own-part" && line) {
    const others = list.lines.filter((one) => one !== line && one.part.id === line.part.id).map(lineName);
    const keepers = listed([...others, ...line.part.alsoIn]);
    const everywhere: Step = { do: "change-part", part: line.part.id, set: own.set };
    showToast({
      text: `Changed for ${lineName(line)} only. ${keepers} keep${others.length + line.part.alsoIn.length === 1 ? "s" : ""} the part as it was.`,
      action: {
        label: "Change it there too",
        run: () => {
          undoList(address);
          editAndTell(address, name, [everywhere]);
        },
      },
    });
    return;
  }
  const shared = steps.flatMap((step) =>
    step.do === "change-part"
      ? (list.lines.find(({ part }) => part.id === step.part)?.part.alsoIn ?? [])
      : [],
  );
  if (shared.length > 0)
    showToast({
      text: `The part is used in ${listed([...new Set(shared)])} too and is changed there as well.`,
      action: { label: "Undo", run: () => undoList(address) },
    });
}

/** What one does to the list: the deeds of the grid, of the bar of chosen lines, of the form. */
export function usePartsWork(address: KitAddress, list: PartsList) {
  const [faults, setFaults] = useState<ReadonlyMap<string, CellFault>>(new Map());
  const [draft, setDraft] = useState<Draft>(EMPTY_DRAFT);
  const [misfits, setMisfits] = useState<readonly Misfit[]>([]);
  const [chosen, setChosen] = useState<readonly string[]>([]);
  const held = useRef(draft);
  held.current = draft;

  const deeds = useMemo(() => {
    const now = () => shownList(address);
    const lineOf = (id: string): Line | undefined => now()?.lines.find((line) => line.id === id);
    const headOf = (column: ColumnKey) => columnHead(column, now()?.editions ?? []);
    const mark = (fault: Omit<CellFault, "message">, message: string | null) =>
      setFaults((before) => {
        const after = new Map(before);
        after.delete(faultKey(fault.row, fault.column));
        if (message !== null) after.set(faultKey(fault.row, fault.column), { ...fault, message });
        return after;
      });

    function take(name: string, steps: readonly Step[]) {
      const before = now();
      editAndTell(address, name, steps);
      if (before) tellOthers(address, before, name, steps);
    }

    /** Pins the offer of a line's part, or frees it for the cheapest. */
    function choose(row: LineRow, offer: string) {
      const pinnedOfferId = offer === CHEAPEST ? null : offer;
      const part = row.line.part;
      take(`${lineName(row.line)}: ${pinnedOfferId ? "offer pinned" : "bought where it is cheapest"}.`, [
        { do: "choose", part: part.id, set: { pinnedOfferId } },
      ]);
    }

    function edit(row: LineRow, column: ColumnKey, text: string) {
      if (column === "supplier") return choose(row, text);
      const [shown, line] = [now(), lineOf(row.id)];
      if (!shown || !line || !isCellColumn(column)) return;
      const read = readCell(shown, line, column, text);
      mark({ row: row.id, column, text }, read.ok ? null : read.message);
      if (!read.ok) return;
      const [was, is] = [cellText(row, column) || "nothing", text.trim() || "nothing"];
      take(`${lineName(line)}: ${headOf(column).toLowerCase()} changed from ${was} to ${is}.`, read.steps);
    }

    function clear(rows: readonly LineRow[], columns: readonly ColumnKey[]) {
      if (columns.includes("place")) return remove(rows.map(({ id }) => id));
      const shown = now();
      if (!shown) return;
      const steps = rows.flatMap((row) =>
        columns.flatMap((column) => {
          const line = lineOf(row.id);
          const read =
            line && isCellColumn(column) && column !== "part" && column !== "mark" && column !== "class"
              ? readCell(shown, line, column, "")
              : null;
          mark({ row: row.id, column, text: "" }, null);
          return read?.ok ? read.steps : [];
        }),
      );
      take(rows.length === 1 ? "Cells emptied." : `Cells of ${rows.length} lines emptied.`, steps);
    }

    function remove(ids: readonly string[]) {
      const lines = ids.flatMap((id) => lineOf(id) ?? []);
      const name =
        lines.length === 1 && lines[0] ? `${lineName(lines[0])} removed.` : `${lines.length} lines removed.`;
      take(
        name,
        lines.map(({ id }): Step => ({ do: "remove-line", line: id })),
      );
    }

    function commitDraft(): boolean {
      const shown = now();
      const { cells, at } = held.current;
      if (!shown || !Object.values(cells).some((text) => text?.trim()) || !cells.part?.trim()) return false;
      const read = lineFromCells(shown, newLineId(), cells, at ?? undefined);
      if (!read.ok) {
        showToast({ kind: "fault", text: read.message });
        return false;
      }
      held.current = EMPTY_DRAFT;
      setDraft(EMPTY_DRAFT);
      take(`${cells.designators?.trim() || cells.part.trim()} added.`, read.steps);
      return true;
    }

    return {
      take,
      edit,
      clear,
      remove,
      commitDraft,
      undo: () => undoList(address),
      redo: () => redoList(address),
      select: setChosen,
      dropFault: (fault: CellFault) => mark(fault, null),
      forgetMisfits: () => setMisfits([]),
      writeDraft(column: ColumnKey, text: string) {
        const next = { ...held.current, cells: { ...held.current.cells, [column as CellColumn]: text } };
        held.current = next;
        setDraft(next);
      },
      insertAt(row: LineRow | null) {
        const place = row ? (now()?.lines.findIndex(({ id }) => id === row.id) ?? -1) : -1;
        setDraft({ ...held.current, at: place < 0 ? null : place });
      },
      move(row: LineRow, by: 1 | -1) {
        const place = now()?.lines.findIndex(({ id }) => id === row.id) ?? -1;
        const to = place + by;
        if (place < 0 || to < 0 || to >= (now()?.lines.length ?? 0)) return;
        take(`${lineName(row.line)} moved.`, [{ do: "move-line", line: row.id, to }]);
      },
      fillDown(rows: readonly LineRow[], columns: readonly ColumnKey[]) {
        const [first, ...rest] = rows;
        const shown = now();
        if (!first || !shown) return;
        const steps = rest.flatMap((row) =>
          columns.flatMap((column) => {
            const line = lineOf(row.id);
            const read =
              line && isCellColumn(column) ? readCell(shown, line, column, cellText(first, column)) : null;
            return read?.ok ? read.steps : [];
          }),
        );
        take(`${rest.length} lines filled from ${lineName(first.line)}.`, steps);
      },
      async paste(
        block: string[][],
        place: PastePlace,
        lines: readonly LineRow[],
        columns: readonly ColumnKey[],
      ) {
        const reader = await pasting().catch(() => null);
        const shown = now();
        if (!reader)
          showToast({ kind: "fault", text: "Nothing was pasted. Try again when you are connected." });
        if (!reader || !shown) return;
        const rows = new Map(lines.map((row) => [row.id, row]));
        const target = { ...place, lines: lines.map(({ id }) => id), columns };
        const textOf = (id: string, column: ColumnKey) => {
          const row = rows.get(id);
          return row ? cellText(row, column) : "";
        };
        const pasted = reader.pasteBlock(shown, block, target, textOf, newLineId);
        setMisfits(pasted.misfits);
        if (pasted.misfits.length > 0) return;
        take(pasted.lines === 1 ? "One line pasted." : `${pasted.lines} lines pasted.`, pasted.steps);
      },
    };
  }, [address]);

  return { faults, draft, misfits, chosen, deeds, list };
}

export type PartsWork = ReturnType<typeof usePartsWork>;
export type PartsDeeds = PartsWork["deeds"];
