import { useQuery } from "@tanstack/react-query";
import type { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import]/cost.ts";
import { call } from "../call.ts";
import { CostChange } from "../parts/CostChange.tsx";
import { type ImportPlace, importKeys, importsApi } from "./import-place.ts";

/** What the list does to the cost of one kit, worked out before it is brought in. */
export function CostLine({ place, id, version }: { place: ImportPlace; id: string; version: number }) {
  const { data, isError } = useQuery({
    queryKey: importKeys.cost(id, version),
    queryFn: () => call<typeof GET>("GET", importsApi(place, `/${id}/cost`)),
  });
  if (isError)
    return <p className="text-ink-2">What it does to the cost of a kit could not be worked out.</p>;
  if (!data) return <p className="text-ink-2">Working out what it does to the cost of a kit.</p>;
  return <CostChange effect={data} when={{ after: "afterwards", before: "now" }} />;
}
