import type { BoardMarks } from "./board-marks.ts";
import { padRows } from "./pad-rows.ts";

const CHIP_X = [17.38, 19.92, 22.46, 25, 27.54, 30.08, 32.62];

/** The board of the demonstration kit Cricket Box, invented: round, 50 mm, a sounder over a row of seven pins. */
export const CRICKET_BOX: BoardMarks = {
  holes: [
    [11, 11, 4.8],
    [39, 11, 4.8],
    [11, 39, 4.8],
    [39, 39, 4.8],
  ],
  pads: padRows(CHIP_X, [30.4, 37]),
  silk: "M14 25a11 11 0 0 1 22 0M17.5 25a7.5 7.5 0 0 1 15 0M21 25a4 4 0 0 1 8 0M12.6 25a12.4 12.4 0 1 0 24.8 0a12.4 12.4 0 1 0-24.8 0",
};
