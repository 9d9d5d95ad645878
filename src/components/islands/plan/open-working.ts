import type { FigureId } from "#src/costing/working-tree.ts";
import { moduleStore, useStore } from "./module-store.ts";

/** The figure whose working is open, and for which run; `kits` null: the chosen one, also when it changes. */
export interface OpenWorking {
  figure: FigureId;
  kits: number | null;
}

export const openWorking = moduleStore<OpenWorking | null>(null);

/** Id of the panel, for figures that say what they open. */
export const WORKING_PANEL = "working-panel";

/** What a figure needs to open its working: spread into `Figure`. */
export function useOpens(): (
  figure: FigureId,
  kits?: number,
) => { open: boolean; onOpen: () => void; controls: string } {
  const now = useStore(openWorking, null);
  return (figure, kits) => ({
    open: now?.figure === figure && now.kits === (kits ?? null),
    onOpen: () => openWorking.put({ figure, kits: kits ?? null }),
    controls: WORKING_PANEL,
  });
}
