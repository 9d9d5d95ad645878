import type { KitStop, StopKey } from "./trail.ts";

/** Where the work on a kit goes on: the first stop that is not done; all done, the run, which tells the figures. */
export function firstUnsettled(stops: readonly KitStop[]): StopKey {
  const open = stops.find(({ state }) => state.kind !== "done") ?? stops.find(({ key }) => key === "run");
  return open?.key ?? "parts";
}
