import { type ComponentType, useEffect, useMemo, useState } from "react";
import { countText, moneyText } from "#src/components/amount-text.ts";
import { ChartFrame, type ChartTable } from "#src/components/islands/charts/ChartFrame.tsx";
import { fileName } from "#src/components/islands/charts/file-name.ts";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { usePhone } from "#src/components/islands/parts/phone.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import type { LadderTerms } from "#src/costing/ladder.ts";
import { neverWorthBuying } from "#src/costing/order-curve.ts";
import type { PartLine, PartOrder } from "#src/costing/run-result.ts";
import type { OfferPart } from "#src/server/kit-offers.ts";
import type { CurveChartProps } from "./CurveChart.tsx";
import { type CurveRow, curveEnd, curveRows } from "./curve-points.ts";
import { namesInWords } from "./how-it-comes.ts";
import { piecesOf } from "./offer-words.ts";

interface CurveSectionProps {
  part: OfferPart;
  line: PartLine;
  terms: LadderTerms;
  supplier: string;
  order: PartOrder | null;
}

/** The chart is fetched when it is needed. */
function useChart() {
  const [Chart, setChart] = useState<ComponentType<CurveChartProps>>();
  useEffect(() => {
    void import("./CurveChart.tsx").then((loaded) => setChart(() => loaded.default));
  }, []);
  return Chart;
}

/** What any number of a part costs at the offer that is shown. */
export function CurveSection({ part, line, terms, supplier, order }: CurveSectionProps) {
  const Chart = useChart();
  const narrow = usePhone();
  const need = line.toBuy;
  const end = curveEnd(need, order?.quantity ?? need);
  const rows = useMemo(() => curveRows(terms, end), [terms, end]);
  const name = "What any number costs";
  const height = narrow ? 300 : 340;
  return (
    <Pair note={<NeverWorth terms={terms} />}>
      <Section title={name} aside={`at the prices of ${supplier}`}>
        {rows.length === 0 ? (
          <p className="type-note">No number of these has a price here.</p>
        ) : (
          <ChartFrame
            name={name}
            file={fileName(part.name, "any-number")}
            height={height}
            table={() => curveTable(rows, terms)}
          >
            {(width) =>
              Chart && (
                <Chart
                  {...{ terms, rows, need, order, end, width, height, narrow }}
                  pieces={piecesOf(part)}
                />
              )
            }
          </ChartFrame>
        )}
      </Section>
    </Pair>
  );
}

function NeverWorth({ terms }: { terms: LadderTerms }) {
  const ranges = neverWorthBuying(terms).map(({ from, to }) =>
    from === to ? countText(from) : `${countText(from)} to ${countText(to)}`,
  );
  if (ranges.length === 0) return null;
  return (
    <MarginNote title="Numbers never worth buying">
      <p>
        {namesInWords(ranges)}. The next break costs less than these. The thick line is what you pay; the
        hatched part is what you save.
      </p>
    </MarginNote>
  );
}

/** The points where the price changes, and even steps between. */
function curveTable(rows: readonly CurveRow[], { breaks, currency }: LadderTerms): ChartTable {
  const every = Math.max(1, Math.floor(rows.length / 16));
  const atBreaks = new Set(breaks.map(({ quantity }) => quantity));
  const shown = rows.filter(({ quantity }, place) => place % every === 0 || atBreaks.has(quantity));
  return {
    head: ["Wanted", "Buy", "You pay", "By the list"],
    rows: shown.map(({ quantity, order, paysText, listedText }) => [
      countText(quantity),
      countText(order),
      moneyText(paysText, currency),
      moneyText(listedText, currency),
    ]),
    fileRows: rows.map(({ quantity, order, paysText, listedText }) => [
      String(quantity),
      String(order),
      paysText,
      listedText,
    ]),
  };
}
