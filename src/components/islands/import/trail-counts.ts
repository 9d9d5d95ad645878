import type { ImportView } from "./use-import.ts";

/** What the trail of a list needs to know. */
export interface TrailCounts {
  matched: number;
  leftOut: number;
  open: number;
  taken: boolean;
}

export function trailCounts(view: Pick<ImportView, "columns" | "questions" | "file">): TrailCounts {
  const { columns } = view.columns;
  const leftOut = columns.filter(({ meaning }) => meaning === "leave-out").length;
  return {
    matched: columns.length - leftOut,
    leftOut,
    open: view.questions.must + view.questions.look,
    taken: view.file.state === "taken",
  };
}
