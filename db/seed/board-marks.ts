import { BENCH_PIP } from "#src/drawings/bench-pip.ts";
import type { BoardMarks } from "#src/drawings/board-marks.ts";
import { CRICKET_BOX } from "#src/drawings/cricket-box.ts";
import { DEW_LANTERN } from "#src/drawings/dew-lantern.ts";
import { TIDE_CLOCK } from "#src/drawings/tide-clock.ts";

/** What is drawn on the boards of the demonstration, by the name of the kit. */
export const MARKS: Readonly<Record<string, BoardMarks>> = {
  "Dew Lantern": DEW_LANTERN,
  "Bench Pip": BENCH_PIP,
  "Cricket Box": CRICKET_BOX,
  "Tide Clock": TIDE_CLOCK,
};
