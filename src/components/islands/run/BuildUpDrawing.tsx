import type { Ref } from "react";
import { moneyText, shareText } from "#src/components/amount-text.ts";
import { INK, INK_2, RULE } from "#src/components/islands/chart-theme.ts";
import { HatchDefs } from "#src/components/islands/parts/HatchDefs.tsx";
import { needWords } from "#src/costing/problem-words.ts";
import { buildUpFill } from "./build-up-fill.ts";
import type { BuildUp, BuildUpRow } from "./build-up-rows.ts";

const WIDTH = 976;
const ROW = 37;
/** Where bars begin and end, and where figures and shares end. */
const BARS = { from: 264, to: 760 };
const FIGURES = 880;

interface BuildUpDrawingProps {
  built: BuildUp;
  currency: string;
  drawing: Ref<SVGSVGElement>;
}

/** The build-up as one drawing, for a file; on the page it is a table. */
export function BuildUpDrawing({ built: { rows, lines }, currency, drawing }: BuildUpDrawingProps) {
  const height = rows.length * ROW;
  return (
    <svg
      ref={drawing}
      aria-hidden="true"
      width={WIDTH}
      height={height}
      fontSize={16}
      fontFamily="var(--font-sans)"
    >
      <defs>
        <HatchDefs />
      </defs>
      {lines.map((at) => (
        <path key={at} d={`M${across(at)} 0V${height}`} stroke={RULE} fill="none" />
      ))}
      {rows.map((row, place) => (
        <DrawnRow key={row.key} row={row} top={place * ROW} currency={currency} />
      ))}
    </svg>
  );
}

function across(hundredths: number): number {
  return BARS.from + ((BARS.to - BARS.from) * hundredths) / 100;
}

function DrawnRow({ row, top, currency }: { row: BuildUpRow; top: number; currency: string }) {
  const { bar, figure, kind, label, share } = row;
  const strong = kind === "cost" || kind === "left";
  const base = top + 24;
  return (
    <g fontWeight={strong ? 700 : 400}>
      <path
        d={`M0 ${top + ROW}H${WIDTH}`}
        stroke={strong ? INK : RULE}
        strokeWidth={strong ? 1.5 : 1}
        fill="none"
      />
      <text x={0} y={base} fill={INK}>
        {label}
      </text>
      {bar && (
        <rect
          x={across(bar.from)}
          y={top + 9}
          width={Math.max(1.5, across(bar.to) - across(bar.from))}
          height={19}
          {...buildUpFill(row)}
        />
      )}
      <text x={FIGURES} y={base} textAnchor="end" fill={INK}>
        {figure.known ? moneyText(figure.value, currency) : needWords(figure.needs)}
      </text>
      {share !== null && (
        <text x={WIDTH} y={base} textAnchor="end" fill={INK_2}>
          {shareText(share)}
        </text>
      )}
    </g>
  );
}
