/** The stops of a kit's trail, in the order of the job. */
export type StopState = { kind: "done" } | { kind: "to-settle"; count: number } | { kind: "not-started" };

export type TrailStop = {
  name: string;
  href: string;
  state: StopState;
  /** The page this stop leads to is the one in view. */
  here?: boolean;
  /** Other words than "done" or "not started": "read", "7 matched, 1 left out". */
  words?: string;
};

/** What is written below a stop's name. */
export function stopWords(stop: TrailStop): string {
  if (stop.words !== undefined) return stop.words;
  if (stop.state.kind === "to-settle") return `${stop.state.count} to settle`;
  return stop.state.kind === "done" ? "done" : "not started";
}

export function begun(stop: TrailStop | undefined): boolean {
  return stop !== undefined && stop.state.kind !== "not-started";
}

/** A copper trace joins two begun steps; any other pair has a dashed line. */
export function joined(stops: readonly TrailStop[], place: number): boolean {
  return begun(stops[place]) && begun(stops[place + 1]);
}
