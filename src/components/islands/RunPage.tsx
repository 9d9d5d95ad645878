import { lazy, memo, Suspense, useMemo } from "react";
import { PAIRS } from "#src/components/page-look.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { CallFailed } from "./call.ts";
import type { KitAddress } from "./kit-address.ts";
import { Button } from "./parts/Button.tsx";
import { ErrorBox } from "./parts/ErrorBox.tsx";
import { Later } from "./parts/Later.tsx";
import { Loading } from "./parts/Loading.tsx";
import { laterPart } from "./parts/later-part.ts";
import { Pair } from "./parts/Pair.tsx";
import { useOpens } from "./plan/open-working.ts";
import { runOf } from "./plan/run-of.ts";
import { usePlan } from "./plan/use-plan.ts";
import { useSweep } from "./plan/use-sweep.ts";
import type { AnswerFigures } from "./run/answer-words.ts";
import type { CannotBeKnownProps } from "./run/CannotBeKnown.tsx";
import { drawnColumns } from "./run/cost-points.ts";
import { take } from "./run/inputs/entry.ts";
import { Inputs } from "./run/inputs/Inputs.tsx";
import { PlanFile } from "./run/PlanFile.tsx";
import { FirstAnswer, RunAnswer } from "./run/RunAnswer.tsx";

/** The charts and their library come when the figures do. */
const RunEvidence = lazy(async () => ({ default: (await import("./run/RunEvidence.tsx")).RunEvidence }));

const CannotBeKnown = laterPart<CannotBeKnownProps>(
  async () => (await import("./run/CannotBeKnown.tsx")).CannotBeKnown,
);

export interface RunPageProps {
  workshop: string;
  kit: string;
  /** Worked out on the server, for the first paint. */
  first: AnswerFigures;
  may: { changeRun: boolean; changePrice: boolean };
}

/** How many kits should we make? The answer, its evidence, and everything it rests on. */
export function RunPage({ workshop, kit, first, may }: RunPageProps) {
  const address = useMemo(() => ({ workshop, kit }), [workshop, kit]);
  const { held, error, retry } = usePlan(address);
  if (held) return <Reckoned address={address} held={held} may={may} />;
  return (
    <>
      <FirstAnswer address={address} figures={first} />
      {error ? (
        <ErrorBox title="The plan could not be fetched" alert>
          <p>
            {error instanceof CallFailed ? `${error.problem.title} ${error.problem.detail}` : error.message}
          </p>
          <Button className="mt-3" onClick={retry}>
            Try again
          </Button>
        </ErrorBox>
      ) : (
        <Loading what="runs and charts" rows={6} />
      )}
    </>
  );
}

interface ReckonedProps {
  address: KitAddress;
  held: KitPlan;
  may: RunPageProps["may"];
}

function Reckoned({ address, held, may }: ReckonedProps) {
  const { plan } = held;
  const run = runOf(plan);
  return (
    <>
      <RunAnswer address={address} run={run} opens={useOpens()} />
      <div className={PAIRS}>
        {!run.perKit.used.known && (
          <Pair>
            <Later
              part={CannotBeKnown}
              give={{
                address,
                plan,
                title: `${run.kits} cannot be worked out yet`,
                needs: run.perKit.used.needs,
                may,
              }}
              what="What is missing"
            />
          </Pair>
        )}
        {plan.lines > 0 && <Evidence address={address} plan={plan} may={may} />}
        <Inputs address={address} held={held} run={run} may={may} />
        <div data-screen-only>
          <Pair>
            <PlanFile address={address} />
          </Pair>
        </div>
      </div>
    </>
  );
}

const Evidence = memo(function Evidence({
  address,
  plan,
  may,
}: Omit<ReckonedProps, "held"> & { plan: Plan }) {
  const opens = useOpens();
  const { sweep, workingOut } = useSweep(plan);
  if (!sweep) return <Loading what="every run size" rows={8} />;
  const { columns, partial } = drawnColumns(sweep);
  return (
    <Suspense fallback={<Loading what="charts" rows={8} />}>
      <RunEvidence
        {...{ address, plan, sweep, columns, workingOut, may, opens }}
        run={runOf(plan)}
        isPartial={partial}
        onChoose={(kits) =>
          take({ address, row: { kind: "run" }, field: "kits", currency: plan.currency }, kits)
        }
      />
    </Suspense>
  );
});
