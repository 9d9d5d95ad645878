import type { Size } from "#src/costing/panels/micrometres.ts";

/** A4 within its margins of 12 and 14 mm, and what heading, bar and scores need round the panel. */
const ROOM = { long: 297 - 28, short: 210 - 24 };
const UPRIGHT = { long: 297 - 24, short: 210 - 28 };
const AROUND = { beside: 6, aboveAndBelow: 36 };

/**
 * How a sheet of A4 must lie for a panel at true scale; null where it does not fit either way. The panel is never
 * turned, so that sheet and screen can be held side by side.
 */
export function paperFor({ width, height }: Size): "lying" | "upright" | null {
  const [wide, high] = [width / 1000 + AROUND.beside, height / 1000 + AROUND.aboveAndBelow];
  if (wide <= UPRIGHT.short && high <= UPRIGHT.long) return "upright";
  return wide <= ROOM.long && high <= ROOM.short ? "lying" : null;
}
