import { countText, moneyText } from "#src/components/amount-text.ts";
import type { BoardPicture } from "#src/components/board-picture.ts";
import type { KitLabelProps } from "#src/components/islands/parts/KitLabel.tsx";
import type { Figure } from "#src/costing/figure.ts";
import { needsInShort, priceNeeds } from "#src/costing/problem-words.ts";
import type { Tally } from "#src/costing/tally.ts";
import type { HomeKit } from "#src/server/home.ts";
import type { KitRow } from "#src/server/store/kit.ts";

/** What the home page says of a kit: chip, next step, four figures. */

type Step = KitLabelProps["step"];

function openCount({ stops }: HomeKit): number {
  return stops.reduce((sum, { state }) => sum + (state.kind === "to-settle" ? state.count : 0), 0);
}

/** How a kit stands, in a word. */
export function kitChip(home: HomeKit): KitLabelProps["chip"] {
  if (home.empty) return { kind: "waiting", words: "Just begun" };
  const open = openCount(home);
  if (open > 0) return { kind: "caution", words: `${open} to settle` };
  const ahead = home.stops.find(({ state }) => state.kind === "not-started");
  return ahead ? { kind: "waiting", words: `${ahead.name} to come` } : { kind: "good", words: "All settled" };
}

const SETTLE = {
  parts: "Settle the parts list",
  offers: "Settle the offers",
  boards: "Settle the boards",
  run: "Settle the run",
  price: "Settle the price",
};
const BEGIN = {
  parts: "Bring in a parts list",
  offers: "Add the first offer",
  boards: "Add a board quote",
  run: "Plan the run",
  price: "Set the price",
};

/** The one next step of a kit, with the page on which it is taken. */
export function nextStep({ stops, empty, money: seesMoney }: HomeKit, base: string): Step {
  if (empty) return { label: BEGIN.parts, href: `${base}/parts` };
  if (!seesMoney) return { label: "See the parts list", href: `${base}/parts` };
  const open = stops.find(({ state }) => state.kind === "to-settle");
  if (open) return { label: SETTLE[open.key], href: `${base}/${open.key}` };
  const ahead = stops.find(({ state }) => state.kind === "not-started");
  return ahead
    ? { label: BEGIN[ahead.key], href: `${base}/${ahead.key}` }
    : { label: "See the run", href: `${base}/run` };
}

function written(figure: Figure, write: (value: string) => string): string {
  return figure.known ? write(figure.value) : needsInShort(figure.needs);
}

/** Four figures as written, or what they need, in the words of the strip. */
export function kitFigures({
  currency,
  costPerKit,
  price,
  evenAfter,
  earnsPerKit,
}: Tally): KitLabelProps["figures"] {
  const money = (value: string) => moneyText(value, currency);
  return [
    { label: "Cost per kit", value: written(costPerKit, money) },
    { label: "Price", value: price.known ? money(price.value) : priceNeeds(price.needs) },
    { label: "Even after", value: written(evenAfter, (value) => `${countText(value)} sold`) },
    { label: "Earns per kit", value: written(earnsPerKit, money) },
  ];
}

/** The kit with the least left to settle among those that are begun: the one to name in the answer. */
export function nearest(kits: readonly HomeKit[]): { home: HomeKit; open: number } | undefined {
  const begun = kits.filter((home) => !home.empty && home.money !== null);
  const ranked = begun
    .map((home) => ({ home, open: openCount(home) }))
    .filter(({ open }) => open > 0)
    .sort((a, b) => a.open - b.open);
  return ranked[0];
}

/** The board to scale; null while it is not drawn, or the kit has none. A round one needs its diameter only. */
export function boardPicture({
  boardNeeded,
  boardShape,
  boardWidth,
  boardHeight,
  boardMarks,
}: KitRow): BoardPicture | null {
  const height = boardShape === "round" ? boardWidth : boardHeight;
  if (!boardNeeded || boardWidth === null || height === null) return null;
  const marks = boardMarks ?? undefined;
  return { shape: boardShape, widthMm: Number(boardWidth), heightMm: Number(height), marks };
}
