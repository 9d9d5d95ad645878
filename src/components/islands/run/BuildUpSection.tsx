import { moneyText, roundMoneyText, shareText } from "#src/components/amount-text.ts";
import { hatchFill } from "#src/components/islands/chart-theme.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { HatchDefs } from "#src/components/islands/parts/HatchDefs.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import { type BarKind, type BuildUpRow, buildUp } from "./build-up-rows.ts";

const FILLS: Record<BarKind, string> = {
  part: "var(--color-copper-metal)",
  cost: "var(--color-ink)",
  brings: "var(--color-petrol)",
  left: hatchFill("left"),
};

/** One kit of the run: what makes up its cost, what it brings in and what is left, on one scale. */
export function BuildUpSection({ run, opens }: { run: RunResult; opens: ReturnType<typeof useOpens> }) {
  const { rows, lines, step } = buildUp(run);
  const differs =
    run.perKit.spent.known && run.perKit.used.known && run.perKit.spent.value !== run.perKit.used.value;
  return (
    <Section
      title={`One kit of ${run.kits}, built up`}
      aside={`each thin line is ${step < 1 ? moneyText(String(step), run.currency) : roundMoneyText(String(step), run.currency)}`}
      actions={<ShowWorking of="the cost of one kit" onClick={opens("per-kit-used").onOpen} />}
    >
      <svg width={0} height={0} aria-hidden="true" className="absolute">
        <defs>
          <HatchDefs />
        </defs>
      </svg>
      <table className="type-table w-full border-collapse max-tablet:block">
        <caption className="heard-only">One kit of {run.kits}, built up</caption>
        <tbody className="max-tablet:block">
          {rows.map((row) => (
            <BuildUpLine key={row.key} row={row} lines={lines} currency={run.currency} opens={opens} />
          ))}
        </tbody>
      </table>
      {differs && (
        <p className="type-note mt-3 text-ink-2">
          Used counts what keeps on the shelf as not spent. In money spent one kit costs{" "}
          <Figure
            label="Cost per kit, spent"
            value={run.perKit.spent.known ? moneyText(run.perKit.spent.value, run.currency) : ""}
            {...opens("per-kit-spent")}
          />
          .
        </p>
      )}
    </Section>
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
      className={`h-[37px] ${foot} max-tablet:grid max-tablet:h-auto max-tablet:grid-cols-[1fr_auto] max-tablet:py-1`}
    >
      <th scope="row" className={`w-[27%] py-1 pr-3 text-left ${weight || "font-normal"} max-tablet:w-auto`}>
        {label}
      </th>
      <td className="relative p-0 max-tablet:order-3 max-tablet:col-span-2 max-tablet:h-6">
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
  const { bar, kind, figure } = row;
  return (
    <svg width="100%" height={37} className="block overflow-visible max-tablet:h-6" aria-hidden="true">
      {lines.map((at) => (
        <line key={at} x1={`${at}%`} x2={`${at}%`} y1={0} y2={37} stroke="var(--color-rule)" />
      ))}
      {bar && (
        <rect
          x={`${bar.from}%`}
          width={`${Math.max(0.3, bar.to - bar.from)}%`}
          y={9}
          height={19}
          fill={FILLS[kind]}
          stroke={kind === "left" ? "var(--color-petrol)" : figure.known ? "none" : "var(--color-rule-2)"}
          strokeWidth={kind === "left" ? 1.5 : 1}
          fillOpacity={figure.known ? 1 : 0.45}
          strokeDasharray={figure.known ? undefined : "3 3"}
        />
      )}
    </svg>
  );
}
