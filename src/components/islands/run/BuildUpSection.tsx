import { useRef } from "react";
import { axisMoneyText, moneyText, shareText } from "#src/components/amount-text.ts";
import { fileName } from "#src/components/islands/charts/file-name.ts";
import { SaveChart } from "#src/components/islands/charts/SaveChart.tsx";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import { BuildUpDrawing } from "./BuildUpDrawing.tsx";
import { buildUpFill } from "./build-up-fill.ts";
import { type BuildUpRow, buildUp, buildUpList } from "./build-up-rows.ts";

/** One kit of the run: what makes up its cost, what it brings in and what is left, on one scale. */
export function BuildUpSection({ run, opens }: { run: RunResult; opens: ReturnType<typeof useOpens> }) {
  const built = buildUp(run);
  const { rows, lines, step } = built;
  const drawing = useRef<SVGSVGElement>(null);
  const name = `One kit of ${run.kits}, built up`;
  return (
    <Section
      title={name}
      aside={`each thin line is ${axisMoneyText(step, [step], run.currency)}`}
      actions={<ShowWorking of="the cost of one kit" onClick={opens("per-kit-used").onOpen} />}
    >
      <div className="heard-only" aria-hidden="true">
        <BuildUpDrawing built={built} currency={run.currency} drawing={drawing} />
      </div>
      <table className="type-table w-full border-collapse max-tablet:block">
        <caption className="heard-only">{name}</caption>
        <tbody className="max-tablet:block">
          {rows.map((row) => (
            <BuildUpLine key={row.key} row={row} lines={lines} currency={run.currency} opens={opens} />
          ))}
        </tbody>
      </table>
      <InSpent run={run} opens={opens} />
      <p className="mt-3 flex flex-wrap items-center gap-x-5 gap-y-1 type-label" data-screen-only>
        <SaveChart
          name={name}
          file={fileName(run.kit, "built-up")}
          drawn={() => drawing.current}
          rows={() => buildUpList(built)}
        />
      </p>
    </Section>
  );
}

/** The same kit in money spent, where that is another figure. */
function InSpent({ run, opens }: { run: RunResult; opens: ReturnType<typeof useOpens> }) {
  const { spent, used } = run.perKit;
  if (!spent.known || !used.known || spent.value === used.value) return null;
  return (
    <p className="type-note mt-3 text-ink-2">
      Used counts what keeps on the shelf as not spent. In money spent one kit costs{" "}
      <Figure
        label="Cost per kit, spent"
        value={moneyText(spent.value, run.currency)}
        {...opens("per-kit-spent")}
      />
      .
    </p>
  );
}

interface LineProps {
  row: BuildUpRow;
  lines: readonly number[];
  currency: string;
  opens: ReturnType<typeof useOpens>;
}

function BuildUpLine({ row, lines, currency, opens }: LineProps) {
  const { figure, kind, label } = row;
  const weight = kind === "part" || kind === "brings" ? "" : "font-bold";
  const foot =
    kind === "left" ? "border-b-4 border-double border-ink" : kind === "cost" ? "rule-head" : "hairline-b";
  return (
    <tr
      className={`h-[37px] ${foot} max-tablet:grid max-tablet:h-auto max-tablet:grid-cols-[1fr_auto] max-tablet:pt-1`}
    >
      <th
        scope="row"
        className={`w-[27%] py-1 pr-3 text-left ${weight || "font-normal"} max-tablet:w-auto max-tablet:pb-0`}
      >
        {label}
      </th>
      <td className="relative p-0 max-tablet:order-3 max-tablet:col-span-2">
        <Bar row={row} lines={lines} />
      </td>
      <td className={`w-[12%] pl-4 text-right whitespace-nowrap ${weight} max-tablet:w-auto`}>
        {figure.known ? (
          <Figure label={label} value={moneyText(figure.value, currency)} {...opens(row.opens)} />
        ) : (
          <span className="font-medium text-ink-2">{needWords(figure.needs)}</span>
        )}
      </td>
      <td className="w-[7%] pl-3 text-right whitespace-nowrap text-ink-2 type-label max-tablet:hidden">
        {row.share === null ? "" : shareText(row.share)}
      </td>
    </tr>
  );
}

function Bar({ row, lines }: { row: BuildUpRow; lines: readonly number[] }) {
  const { bar } = row;
  return (
    <svg width="100%" className="block h-[37px] overflow-visible max-tablet:h-6" aria-hidden="true">
      {lines.map((at) => (
        <line key={at} x1={`${at}%`} x2={`${at}%`} y1={0} y2="100%" stroke="var(--color-rule)" />
      ))}
      {bar && (
        <rect
          x={`${bar.from}%`}
          width={`${Math.max(0.3, bar.to - bar.from)}%`}
          y="24%"
          height="52%"
          {...buildUpFill(row)}
        />
      )}
    </svg>
  );
}
