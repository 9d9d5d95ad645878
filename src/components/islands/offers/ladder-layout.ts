import type { RungOrder } from "#src/costing/order-curve.ts";

/** Measures of the drawing in px, wide and on a phone. */
export interface LadderPlan {
  width: number;
  left: number;
  right: number;
  narrow: boolean;
}
export const WIDE: LadderPlan = { width: 640, left: 104, right: 470, narrow: false };
export const NARROW: LadderPlan = { width: 358, left: 76, right: 302, narrow: true };

const TOP = 44;
const STEP = 100;
const ROOM_FOR_NEED = 20;
const FOOT = 46;

/** A rung with its height in the drawing. */
export interface PlacedRung extends RungOrder {
  y: number;
}

/** Where everything of the drawing stands. */
export interface LadderLayout {
  placed: PlacedRung[];
  needY: number | null;
  height: number;
}

/** Rungs from the top, evenly, with room for the line of what is needed where it falls between two. */
export function ladderLayout(rungs: readonly RungOrder[], need: number): LadderLayout {
  const down = [...rungs].reverse();
  const below = need > 0 ? down.findIndex(({ quantity }) => quantity <= need) : -1;
  const extra = (place: number) => (below > 0 && place >= below ? ROOM_FOR_NEED : 0);
  const placed = down.map((rung, place) => ({ ...rung, y: TOP + place * STEP + extra(place) }));
  const end = placed.at(-1)?.y ?? TOP;
  const above = placed[below - 1];
  const reached = placed[below];
  const needY =
    need === 0
      ? null
      : reached === undefined
        ? end + 56
        : above === undefined
          ? reached.y - 34
          : (above.y + reached.y) / 2 + 2;
  return { placed, needY, height: Math.max(end, needY ?? 0) + FOOT };
}
