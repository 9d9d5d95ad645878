import { changeText, countText, moneyText, signedCountText } from "#src/components/amount-text.ts";
import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import type { TallyCell } from "#src/components/islands/parts/TallyStrip.tsx";
import type { Figure } from "#src/costing/figure.ts";
import { needsInShort, priceNeeds } from "#src/costing/problem-words.ts";
import type { Tally } from "#src/costing/tally.ts";
import type { TallyChange, TallyFigure } from "#src/costing/tally-change.ts";
import type { FigureId } from "#src/costing/working-tree.ts";
import { needLink } from "./page-links.ts";

const LABELS: Record<TallyFigure, string> = {
  costPerKit: "Cost per kit",
  price: "Price",
  earnsPerKit: "Earns per kit",
  evenAfter: "Even after",
  cashNeeded: "Cash needed",
};

const ORDER: readonly TallyFigure[] = ["costPerKit", "price", "earnsPerKit", "evenAfter", "cashNeeded"];

/** What each figure opens; the price leads to its own page. */
const OPENED = {
  costPerKit: "per-kit-used",
  earnsPerKit: "earns-per-kit",
  evenAfter: "even-after",
  cashNeeded: "spent",
} as const satisfies Record<Exclude<TallyFigure, "price">, FigureId>;

export interface CellContext {
  address: KitAddress;
  currency: string;
  changes: readonly TallyChange[];
  /** Left out until there is a plan whose workings can be opened. */
  opens?: (figure: FigureId) => { open: boolean; onOpen: () => void };
}

/** What stands in a figure's place, and the way to the first thing it needs. */
function needs(
  key: TallyFigure,
  figure: Figure,
  address: KitAddress,
): Pick<TallyCell, "needs" | "needsHref"> {
  if (figure.known) return {};
  const [first] = figure.needs;
  const words = key === "price" ? priceNeeds(figure.needs) : needsInShort(figure.needs);
  return { needs: words, needsHref: first && needLink(address, first) };
}

/** The figures of the strip, written, with their changes and what they open. */
export function tallyCells(tally: Tally, context: CellContext): TallyCell[] {
  const { address, currency, changes, opens } = context;
  return ORDER.map((key) => {
    const figure = tally[key];
    const change = changes.find((one) => one.figure === key);
    const isCount = key === "evenAfter";
    return {
      key,
      label: LABELS[key],
      value: figure.known ? (isCount ? countText(figure.value) : moneyText(figure.value, currency)) : null,
      ...needs(key, figure, address),
      ...(isCount && { after: "sold" }),
      onPhone: key === "costPerKit" || key === "earnsPerKit",
      ...(change && {
        change: {
          amount: isCount ? signedCountText(change.by) : changeText(change.by, currency),
          turn: change.turn,
        },
      }),
      ...(figure.known && (key === "price" ? { href: kitPath(address, "/price") } : opens?.(OPENED[key]))),
    };
  });
}

/** What is said once after a change: "Cost per kit €14.95, €2.14 less." */
export function spokenChange(tally: Tally, changes: readonly TallyChange[]): string {
  const change = changes[0];
  if (!change) return "";
  const figure = tally[change.figure];
  if (!figure.known) return "";
  const isCount = change.figure === "evenAfter";
  const write = (value: string) => (isCount ? countText(value) : moneyText(value, tally.currency));
  const less = change.by.startsWith("-");
  const by = write(less ? change.by.slice(1) : change.by);
  return `${LABELS[change.figure]} ${write(figure.value)}, ${by} ${less ? "less" : "more"}.`;
}
