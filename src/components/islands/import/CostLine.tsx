import { useQuery } from "@tanstack/react-query";
import { changeText, moneyText } from "#src/components/amount-text.ts";
import type { Figure } from "#src/costing/figure.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/imports/[import]/cost.ts";
import { call } from "../call.ts";
import { Change } from "../parts/Change.tsx";
import { type ImportPlace, importKeys, importsApi } from "./import-place.ts";

function figureWords(figure: Figure, currency: string): string {
  return figure.known ? moneyText(figure.value, currency) : needWords(figure.needs);
}

/** What the list does to the cost of one kit, worked out before it is brought in. */
export function CostLine({ place, id, version }: { place: ImportPlace; id: string; version: number }) {
  const { data, isError } = useQuery({
    queryKey: importKeys.cost(id, version),
    queryFn: () => call<typeof GET>("GET", importsApi(place, `/${id}/cost`)),
  });
  if (isError)
    return <p className="text-ink-2">What it does to the cost of a kit could not be worked out.</p>;
  if (!data) return <p className="text-ink-2">Working out what it does to the cost of a kit.</p>;
  const { kits, currency, now, then, change } = data;
  const turn = change === null || Number(change) === 0 ? "neither" : Number(change) < 0 ? "better" : "worse";
  return (
    <p className="type-answer mb-2">
      One kit of {kits} costs <b>{figureWords(then, currency)}</b> afterwards{" "}
      {change !== null && <Change amount={changeText(change, currency)} turn={turn} />}
      <span className="text-ink-2">; now {figureWords(now, currency)}</span>
    </p>
  );
}
