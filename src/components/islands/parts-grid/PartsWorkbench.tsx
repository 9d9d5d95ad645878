import type { GridApi } from "ag-grid-community";
import { type ComponentType, useDeferredValue, useEffect, useMemo, useRef, useState } from "react";
import { Later } from "#src/components/islands/parts/Later.tsx";
import { Loading } from "#src/components/islands/parts/Loading.tsx";
import { laterPart } from "#src/components/islands/parts/later-part.ts";
import { usePhone } from "#src/components/islands/parts/phone.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { useWidth } from "#src/components/islands/parts/use-width.ts";
import { type ModuleStore, useStore } from "#src/components/islands/plan/module-store.ts";
import { openWorking } from "#src/components/islands/plan/open-working.ts";
import type { PartsList } from "#src/server/present.ts";
import type { ChosenBarProps } from "./ChosenBar.tsx";
import { EditorBoxes } from "./EditorBoxes.tsx";
import type { GridContext, OfferChoice } from "./grid-context.ts";
import { filteredRows, type GridRow, groupedRows, type LineRow } from "./grid-rows.ts";
import { basisWords, keyWords } from "./grid-words.ts";
import type { LineEntryProps } from "./LineEntry.tsx";
import type { LineFormProps } from "./LineForm.tsx";
import { ListTools, type Looking } from "./ListTools.tsx";
import { offerChoices } from "./offer-choices.ts";
import type { GridDeeds, PartsGridProps } from "./PartsGrid.tsx";
import type { Bought, PartsProps } from "./PartsPage.tsx";
import { choiceOf } from "./steps.ts";
import { totalRow } from "./total-row.ts";
import { useDraftLine } from "./use-draft-line.ts";
import { useLayout } from "./use-layout.ts";
import { usePartsWork } from "./use-parts-work.ts";

const ChosenBar = laterPart<ChosenBarProps>(async () => (await import("./ChosenBar.tsx")).ChosenBar);
const LineEntry = laterPart<LineEntryProps>(async () => (await import("./LineEntry.tsx")).LineEntry);
const LineForm = laterPart<LineFormProps>(async () => (await import("./LineForm.tsx")).LineForm);

const OVERLAY =
  "fixed right-0 bottom-0 z-30 h-dvh w-full border-l-2 border-ink bg-paper p-6 tablet:w-[588px]";

/** What a line or several chosen ones open is fetched when somebody comes to the list. */
function fetchSoon(): void {
  LineForm.preload();
  ChosenBar.preload();
}

/** The grid is fetched when it is needed: it is the largest thing on the page. */
function useGrid(): ComponentType<PartsGridProps> | undefined {
  const [Grid, setGrid] = useState<ComponentType<PartsGridProps>>();
  useEffect(() => {
    void import("./PartsGrid.tsx").then((loaded) => setGrid(() => loaded.default));
  }, []);
  return Grid;
}

/** The rows to show, with the empty line at its place among them. */
function rowsWithDraft(
  rows: readonly LineRow[],
  grouped: boolean,
  draftAt: number | null | false,
): GridRow[] {
  if (grouped) return groupedRows(rows);
  if (draftAt === false) return [...rows];
  const at = draftAt ?? rows.length;
  return [...rows.slice(0, at), { kind: "draft", id: "draft" }, ...rows.slice(at)];
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
  const { address, list, rows: all, bought, changed, lastRevision, canEdit, canChoose, styleNonce } = props;
  const Grid = useGrid();
  const phone = usePhone();
  const [box, room] = useWidth<HTMLDivElement>();
  const [looking, setLooking] = useState<Looking>({ filter: "all", find: "", grouped: false });
  const { filter, grouped } = looking;
  const find = useDeferredValue(looking.find);
  const [open, setOpen] = useState<string | null>(null);
  const asked = useStore(props.addLine, 0);
  /** On a phone: how many asked-for lines have been entered. */
  const [entered, setEntered] = useState(0);
  const grid = useRef<GridApi<GridRow> | null>(null);
  const work = usePartsWork(address, list);
  const { deeds, draft } = work;
  const layout = useLayout(list, phone, room);

  const rows = useMemo(() => filteredRows(all, filter, find, changed), [all, filter, find, changed]);
  const drafting = canEdit && !phone && filter === "all" && find === "" && !grouped;
  const shown = useMemo(
    () => rowsWithDraft(rows, grouped, drafting && draft.at),
    [rows, grouped, drafting, draft.at],
  );
  const followed = useDraftLine({ grid, deeds, all, shown, asked });

  const offersFor = (part: string): OfferChoice[] => (bought ? offerChoices(bought.plan, part) : []);
  const context: Omit<GridContext, "range"> = {
    faults: work.faults,
    draft: draft.cells,
    folded: layout.folded,
    canEdit,
    canOpen: list.money,
    canChoose,
    offersFor,
    pinnedFor: (part) => (list.money ? choiceOf(list, part).pinnedOfferId : null),
    openLine: setOpen,
    openWorking: (part) => openWorking.put({ figure: `part:${part}`, kits: null }),
  };
  const gridDeeds: GridDeeds = {
    ...deeds,
    ...followed,
    paste: (block, place) => void deeds.paste(block, place, rows, layout.keys),
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
    // biome-ignore lint/a11y/noStaticElementInteractions: nothing happens that anybody sees.
    <div ref={box} onPointerOver={fetchSoon} onFocus={fetchSoon}>
      <ListTools
        looking={looking}
        onLook={(change) => setLooking({ ...looking, ...change })}
        counts={{ all: all.length, "to-settle": toSettle, changed: changed.size }}
        since={lastRevision && list.kit.revision}
        phone={phone}
        money={list.money}
        steps={canEdit ? deeds : null}
        basis={bought && basisWords(bought.plan)}
      />
      {phone && canEdit && list.money && entered < asked && (
        <Section title="A new line">
          <div className="pb-6">
            <Later
              part={LineEntry}
              give={{ address, list, onAdded: () => setEntered(asked) }}
              what="A new line"
            />
          </div>
        </Section>
      )}
      {list.money && <EditorBoxes address={address} list={list} work={work} />}
      {chosen.length > 0 && (
        <Later
          part={ChosenBar}
          give={{
            lines: chosen,
            plan: bought?.plan ?? null,
            deeds,
            onDone: () => grid.current?.deselectAll(),
          }}
          what="Chosen lines"
          rows={1}
        />
      )}
      {Grid && room > 0 ? (
        <Grid
          label={`Parts list of ${list.kit.name}`}
          rows={shown}
          total={totalRow(list, bought)}
          layout={layout}
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
          {filter === "to-settle" && find === ""
            ? "Nothing is to settle."
            : "No line fits what is looked for."}
        </p>
      )}
      <p className="type-label mt-4 text-ink-2 max-tablet:hidden print:hidden">
        {keyWords(list.money, canEdit)}
      </p>
      {opened && list.money && (
        <Later
          part={LineForm}
          give={{
            list,
            line: opened,
            offers: offersFor(opened.part.id),
            canEdit,
            canChoose,
            deeds,
            onClose: () => setOpen(null),
          }}
          what="The line"
          rows={9}
          frame={OVERLAY}
        />
      )}
    </div>
  );
}
