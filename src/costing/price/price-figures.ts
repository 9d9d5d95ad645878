import type { AimName } from "./aims.ts";

/** Figures of one channel that open to their working; ids of channel and edition follow. */
export const CHANNEL_FIGURES = ["order", "order-left", "order-hour"] as const;
/** Figures of an edition over all its channels. */
export const EDITION_FIGURES = [
  "kit-kept",
  "kit-brings",
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
  | `aim:${AimName}`;

const NAMES: readonly string[] = [...CHANNEL_FIGURES, ...EDITION_FIGURES];

/**
 * Whether a figure is one of pricing that opens by its name alone; the price for an aim needs the aim.
 *
 * @example isPriceFigure("kit-left:full") === true
 */
export function isPriceFigure(figure: string): figure is Exclude<PriceFigureId, `aim:${AimName}`> {
  return NAMES.includes(figure.split(":", 1)[0] ?? "");
}
