import type { GridApi } from "ag-grid-community";
import { type ComponentType, useDeferredValue, useEffect, useMemo, useRef, useState } from "react";
import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { FilterGroup } from "#src/components/islands/parts/FilterGroup.tsx";
import { SearchIcon } from "#src/components/islands/parts/Icons.tsx";
import { Loading } from "#src/components/islands/parts/Loading.tsx";
import { usePhone } from "#src/components/islands/parts/phone.ts";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { type ModuleStore, useStore } from "#src/components/islands/plan/module-store.ts";
import { openWorking } from "#src/components/islands/plan/open-working.ts";
import type { PartsList } from "#src/server/present.ts";
import { ChosenBar } from "./ChosenBar.tsx";
import { ColumnsMenu } from "./ColumnsMenu.tsx";
import { type ColumnKey, columnKeys } from "./cell-text.ts";
import { EditorBoxes } from "./EditorBoxes.tsx";
import type { GridContext, OfferChoice } from "./grid-context.ts";
import {
  filteredRows,
  fullestEdition,
  type GridRow,
  groupedRows,
  type LineFilter,
  type LineRow,
  partsTotal,
  piecesIn,
  type TotalRow,
} from "./grid-rows.ts";
import { LineEntry } from "./LineEntry.tsx";
import { LineForm } from "./LineForm.tsx";
import { editorState, NOTHING_EDITED } from "./list-editor.ts";
import { moreColumns } from "./more-columns.ts";
import { offerChoices } from "./offer-choices.ts";
import type { GridDeeds, PartsGridProps } from "./PartsGrid.tsx";
import type { Bought, PartsProps } from "./PartsPage.tsx";
import { choiceOf } from "./steps.ts";
import { usePartsWork } from "./use-parts-work.ts";

/** The grid is fetched when it is needed: it is the largest thing on the page. */
function useGrid(): ComponentType<PartsGridProps> | undefined {
  const [Grid, setGrid] = useState<ComponentType<PartsGridProps>>();
  useEffect(() => {
    void import("./PartsGrid.tsx").then((loaded) => setGrid(() => loaded.default));
  }, []);
  return Grid;
}

function totalRow(list: PartsList, bought: Bought | null): TotalRow {
  const total = bought && partsTotal(bought);
  const pieces = list.editions.map(({ id }) => [`quantity:${id}`, String(piecesIn(list, id))]);
  const count = list.lines.length === 1 ? "1 line" : `${list.lines.length} lines`;
  return {
    kind: "total",
    id: "total",
    cells: {
      designators: count,
      ...Object.fromEntries(pieces),
      ...(total &&
        bought && { supplier: `Parts for ${bought.plan.run.kits} kits ${total.run}`, perKit: total.perKit }),
    },
  };
}

const PHONE_COLUMNS: readonly string[] = ["designators", "part", "bands", "perKit"];

/** On a phone three or four columns are left; with several editions the quantity in the fullest. */
function shownColumns(all: ColumnKey[], list: PartsList, phone: boolean, money: boolean): ColumnKey[] {
  if (!phone) return all;
  const fullest = `quantity:${fullestEdition(list)?.id}`;
  return all.filter((key) => key === fullest || PHONE_COLUMNS.includes(key) || (!money && key === "state"));
}

export interface WorkbenchProps extends PartsProps {
  list: PartsList;
  rows: readonly LineRow[];
  bought: Bought | null;
  changed: ReadonlySet<string>;
  lastRevision: string | null;
  /** Counts up when the page's own button asks for a new line. */
  addLine: ModuleStore<number>;
}

