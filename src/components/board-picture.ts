/** How boards are drawn: all at one scale, so that sizes can be compared by eye. */
export const PX_PER_MM = 2.05;

/** What can be seen on a board, in millimetres from its upper left corner. */
export type BoardMarks = {
  /** Mounting holes with their copper ring: x, y, outer diameter. */
  holes?: readonly (readonly [number, number, number])[];
  /** Solder pads: x, y. */
  pads?: readonly (readonly [number, number])[];
  /** Bare copper as a path. */
  copper?: string;
  /** Printed lines as a path. */
  silk?: string;
};

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
