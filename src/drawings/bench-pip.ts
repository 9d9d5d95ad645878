import type { BoardMarks } from "./board-marks.ts";
import { padRows } from "./pad-rows.ts";

/** Bodies that stand side by side along the middle, a pad above and below each. */
const BODY_X = [22, 26.5, 31, 35.5, 40, 44.5, 49, 53.5];

const bodies = BODY_X.map((x) => `M${x - 1} 4.8h2v4.4h-2Z`).join("");

/** The board of the demonstration kit Bench Pip, invented: 92 × 14 mm, pointed where the probe is soldered on. */
export const BENCH_PIP: BoardMarks = {
  outline: "M3 0H86L92 7L86 14H3A3 3 0 0 1 0 11V3A3 3 0 0 1 3 0Z",
  holes: [
    [5.5, 7, 4.4],
    [83.5, 7, 5.2],
  ],
  pads: [...padRows(BODY_X, [3, 11]), ...padRows([64, 66.54], [7])],
  copper: "M66.54 7H80.5",
  silk: `${bodies}M61.5 7a3.8 3.8 0 1 0 7.6 0a3.8 3.8 0 1 0-7.6 0M11 3.5h6v7h-6Z`,
};
