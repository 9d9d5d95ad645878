import { useEffect, useState } from "react";
import { countText, moneyText } from "#src/components/amount-text.ts";
import { CallFailed, call } from "#src/components/islands/call.ts";
import { ErrorBox } from "#src/components/islands/parts/ErrorBox.tsx";
import { Table } from "#src/components/islands/parts/Table.tsx";
import type { Figure } from "#src/costing/figure.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import type { POST } from "#src/pages/api/costing.ts";
import type { ProblemBody } from "#src/server/problem.ts";

type Outcome =
  | { state: "busy" }
  | { state: "reckoned"; file: string; run: RunResult }
  | { state: "refused"; file: string; title: string; detail: string; errors: ProblemBody["errors"] };

async function reckoned(file: File): Promise<Outcome> {
  try {
    const plan = JSON.parse(await file.text());
    const { run } = await call<typeof POST>("POST", "/api/costing?working=", plan);
    return { state: "reckoned", file: file.name, run };
  } catch (error) {
    if (error instanceof CallFailed)
      return { state: "refused", file: file.name, errors: [], ...error.problem };
    if (!(error instanceof SyntaxError)) throw error;
    return {
      state: "refused",
      file: file.name,
      title: "This file is not a plan.",
      detail: "Choose a file that was downloaded here: its name ends in plan.json.",
      errors: [],
    };
  }
}

/** What a plan file comes to, worked out by the server; nothing here is changed. */
export function PlanFileFigures({ file }: { file: File }) {
  const [outcome, setOutcome] = useState<Outcome>({ state: "busy" });
  useEffect(() => {
    let isLatest = true;
    setOutcome({ state: "busy" });
    void reckoned(file).then((found) => isLatest && setOutcome(found));
    return () => {
      isLatest = false;
    };
  }, [file]);
  if (outcome.state === "busy") return <p>Working out</p>;
  if (outcome.state === "refused")
    return (
      <ErrorBox
        title={`${outcome.file} cannot be worked out`}
        causes={(outcome.errors ?? []).slice(0, 20).map(({ at, message }) => ({
          key: `${at} ${message}`,
          what: at || "The plan",
          reason: message,
        }))}
      >
        {outcome.title} {outcome.detail}
      </ErrorBox>
    );
  return <FileFigures file={outcome.file} run={outcome.run} />;
}

function FileFigures({ file, run }: { file: string; run: RunResult }) {
  const written = (figure: Figure) =>
    figure.known ? moneyText(figure.value, run.currency) : needWords(figure.needs);
  const rows: [string, string][] = [
    ["Cost per kit, used", written(run.perKit.used)],
    ["Cost per kit, spent", written(run.perKit.spent)],
    ["One kit brings in", written(run.bringsPerKit)],
    ["Earns per kit", written(run.earnsPerKit)],
    [
      "Even after",
      run.evenAfter.known ? `${countText(run.evenAfter.value)} sold` : needWords(run.evenAfter.needs),
    ],
    ["Cash needed", written(run.spent)],
  ];
  return (
    <>
      <p className="type-h3 mb-2">
        {file}: {run.kit}, a run of {run.kits}
      </p>
      <Table
        caption={`Figures of ${file}`}
        rows={rows}
        keyOf={([name]) => name}
        columns={[
          { key: "name", head: "Figure", names: true, cell: ([name]) => name },
          { key: "value", head: run.currency, number: true, cell: ([, value]) => value },
        ]}
      />
    </>
  );
}
