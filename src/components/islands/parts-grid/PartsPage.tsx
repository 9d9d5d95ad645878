import { lazy, Suspense, useEffect, useMemo, useRef } from "react";
import { moneyText } from "#src/components/amount-text.ts";
import { buttonLook } from "#src/components/button-look.ts";
import { counted } from "#src/components/count-words.ts";
import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ErrorBox } from "#src/components/islands/parts/ErrorBox.tsx";
import { Loading } from "#src/components/islands/parts/Loading.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { moduleStore } from "#src/components/islands/plan/module-store.ts";
import { runOf } from "#src/components/islands/plan/run-of.ts";
import { usePlan } from "#src/components/islands/plan/use-plan.ts";
import type { RunResult } from "#src/costing/run-result.ts";
import { compareLists } from "#src/partslist/since-revision.ts";
import type { PartsList } from "#src/server/present.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { fullestEdition, type LineRow, lineRows, partsTotal } from "./grid-rows.ts";
import { takeUpList, watchList } from "./list-editor.ts";
import { PartsWorkbench } from "./PartsWorkbench.tsx";
import { useLastRevision, usePartsList } from "./use-parts-list.ts";

/** A plan and what the reckoning makes of it at the chosen run. */
export interface Bought {
  plan: Plan;
  run: RunResult;
}

export interface PartsProps {
  address: KitAddress;
  /** As the page was made: what the answer says before the list is here. */
  first: { lines: number; revision: string; kits: number };
  /** Another kit of the workshop that has a list, to be copied as an example. */
  example: { id: string; name: string } | null;
  canEdit: boolean;
  canChoose: boolean;
  money: boolean;
  styleNonce: string;
}

/** What goes into one kit: the answer, then the list itself. */
export default function PartsPage(props: PartsProps) {
  return props.money ? <PricedParts {...props} /> : <Parts {...props} bought={null} />;
}

function PricedParts(props: PartsProps) {
  const { held } = usePlan(props.address);
  const bought = useMemo(() => held && { plan: held.plan, run: runOf(held.plan) }, [held]);
  return <Parts {...props} bought={bought ?? null} />;
}

/** A kit that has parts needs none of it. */
const EmptyParts = lazy(async () => ({ default: (await import("./EmptyParts.tsx")).EmptyParts }));

const NO_CHANGE: ReadonlySet<string> = new Set();
/** The page's own button asks for a line; the grid, which is fetched later, hears it. */
const addLine = moduleStore(0);

function Parts(props: PartsProps & { bought: Bought | null }) {
  const { address, first, bought, canEdit } = props;
  const { list, error, retry } = usePartsList(address);
  const last = useLastRevision(address, list?.kit.revision ?? first.revision);
  const changed = useMemo(() => {
    if (!list || !last) return NO_CHANGE;
    const change = compareLists<(typeof list.lines)[number] | (typeof last.lines)[number]>(
      last.lines,
      list.lines,
    );
    return new Set([...change.added.map(({ id }) => id), ...change.changed.map(({ after }) => after.id)]);
  }, [list, last]);
  const isThere = list !== undefined;
  useEffect(() => watchList(address), [address]);
  useEffect(() => {
    if (isThere) takeUpList(address);
  }, [isThere, address]);

  const lines = list?.lines.length ?? first.lines;
  const rows = useRows(list, bought);
  return (
    <>
      <Question
        question="What goes into one kit?"
        actions={canEdit && lines > 0 && <Actions address={address} />}
      >
        <Answer list={list} rows={rows} lines={lines} bought={bought} canEdit={canEdit} />
      </Question>
      {lines === 0 ? (
        <Suspense fallback={<Loading what="A first line" rows={4} />}>
          <EmptyParts
            address={address}
            list={list?.money ? list : null}
            kits={bought?.plan.run.kits ?? first.kits}
            canEdit={canEdit}
            example={props.example}
          />
        </Suspense>
      ) : list ? (
        <PartsWorkbench
          {...props}
          list={list}
          rows={rows}
          changed={changed}
          lastRevision={last?.revision ?? null}
          addLine={addLine}
        />
      ) : error ? (
        <ErrorBox title="The parts list could not be read" alert>
          <p>{error.message}</p>
          <Button size="small" className="mt-2" onClick={retry}>
            Try again now
          </Button>
        </ErrorBox>
      ) : (
        <Loading what="Parts list" rows={Math.min(lines, 12) + 1} />
      )}
      <p className="mt-6 flex flex-wrap gap-x-8 gap-y-2">
        {last && <a href={kitPath(address, "/parts/changes")}>What changed since rev {last.revision}</a>}
        <a href={kitPath(address, "/details")} className="tablet:hidden">
          Editions and board
        </a>
      </p>
    </>
  );
}

function Actions({ address }: { address: KitAddress }) {
  return (
    <>
      <a href={kitPath(address, "/details")} className={`${buttonLook()} max-tablet:hidden`}>
        Editions and board
      </a>
      <Button onClick={() => addLine.change((count) => count + 1)}>Add a line</Button>
      <a href={kitPath(address, "/parts/bring-in")} className={buttonLook("primary")}>
        Bring in a list
      </a>
    </>
  );
}

/** The rows of the list; those that read as before stay the same objects. */
function useRows(list: PartsList | undefined, bought: Bought | null): LineRow[] {
  const before = useRef<LineRow[]>([]);
  return useMemo(() => {
    before.current = list ? lineRows(list, bought, before.current) : [];
    return before.current;
  }, [list, bought]);
}

function Answer({
  list,
  rows,
  lines,
  bought,
  canEdit,
}: {
  list: PartsList | undefined;
  rows: readonly LineRow[];
  lines: number;
  bought: Bought | null;
  canEdit: boolean;
}) {
  if (lines === 0)
    return (
      <>
        <b>Nothing yet.</b>{" "}
        {canEdit && "Bring in the list you already have, or write the first line. Prices can come later."}
      </>
    );
  if (!list) return <b>{counted(lines, "line", "lines")}.</b>;
  const toSettle = rows.filter(({ state }) => state.toSettle).length;
  const { pieces, name } = fullestEdition(list) ?? { pieces: 0, name: "" };
  return (
    <>
      <b>
        {lines === 1 ? "1 line" : `${lines} lines`}, {pieces === 1 ? "1 piece" : `${pieces} pieces`}
        {list.editions.length > 1 && ` in ${name}`}.
      </b>{" "}
      {bought && <CostSentence bought={bought} />}{" "}
      {toSettle > 0 && `${counted(toSettle, "line waits", "lines wait")} to be settled.`}
    </>
  );
}

function CostSentence({ bought }: { bought: Bought }) {
  const { plan, run } = bought;
  const total = partsTotal(bought);
  if (total)
    return (
      <>
        At a run of {plan.run.kits} the parts of one kit cost <b>{total.perKit}</b>.
      </>
    );
  const spent = run.heads.find(({ id }) => id === "parts")?.perKit.spent;
  const without = spent && !spent.known ? spent.without : null;
  if (without === null || without === undefined) return null;
  return (
    <>
      Without the lines that have no price, the parts of one kit cost{" "}
      <b>{moneyText(without, plan.currency)}</b> at a run of {plan.run.kits}.
    </>
  );
}
