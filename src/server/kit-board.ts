import type { PanelBoard } from "#src/costing/panels/panel-terms.ts";
import type { KitRow } from "./store/kit.ts";

/** A kit's board as it lies on panels; `null` where its size is not stated. A round board is as high as wide. */
export function kitBoard({
  boardShape,
  boardWidth,
  boardHeight,
}: Pick<KitRow, "boardShape" | "boardWidth" | "boardHeight">): PanelBoard | null {
  const height = boardShape === "round" ? boardWidth : boardHeight;
  return boardWidth === null || height === null ? null : { shape: boardShape, width: boardWidth, height };
}
