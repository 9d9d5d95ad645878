import { useMemo } from "react";
import { useStore } from "#src/components/islands/plan/module-store.ts";
import type { PartsList } from "#src/server/present.ts";
import { type ColumnKey, columnKeys } from "./cell-text.ts";
import { type GridLayout, gridLayout } from "./grid-layout.ts";
import { fullestEdition } from "./grid-rows.ts";
import { moreColumns } from "./more-columns.ts";

const PHONE_COLUMNS: readonly string[] = ["designators", "part", "bands", "perKit"];

/** On a phone three or four columns are left; with several editions the quantity in the fullest. */
function phoneLayout(all: readonly ColumnKey[], list: PartsList): GridLayout {
  const fullest = `quantity:${fullestEdition(list)?.id}`;
  const isShown = (key: ColumnKey) =>
    key === fullest || PHONE_COLUMNS.includes(key) || (!list.money && key === "state");
  return { keys: all.filter(isShown), folded: true, width: () => 0 };
}

/** The columns of a list in the room there is, with those that were asked for besides. */
export function useLayout(list: PartsList, phone: boolean, room: number): GridLayout {
  const more = useStore(moreColumns, []);
  return useMemo(() => {
    const all = columnKeys(list.editions, list.money, more);
    return phone ? phoneLayout(all, list) : gridLayout(all, room);
  }, [list, more, phone, room]);
}