/** The parts list to work in: find, filter, group, choose, edit. */
export function PartsWorkbench(props: WorkbenchProps) {
  const {
    address,
    list,
    rows: all,
    bought,
    changed,
    lastRevision,
    canEdit,
    canChoose,
    styleNonce,
    addLine,
  } = props;
  const Grid = useGrid();
  const phone = usePhone();
  const [filter, setFilter] = useState<LineFilter>("all");
  const [find, setFind] = useState("");
  const wanted = useDeferredValue(find);
  const [grouped, setGrouped] = useState(false);
  const [open, setOpen] = useState<string | null>(null);
  const more = useStore(moreColumns, []);
  const editor = useStore(editorState, NOTHING_EDITED);
  const grid = useRef<GridApi<GridRow> | null>(null);
  const work = usePartsWork(address, list);
  const { deeds, draft } = work;

  const rows = useMemo(() => filteredRows(all, filter, wanted, changed), [all, filter, wanted, changed]);
  const columns = useMemo(
    () => shownColumns(columnKeys(list.editions, list.money, more), list, phone, list.money),
    [list, more, phone],
  );
  const drafting = canEdit && !phone && filter === "all" && wanted === "" && !grouped;
  const shown = useMemo((): GridRow[] => {
    if (grouped) return groupedRows(rows);
    if (!drafting) return [...rows];
    const at = draft.at ?? rows.length;
    return [...rows.slice(0, at), { kind: "draft", id: "draft" }, ...rows.slice(at)];
  }, [rows, grouped, drafting, draft.at]);

  const offersFor = (part: string): OfferChoice[] => (bought ? offerChoices(bought.plan, part) : []);
  const context: Omit<GridContext, "range"> = {
    faults: work.faults,
    draft: draft.cells,
    canEdit,
    canOpen: list.money,
    canChoose,
    offersFor,
    pinnedFor: (part) => (list.money ? choiceOf(list, part).pinnedOfferId : null),
    openLine: setOpen,
    openWorking: (part) => openWorking.put({ figure: `part:${part}`, kits: null }),
  };

  function focusDraft() {
    const node = grid.current?.getRowNode("draft");
    if (node?.rowIndex == null) return;
    grid.current?.ensureIndexVisible(node.rowIndex);
    grid.current?.setFocusedCell(node.rowIndex, "designators");
    grid.current?.startEditingCell({ rowIndex: node.rowIndex, colKey: "designators" });
  }
  const asked = useStore(addLine, 0);
  const draftFocus = useRef(focusDraft);
  draftFocus.current = focusDraft;
  /** The empty line moves as lines are added; it is gone to when the grid shows it at its new place. */
  const [wish, setWish] = useState(0);
  /** On a phone: how many asked-for lines have been entered. */
  const [entering, setEntering] = useState(0);
  useEffect(() => {
    if (asked + wish === 0) return;
    const frame = requestAnimationFrame(() => draftFocus.current());
    return () => cancelAnimationFrame(frame);
  }, [asked, wish]);

  /** So many lines must stand in the grid before the empty line has its new place and can be gone to. */
  const awaited = useRef<number | null>(null);
  useEffect(() => {
    if (awaited.current === null || all.length < awaited.current) return;
    awaited.current = null;
    setWish((count) => count + 1);
  }, [all]);

  /** A line that was moved keeps the focus, so that the same key moves it on. */
  const follow = useRef<{ line: string; column: string } | null>(null);
  // biome-ignore lint/correctness/useExhaustiveDependencies: the line is gone after when the rows have changed.
  useEffect(() => {
    const node = follow.current && grid.current?.getRowNode(follow.current.line);
    if (node?.rowIndex == null || !follow.current) return;
    grid.current?.setFocusedCell(node.rowIndex, follow.current.column);
    follow.current = null;
  }, [shown]);

  const gridDeeds: GridDeeds = {
    ...deeds,
    move: (row, by) => {
      const column = grid.current?.getFocusedCell()?.column.getColId() ?? "designators";
      follow.current = { line: row.id, column };
      deeds.move(row, by);
    },
    leaveDraft: () => void deeds.commitDraft(),
    nextDraft: () => {
      if (deeds.commitDraft()) awaited.current = all.length + 1;
      else setWish((count) => count + 1);
    },
    insertAt: (row) => {
      deeds.insertAt(row);
      setWish((count) => count + 1);
    },
    paste: (block, place) => deeds.paste(block, place, rows, columns),
    open: (row, column) => {
      if (column === "place") setOpen(row.id);
      else if (column === "perKit" && row.money) context.openWorking(row.line.part.id);
      else return false;
      return true;
    },
  };
  const toSettle = all.filter(({ state }) => state.toSettle).length;
  const chosen = list.money ? list.lines.filter(({ id }) => work.chosen.includes(id)) : [];
  const opened = list.money ? list.lines.find(({ id }) => id === open) : undefined;

  return (
    <div>
      <div className="mb-3 flex flex-wrap items-center gap-3">
        <TextField
          label="Find a line"
          labelHidden
          type="search"
          sign={<SearchIcon />}
          placeholder="Find a designator, value or code"
          className="w-full tablet:w-[300px]"
          value={find}
          onChange={({ currentTarget }) => setFind(currentTarget.value)}
        />
        <FilterGroup
          label="Lines"
          value={filter}
          onChoose={(value) => setFilter(value as LineFilter)}
          choices={[
            { value: "all", label: "All", count: all.length },
            { value: "to-settle", label: "To settle", count: toSettle },
            ...(lastRevision
              ? [{ value: "changed", label: `Changed in rev ${list.kit.revision}`, count: changed.size }]
              : []),
          ]}
        />
        {!phone && (
          <CheckBox
            label="Group by kind"
            checked={grouped}
            onChange={({ currentTarget }) => setGrouped(currentTarget.checked)}
          />
        )}
        {!phone && <ColumnsMenu money={list.money} />}
        {canEdit && !phone && (
          <span className="flex gap-4">
            <QuietButton onClick={deeds.undo} disabled={editor.undo.length === 0}>
              Undo
            </QuietButton>
            <QuietButton onClick={deeds.redo} disabled={editor.redo.length === 0}>
              Redo
            </QuietButton>
          </span>
        )}
        {bought && <p className="type-label ml-auto text-ink-2">{basis(bought)}</p>}
      </div>
      {phone && canEdit && list.money && entering < asked && (
        <Section title="A new line">
          <div className="pb-6">
            <LineEntry address={address} list={list} onAdded={() => setEntering(asked)} />
          </div>
        </Section>
      )}
      {list.money && <EditorBoxes address={address} list={list} work={work} />}
      {chosen.length > 0 && (
        <ChosenBar
          lines={chosen}
          plan={bought?.plan ?? null}
          deeds={deeds}
          onDone={() => grid.current?.deselectAll()}
        />
      )}
      {Grid ? (
        <Grid
          label={`Parts list of ${list.kit.name}`}
          rows={shown}
          total={totalRow(list, bought)}
          columns={columns}
          editions={list.editions}
          context={context}
          grouped={grouped}
          phone={phone}
          styleNonce={styleNonce}
          deeds={gridDeeds}
          onReady={(api) => {
            grid.current = api;
          }}
        />
      ) : (
        <Loading what="Parts list" rows={Math.min(all.length, 12) + 1} />
      )}
      {rows.length === 0 && all.length > 0 && (
        <p className="type-note py-3 text-ink-2">
          {filter === "to-settle" && wanted === ""
            ? "Nothing is to settle."
            : "No line fits what is looked for."}
        </p>
      )}
      <p className="type-label mt-4 text-ink-2 max-tablet:hidden">{keyWords(list.money, canEdit)}</p>
      {opened && list.money && (
        <LineForm
          list={list}
          line={opened}
          offers={offersFor(opened.part.id)}
          canEdit={canEdit}
          canChoose={canChoose}
          deeds={deeds}
          onClose={() => setOpen(null)}
        />
      )}
    </div>
  );
}

function keyWords(canOpen: boolean, canEdit: boolean): string {
  const words = ["Arrow keys move. Shift and arrow select. Ctrl and C copies with units."];
  if (canEdit) words.unshift("Enter edits a cell.");
  if (canOpen) words.push("Enter on a line’s number opens all of its fields.");
  if (canEdit)
    words.push(
      "Ctrl and V pastes a block, Ctrl and D fills down. Insert begins a line, Alt and arrow moves one, Delete empties cells.",
    );
  return words.join(" ");
}

function basis({ plan }: Bought): string {
  const spare = plan.parts.some(({ spareRate, leastSpare }) => spareRate !== "0" || leastSpare > 0);
  return `Prices without tax and freight, for ${plan.run.kits} kits${spare ? " and their spares" : ""}`;
}
