import type { BoardMarks } from "#src/drawings/board-marks.ts";

/** How boards are drawn: all at one scale, so that sizes can be compared by eye. */
export const PX_PER_MM = 2.05;

export type BoardPicture = {
  shape: "rectangle" | "round";
  widthMm: number;
  heightMm: number;
  marks?: BoardMarks;
};

/** "58 × 42 mm", "dia. 41 mm". */
export function boardInWords({ shape, widthMm, heightMm }: BoardPicture): string {
  return shape === "round" ? `dia. ${widthMm}\u00a0mm` : `${widthMm}\u00a0×\u00a0${heightMm}\u00a0mm`;
}
