import { micrometres, type Size, sizeWords } from "./micrometres.ts";
import { mostByArea } from "./most-boards.ts";
import type { PanelProblem } from "./panel-problem.ts";
import type { PanelBoard, PanelSize } from "./panel-terms.ts";

/** A little less than π ÷ 4, the share of its rectangle that an ellipse covers, in millionths. */
const ROUND_SHARE = 785_398n;

/**
 * Why so many boards cannot lie on a panel of the size quoted, whatever its rails and gaps: the board is larger, or
 * the boards together are. `null`: nothing speaks against it, or a size is finer than a micrometre.
 *
 * @example 12 boards of 58 × 42 mm on 200 × 140 mm → "12 boards of 58 × 42 mm do not fit on a panel of 200 × 140 mm …"
 */
export function quotedPanelProblem(board: PanelBoard, panel: PanelSize, count: number): PanelProblem | null {
  const [one, whole] = [sizeOf(board), sizeOf(panel)];
  if (one === null || whole === null) return null;
  const fits = liesIn(one, whole) && count <= mostOf(board.shape === "round", one, whole);
  if (fits) return null;
  const facts = { board: sizeWords(one), panel: sizeWords(whole), count };
  return { code: "quoted-panel-too-small", field: "quoted", facts };
}

function sizeOf({ width, height }: PanelSize): Size | null {
  const [wide, high] = [micrometres(width), micrometres(height)];
  return wide === null || high === null ? null : { width: wide, height: high };
}

function liesIn(board: Size, panel: Size): boolean {
  const upright = board.width <= panel.width && board.height <= panel.height;
  return upright || (board.height <= panel.width && board.width <= panel.height);
}

/** A bound that no layout passes. */
function mostOf(round: boolean, board: Size, panel: Size): number {
  if (!round) return mostByArea(panel, { board, gap: 0 });
  const area = ({ width, height }: Size) => BigInt(width) * BigInt(height);
  return Number((area(panel) * 1_000_000n) / (area(board) * ROUND_SHARE));
}
