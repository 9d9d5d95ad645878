import { QueryClientProvider, skipToken, useQuery } from "@tanstack/react-query";
import type { TrailStop } from "#src/components/trail-states.ts";
import { Trail } from "../parts/Trail.tsx";
import { pageCache } from "../query-client.ts";
import { importKeys } from "./import-place.ts";
import { type TrailCounts, trailCounts } from "./trail-counts.ts";
import type { ImportView } from "./use-import.ts";

interface Props {
  id: string;
  counts: TrailCounts;
}

/** The four stages of a list, in step with the desk below through the shared cache. */
export default function ImportTrail(props: Props) {
  return (
    <QueryClientProvider client={pageCache()}>
      <Stages {...props} />
    </QueryClientProvider>
  );
}

function Stages({ id, counts }: Props) {
  const { data } = useQuery<ImportView>({ queryKey: importKeys.one(id), queryFn: skipToken });
  return <Trail stops={stages(data ? trailCounts(data) : counts)} label="The stages of this list" />;
}

function stages({ matched, leftOut, open, taken }: TrailCounts): TrailStop[] {
  const left = leftOut > 0 ? `, ${leftOut} left out` : "";
  return [
    { name: "File", href: "#file", state: { kind: "done" }, words: "read" },
    { name: "Columns", href: "#columns", state: { kind: "done" }, words: `${matched} matched${left}` },
    open > 0
      ? { name: "Rows", href: "#rows", state: { kind: "to-settle", count: open }, here: true }
      : { name: "Rows", href: "#rows", state: { kind: "done" }, words: "settled" },
    taken
      ? { name: "Bring in", href: "#main", state: { kind: "done" }, words: "brought in", here: true }
      : {
          name: "Bring in",
          href: "#bring-in",
          state: { kind: "not-started" },
          words: "not yet",
          here: open === 0,
        },
  ];
}
