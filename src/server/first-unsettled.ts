import type { KitStop, StopKey } from "./trail.ts";

/** Where the work on a kit goes on: the first stop that is not done; all done, the last one, which tells the figures. */
export function firstUnsettled(stops: readonly KitStop[]): StopKey {
  const open = stops.find(({ state }) => state.kind !== "done") ?? stops.at(-1);
  return open?.key ?? "parts";
}
