import type { Aim } from "#src/costing/price/aims.ts";
import type { Scope } from "#src/costing/price/edition-sale.ts";
import type { PriceEnding } from "#src/costing/price/price-ending.ts";
import type { FigureId } from "#src/costing/working-tree.ts";
import { moduleStore, useStore } from "./module-store.ts";

/** The figure whose working is open, and for which run; `kits` null: the chosen one, also when it changes. */
export interface OpenWorking {
  figure: FigureId;
  kits: number | null;
  /** The least price for an aim is known by what was asked. */
  asked?: AskedAim;
}

export interface AskedAim {
  scope: Scope;
  aim: Aim;
  ending: PriceEnding;
}

export const openWorking = moduleStore<OpenWorking | null>(null);

/** Id of the panel, for figures that say what they open. */
export const WORKING_PANEL = "working-panel";

/** What a figure is handed that opens its working. */
interface Opening {
  open: boolean;
  onOpen: () => void;
  controls: string;
}

/** What a figure needs to open its working: spread into `Figure`. */
export function useOpens(): (figure: FigureId, kits?: number) => Opening {
  const now = useStore(openWorking, null);
  return (figure, kits) => ({
    open: now?.figure === figure && now.kits === (kits ?? null),
    onOpen: () => openWorking.put({ figure, kits: kits ?? null }),
    controls: WORKING_PANEL,
  });
}

/** The same for the least price for an aim, as it was asked when it was opened. */
export function useOpensAim(): (asked: AskedAim) => Opening {
  const now = useStore(openWorking, null);
  return (asked) => {
    const figure = `aim:${asked.aim.aim}` as const;
    return {
      open: now?.figure === figure && JSON.stringify(now.asked) === JSON.stringify(asked),
      onOpen: () => openWorking.put({ figure, kits: null, asked }),
      controls: WORKING_PANEL,
    };
  };
}
