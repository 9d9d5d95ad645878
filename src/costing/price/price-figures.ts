import type { AimName } from "./aims.ts";

/** Figures of one channel that open to their working; ids of channel and edition follow. */
export const CHANNEL_FIGURES = ["order", "order-left", "order-hour"] as const;
/** Figures of an edition over all its channels. */
export const EDITION_FIGURES = [
  "kit-kept",
  "kit-left",
  "kit-hour",
  "kit-margin",
  "kit-mark-up",
  "kit-next",
] as const;

/** The figure an aim's working explains is the least price for it. */
export type PriceFigureId =
  | `${(typeof CHANNEL_FIGURES)[number]}:${string}:${string}`
  | `${(typeof EDITION_FIGURES)[number]}:${string}`
  | "sold-profit"
  | "sold-even-after"
  | `aim:${AimName}`;
